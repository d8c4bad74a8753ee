using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A station lies so near the critical point that small changes of state move everything.</summary>
internal static class NearCritical
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        StationAnswer? near = stations.StationWith(Notices.NearCritical);
        return near is null ? null : new Finding("near-critical", Severity.Caution, near.State.T, 647.096, "IAPWS R7-97(2012)", text =>
            $"a station lies near the critical point ({text.Text(22.064e6, Dimension.Pressure)}, {text.Text(647.096, Dimension.Temperature)}): heat capacities and speeds of sound change steeply there");
    }
}
