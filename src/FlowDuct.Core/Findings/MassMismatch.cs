using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A section with its velocity carries another flow than the one given.</summary>
internal static class MassMismatch
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Audit is not { Mass: Verdict.Broken, MassFlowFound: double found }) return null;
        double given = a.Performance.MassFlow!.Value;
        return new Finding("mass-mismatch", Severity.Error, found, given, "conservation of mass", text =>
            $"the section carries {text.Text(found, Dimension.MassFlow)} but the flow is {text.Text(given, Dimension.MassFlow)}; printed rounding explains {text.Text(a.Audit.MassFlowRounding, Dimension.MassFlow, 2)}");
    }
}
