using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The jet leaves above the back pressure and goes on expanding outside.</summary>
internal static class Underexpanded
{
    // What a message will need is set aside where its method begins, so that method begins only for a rated nozzle.
    internal static Finding? Check(DeviceAnswer a) => a.Rating is null ? null : OfRated(a);

    private static Finding? OfRated(DeviceAnswer a)
    {
        if (a.Performance.Jet is not JetAnswer { PressureRatio: > 1 } jet) return null;
        string turning = jet.TurningAngle is null ? " beyond what the fluid's range holds" : string.Empty;
        return new Finding("underexpanded", Severity.Note, jet.PressureRatio, 1, "balance of pressures at the lip", text =>
            jet.TurningAngle is double angle
                ? $"the exit plane holds {text.Text(jet.PressureRatio, Dimension.Ratio, 4)} times the back pressure: the jet spreads by {text.Text(angle, Dimension.Angle, 3)} at the lip"
                : $"the exit plane holds {text.Text(jet.PressureRatio, Dimension.Ratio, 4)} times the back pressure: the jet spreads at the lip{turning}");
    }
}
