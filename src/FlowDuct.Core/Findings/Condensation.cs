using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The water vapour in a gas would condense or freeze out at a station, and where along the flow that starts.</summary>
internal static class Condensation
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        if (fluid is not IdealGas gas || gas.FractionOf("H2O") is not (> 0 and double x)) return null;
        if (VapourExcess.First(stations, Excess) is not FluidState first) return null;
        (double T, double partial, double limit) = (first.T, x * first.p, VapourSaturation.Pressure(first.T));
        string verb = T < WaterConstants.Tt ? "freeze out" : "condense";
        return new Finding("condensation", Severity.Caution, partial, limit, "IAPWS R7-97(2012), R14-08(2011)", text =>
            $"water vapour has a partial pressure of {text.Text(partial, Dimension.Pressure, 4)}, above its saturation pressure {text.Text(limit, Dimension.Pressure, 4)} at {text.Text(T, Dimension.Temperature, 4)}: it would {verb}, and the answer keeps it a gas{VapourExcess.Start(stations, Excess, text)}");

        double Excess(FluidState at) => VapourExcess.Above(x, at);
    }
}
