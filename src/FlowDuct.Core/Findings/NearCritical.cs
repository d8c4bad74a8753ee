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
        if (near is null || !fluid.TryCriticalPoint(out double T, out double p)) return null;
        return new Finding("near-critical", Severity.Caution, near.State.T, T, fluid.Source, text =>
            $"a station lies near the critical point ({text.Text(p, Dimension.Pressure)}, {text.Text(T, Dimension.Temperature)}): heat capacities and speeds of sound change steeply there");
    }
}
