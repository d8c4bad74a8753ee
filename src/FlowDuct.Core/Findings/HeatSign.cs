using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A negative heat is a loss; the two ways to write one are easily mixed up.</summary>
internal static class HeatSign
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (!a.Case.Has(CaseOption.Heat) || a.Case.Value(CaseOption.Heat) >= 0) return null;
        double heat = a.Case.Value(CaseOption.Heat);
        return new Finding("heat-sign", Severity.Note, heat, 0, "sign convention", text =>
            $"the heat is negative: {text.Text(-heat, Dimension.SpecificEnergy)} leave the fluid; --heat-loss says the same without a sign");
    }
}
