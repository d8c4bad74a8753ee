using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A correlation of the discharge coefficient outside its range, or of an unchoked throat.</summary>
internal static class ExtrapolatedCorrelation
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Case.DischargeCorrelation is not CriticalFlowCd row || a.Performance.ReynoldsThroat is not double Re) return null;
        bool choked = a.Performance.Choked == true;
        if (choked && row.Holds(Re)) return null;
        double limit = Re < row.LeastRe ? row.LeastRe : row.GreatestRe;
        return new Finding("extrapolated", Severity.Caution, Re, limit, CriticalFlowCd.Standing, text => choked
            ? $"the Reynolds number {text.Text(Re, Dimension.Ratio, 3)} lies outside the range of {row.Name}, {text.Text(row.LeastRe, Dimension.Ratio, 3)} to {text.Text(row.GreatestRe, Dimension.Ratio, 3)}"
            : $"{row.Name} holds for a choked throat, and this one is not");
    }
}
