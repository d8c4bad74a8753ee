using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Water where ice is stable, or so thin that what condenses from it is ice.</summary>
internal static class Icing
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        if (stations.StationWith(Notices.Ice) is StationAnswer frozen)
        {
            return new Finding("icing", Severity.Caution, frozen.State.T, WaterConstants.Tt, "IAPWS R14-08(2011)", text =>
                $"at {text.Text(frozen.State.T, Dimension.Temperature, 5)} and this pressure ice is the stable phase; the answer is water that does not freeze");
        }

        if (fluid is IdealGas gas && gas.FractionOf("H2O") is > 0 and double x) return OfGas(x, stations);
        return stations.StationWith(Notices.BelowTriplePoint) is StationAnswer thin
            ? new Finding("icing", Severity.Note, thin.State.p, IceLine.TriplePressure, "IAPWS R7-97(2012)", text =>
                $"{text.Text(thin.State.p, Dimension.Pressure, 4)} lies below the triple-point pressure {text.Text(IceLine.TriplePressure, Dimension.Pressure, 4)}: what condenses at it is ice")
            : null;
    }

    // Supersaturated vapour in a gas below the triple point settles as ice, and drops that came before it freeze.
    private static Finding? OfGas(double x, IStations stations)
    {
        if (VapourExcess.First(stations, Excess) is not FluidState first) return null;
        return new Finding("icing", Severity.Caution, first.T, WaterConstants.Tt, "IAPWS R14-08(2011)", text =>
            $"at {text.Text(first.T, Dimension.Temperature, 4)} the vapour that leaves the gas is ice, or water that freezes on the wall{VapourExcess.Start(stations, Excess, text)}");

        double Excess(FluidState at) => VapourExcess.AboveIce(x, at);
    }
}
