using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Water below its triple point: at equilibrium there would be ice.</summary>
internal static class Icing
{
    // IAPWS R7-97(2012), Eq. (9): triple point of water.
    private const double TriplePressure = 611.657;

    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        StationAnswer? cold = stations.StationWith(Notices.BelowTriplePoint);
        return cold is null ? null : new Finding("icing", Severity.Caution, cold.State.p, TriplePressure, "IAPWS R7-97(2012)", text =>
            $"below the triple point ({text.Text(TriplePressure, Dimension.Pressure)}, {text.Text(273.16, Dimension.Temperature)}) ice forms at equilibrium; the answer is vapour that does not freeze");
    }
}
