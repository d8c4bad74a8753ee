using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>An exit pressure was given, taken as the back pressure, and the exit plane has another one.</summary>
internal static class BackMismatch
{
    // What a message will need is set aside where its method begins, so that method begins only for a rated nozzle.
    internal static Finding? Check(DeviceAnswer a) => a.Rating is null ? null : OfRated(a);

    private static Finding? OfRated(DeviceAnswer a)
    {
        if (a.Rating is not NozzleRating rating || !a.Case.Back.IsEmpty || a.BackPressure is not double back) return null;
        if (Math.Abs(rating.Exit.p - back) <= DeviceSolver.LimitTolerance * a.Inlet.Stagnation!.Value.p) return null;
        return new Finding("back-mismatch", Severity.Caution, rating.Exit.p, back, "regime of the nozzle", text =>
            $"the exit plane has {text.Text(rating.Exit.p, Dimension.Pressure)}, not the given {text.Text(back, Dimension.Pressure)}, which was taken as the pressure of the space beyond; write --back for that");
    }
}
