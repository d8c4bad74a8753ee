using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The figures imply more kinetic energy than an isentropic expansion gives.</summary>
internal static class EfficiencyAboveOne
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Audit.Entropy != Verdict.Broken || a.Performance.IsentropicEfficiency is not double efficiency || efficiency <= 1) return null;
        return new Finding("efficiency-above-one", Severity.Error, efficiency, 1, "second law of thermodynamics", text =>
            $"the figures imply an isentropic efficiency of {text.Text(efficiency, Dimension.Ratio, 4)}; the greatest possible is 1");
    }
}
