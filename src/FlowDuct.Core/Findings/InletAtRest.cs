using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Static properties alone: the inlet is taken at rest.</summary>
internal static class InletAtRest
{
    internal static Finding? Check(DeviceAnswer a) => !a.InletTakenAtRest ? null
        : new Finding("inlet-at-rest", Severity.Note, 0, null, "assumption", _ =>
            "the inlet velocity is not given and taken as 0; give V, or A (or d) with --flow, if the approach is not slow");
}
