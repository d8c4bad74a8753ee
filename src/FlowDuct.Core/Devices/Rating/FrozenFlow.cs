using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>The most that a throat can pass where vapour does not condense and liquid does not flash.</summary>
internal static class FrozenFlow
{
    /// <summary>The frozen flow of a rated nozzle, kg/s; null where its fluid has one phase only or the bound is not known.</summary>
    internal static double? Of(DeviceAnswer a)
    {
        if (!a.Fluid.HasSaturation || a.Rating is not NozzleRating rating || a.Inlet.Stagnation is not FluidState rest) return null;
        double area = ThroatArea(a), back = a.BackPressure!.Value;
        bool crosses = rating.AtKink || rating.Exit.Phase == Phase.Wet || rating.Throat.Phase == Phase.Wet;
        if (!crosses || !a.Fluid.TryHeld(rest, Onset.AtTheEnd, out Fluid? held)) return null;
        var inlet = new RatingInlet(held, rest.h, rest.s, rest.p);
        RatingOutcome outcome = ConvergentNozzle.Rate(inlet, new NozzleGeometry(area, area, 1, null), back, out NozzleRating frozen);
        return outcome == RatingOutcome.Ok && !frozen.AtKink ? frozen.MassFlow : null;
    }

    /// <summary>True where a flow, kg/s, stays under the frozen bound.</summary>
    internal static bool Allows(DeviceAnswer a, double flow) => Of(a) is double most && flow <= most;

    private static double ThroatArea(DeviceAnswer a)
    {
        StationAnswer narrow = a.Throat ?? a.Exit;
        return narrow.Area!.Value * narrow.Openings;
    }
}
