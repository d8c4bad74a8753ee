using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The water vapour in a gas would condense or freeze out at a station.</summary>
internal static class Condensation
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        if (fluid is not IdealGas gas || gas.Components.FirstOrDefault(part => part.Species.Formula == "H2O") is not GasComponent water) return null;
        foreach (StationAnswer station in stations.Known)
        {
            (double T, double partial) = (station.State.T, water.x * station.State.p);
            if (T >= WaterConstants.Tc || partial <= SaturationPressure(T)) continue;
            double limit = SaturationPressure(T);
            return new Finding("condensation", Severity.Caution, partial, limit, "IAPWS R7-97(2012), R14-08(2011)", text =>
                $"water vapour has a partial pressure of {text.Text(partial, Dimension.Pressure, 4)}, above its saturation pressure {text.Text(limit, Dimension.Pressure, 4)} at {text.Text(T, Dimension.Temperature, 4)}: it would condense, and the answer keeps it a gas");
        }

        return null;
    }

    private static double SaturationPressure(double T) => T < WaterConstants.Tt ? IceLine.SublimationPressure(T) : SaturationLine.Pressure(T);
}
