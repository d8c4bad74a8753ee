using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The figures break a law by less than their own printed rounding.</summary>
internal static class RoundingLimited
{
    internal static Finding? Check(DeviceAnswer a)
    {
        Audit audit = a.Audit;
        if (audit.Entropy == Verdict.WithinRounding)
        {
            return new Finding("rounding-limited", Severity.Note, audit.EntropyMargin, audit.EntropyRounding, "printed rounding of the given figures", text =>
                $"the entropy seems to fall by {text.Text(-audit.EntropyMargin!.Value, Dimension.SpecificEntropy, 3)}, which the printed digits explain (up to {text.Text(audit.EntropyRounding, Dimension.SpecificEntropy, 3)})");
        }

        string? law = audit.Energy == Verdict.WithinRounding ? "energy" : audit.Mass == Verdict.WithinRounding ? "mass" : null;
        return law is null ? null : new Finding("rounding-limited", Severity.Note, null, null, "printed rounding of the given figures", _ =>
            $"the {law} balance is off by no more than the printed digits explain");
    }
}
