using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A station lies outside the fit of the gas, inside its documented continuation.</summary>
internal static class Extrapolated
{
    /// <summary>A correlation of the discharge coefficient outside its range, or of an unchoked throat.</summary>
    internal static Finding? OfCorrelation(DeviceAnswer a)
    {
        if (a.Case.DischargeCorrelation is not Devices.Coefficients.CriticalFlowCd row || a.Performance.ReynoldsThroat is not double Re) return null;
        bool choked = a.Performance.Choked == true;
        if (choked && row.Holds(Re)) return null;
        double limit = Re < row.LeastRe ? row.LeastRe : row.GreatestRe;
        return new Finding("extrapolated", Severity.Caution, Re, limit, Devices.Coefficients.CriticalFlowCd.Standing, text => choked
            ? $"the Reynolds number {text.Text(Re, Dimension.Ratio, 3)} lies outside the range of {row.Name}, {text.Text(row.LeastRe, Dimension.Ratio, 3)} to {text.Text(row.GreatestRe, Dimension.Ratio, 3)}"
            : $"{row.Name} holds for a choked throat, and this one is not");
    }

    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        StationAnswer? cold = stations.StationWith(Notices.Extrapolated);
        return cold is null ? null : new Finding("extrapolated", Severity.Note, cold.State.T, 200, fluid.Formulation, text =>
            $"{text.Text(cold.State.T, Dimension.Temperature, 4)} lies below the fit, which begins at {text.Text(200, Dimension.Temperature, 4)}: the heat capacity is held at its value there");
    }
}
