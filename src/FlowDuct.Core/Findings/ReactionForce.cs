using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The jet pushes back hard enough to need a thought about supports.</summary>
internal static class ReactionForce
{
    // About the weight of a person; chosen here.
    private const double Limit = 1000;

    internal static Finding? Check(DeviceAnswer a) =>
        a.Performance.Thrust is not double thrust || Math.Abs(thrust) < Limit
            ? null
            : new Finding("reaction-force", Severity.Caution, thrust, Limit, "limit chosen here", text =>
                $"the jet pushes back with {text.Text(thrust, Dimension.Force, 4)}: anchors and supports must carry it, at start too");
}
