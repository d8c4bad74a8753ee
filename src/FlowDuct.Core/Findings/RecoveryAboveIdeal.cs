using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A diffuser recovers more than a uniform, swirl-free inlet stream can give.</summary>
internal static class RecoveryAboveIdeal
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Case.Device != DeviceKind.Diffuser || a.Audit.Entropy != Verdict.Broken) return null;
        if (a.Performance is not { Recovery: double recovery, IdealRecovery: double ideal } || recovery <= ideal) return null;
        return new Finding("recovery-above-ideal", Severity.Error, recovery, ideal, "second law of thermodynamics", text => Message(a, recovery, ideal, text));
    }

    // The isentropic efficiency above one is the kinetic-energy coefficient that would supply the missing head.
    private static string Message(DeviceAnswer a, double recovery, double ideal, IQuantityText text)
    {
        string start = $"recovery {text.Text(recovery, Dimension.Ratio, 4)} is above the ideal {text.Text(ideal, Dimension.Ratio, 4)} of a uniform, swirl-free inlet at this area ratio";
        return a.Performance.IsentropicEfficiency is double alpha and > 1
            ? $"{start}; a kinetic-energy coefficient of {text.Text(alpha, Dimension.Ratio, 4)} or more at the inlet would explain it"
            : start;
    }
}
