using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The flow is at its greatest for this inlet.</summary>
internal static class Choked
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Rating is not null && a.Performance is { Choked: true, Limits.Subsonic: double limit })
        {
            return new Finding("choked", Severity.Note, a.BackPressure, limit, "greatest mass flux on the isentrope", text =>
                $"at any back pressure up to {text.Text(limit, Dimension.Pressure)} the nozzle passes no more flow");
        }

        if (a.Performance is not { Choked: true, CriticalPressureRatio: double ratio }) return null;
        double critical = ratio * a.Inlet.Stagnation!.Value.p;
        return new Finding("choked", Severity.Note, a.Exit.State.p, critical, "greatest mass flux on the isentrope", text =>
            $"the exit pressure is at or below the critical pressure {text.Text(critical, Dimension.Pressure)}; lowering it passes no more flow");
    }
}
