using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A correlation of the discharge coefficient outside its range, or of a throat that runs otherwise than it says.</summary>
internal static class ExtrapolatedCorrelation
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Case.DischargeCorrelation is not DischargeCorrelation row || ThroatFlow.Of(a) is not ThroatFlow throat) return null;
        if (!row.Fits(throat))
        {
            string kind = row.NeedsPipe ? "a throat below choking, and this one is choked" : "a choked throat, and this one is not";
            return new Finding("extrapolated", Severity.Caution, throat.PressureRatio, a.Performance.CriticalPressureRatio, row.Standing, _ => $"{row.Name} holds for {kind}");
        }

        if (row.CrossedBy(throat) is not Crossing crossed) return null;
        return new Finding("extrapolated", Severity.Caution, crossed.Value, crossed.Limit, row.Standing, text =>
            $"{crossed.Argument} {Of(text, crossed, crossed.Value)} lies outside the range of {row.Name}, which ends at {Of(text, crossed, crossed.Limit)}");
    }

    private static string Of(IQuantityText text, in Crossing crossed, double value) =>
        text.Text(value, crossed.Argument is "D" or "d" ? Dimension.Length : Dimension.Ratio, 4);
}
