using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Subsonic, but close to the critical pressure.</summary>
internal static class NearChoking
{
    // Within this part above the critical pressure a small change of pressure decides: common practice.
    private const double Band = 0.05;

    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Performance is not { Regime: "subsonic", CriticalPressureRatio: double ratio } || a.Case.Device != DeviceKind.Nozzle) return null;
        double critical = ratio * a.Inlet.Stagnation!.Value.p, p = a.Exit.State.p;
        return p > critical * (1 + Band) ? null : new Finding("near-choking", Severity.Caution, p, critical, "common practice", text =>
            $"the exit pressure is within {text.Text(Band, Dimension.Ratio, 2)} of the critical pressure {text.Text(critical, Dimension.Pressure)}: the nozzle is about to choke");
    }
}
