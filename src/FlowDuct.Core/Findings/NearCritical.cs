using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A station lies so near the critical point that small changes of state move everything.</summary>
internal static class NearCritical
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        StationAnswer? near = stations.StationWith(Notices.NearCritical);
        return near is null ? null : new Finding("near-critical", Severity.Caution, near.State.T, WaterConstants.Tc, "IAPWS R7-97(2012)", text =>
            $"a station lies near the critical point ({text.Text(WaterConstants.pc, Dimension.Pressure)}, {text.Text(WaterConstants.Tc, Dimension.Temperature)}): heat capacities and speeds of sound change steeply there");
    }
}
