using FlowDuct.Devices.Coefficients;
using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>Where the published criteria let the flow of an overexpanded nozzle leave the wall.</summary>
/// <param name="Band">Wall pressure over back pressure at the exit plane's Mach number: below the greatest it may separate, below the least all say so.</param>
/// <param name="AreaRatio">Section over throat at the first criterion to be met; null where none is.</param>
internal readonly record struct Separation(Interval Band, double? AreaRatio)
{
    /// <summary>The band of a rated nozzle; null where it is not overexpanded.</summary>
    internal static Separation? Of(DeviceAnswer a)
    {
        if (a.Rating is not NozzleRating { Regime: Regime.Overexpanded } rating || a.BackPressure is not double back) return null;
        double ratio = a.Inlet.Stagnation!.Value.p / back, M = rating.ExitVelocity / rating.Exit.w;
        Interval band = SeparationCriteria.Band(M, ratio);
        return new Separation(band, rating.Exit.p / back < band.Greatest ? First(a, rating, back, ratio) : null);
    }

    // Downstream the wall pressure falls faster than any criterion does: the first to be met is met once.
    private static double? First(DeviceAnswer a, in NozzleRating rating, double back, double ratio)
    {
        FluidState throat = rating.Throat, exit = rating.Exit;
        double h0 = exit.h + (rating.ExitVelocity * rating.ExitVelocity / 2);
        var path = new LossPath(a.ExpandingFluid, h0, throat.h, throat.s, EfficiencyOf(a.ExpandingFluid, throat, exit));
        double p = RootFinder.Find(Excess, exit.p, throat.p, Excess(exit.p), Excess(throat.p));
        return path.At(p, default, out FluidState at, out double V) == Outcome.Ok ? rating.ThroatVelocity / throat.v * at.v / V : null;

        double Excess(double p) => path.At(p, default, out FluidState at, out double V) == Outcome.Ok
            ? (p / back) - SeparationCriteria.Band(V / at.w, ratio).Greatest
            : double.NegativeInfinity;
    }

    private static double EfficiencyOf(Fluid fluid, in FluidState throat, in FluidState exit) =>
        fluid.FromPS(exit.p, throat.s, exit, out FluidState ideal) == Outcome.Ok && ideal.h < throat.h ? (throat.h - exit.h) / (throat.h - ideal.h) : 1;
}
