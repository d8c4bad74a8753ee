using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>A nozzle whose exit is its narrowest section.</summary>
/// <remarks>
/// The exit plane lies on the path of the given efficiency, subsonic down to its M = 1 point (or to the saturation kink, where the flux may
/// peak). A discharge coefficient scales the isentropic flow and touches no energy; without one the nozzle passes what its path carries.
/// </remarks>
internal static class ConvergentNozzle
{
    /// <summary>Rates the nozzle at a back pressure, Pa.</summary>
    internal static RatingOutcome Rate(in RatingInlet inlet, in NozzleGeometry geometry, double back, out NozzleRating rating)
    {
        rating = default;
        double band = DeviceSolver.LimitTolerance * inlet.p0;
        if (back > inlet.p0 + band) return RatingOutcome.Reversed;
        var path = new LossPath(inlet.Fluid, inlet.h0, inlet.h0, inlet.s, geometry.Efficiency);
        if (!Choking.TryFind(inlet.Fluid, inlet.h0, inlet.s, inlet.p0, out FluidState ideal, out bool atKink)) return WithoutThroat(inlet, path, geometry, back, out rating);
        if (!TrySonic(path, ideal, inlet.p0, out FluidState sonic, out double sonicV)) return RatingOutcome.OutsideRange;
        bool choked = back <= sonic.p + band;
        FluidState exit = sonic;
        double V = sonicV;
        if (!choked && path.At(back, default, out exit, out V) != Outcome.Ok) return RatingOutcome.OutsideRange;
        double isentropic = IsentropicFlux(inlet, ideal, back) * geometry.ExitArea;
        rating = new NozzleRating
        {
            Regime = Math.Abs(back - inlet.p0) <= band ? Regime.NoFlow : choked ? Regime.Choked : Regime.Subsonic,
            MassFlow = geometry.DischargeCoefficient is double Cd ? Cd * isentropic : V / exit.v * geometry.ExitArea,
            IsentropicFlow = isentropic,
            Exit = exit,
            ExitVelocity = V,
            CriticalPressure = ideal.p,
            AtKink = atKink,
            Choked = choked,
            Limits = new BackPressureLimits(sonic.p, null, null),
        };
        return RatingOutcome.Ok;
    }

    // A liquid that does not flash reaches no speed of sound: the exit lies at any back pressure.
    private static RatingOutcome WithoutThroat(
        in RatingInlet inlet, LossPath path, in NozzleGeometry geometry, double back, out NozzleRating rating)
    {
        rating = default;
        if (path.At(Math.Min(back, inlet.p0), default, out FluidState exit, out double V) != Outcome.Ok || !(V < exit.w)) return RatingOutcome.NoThroat;
        if (inlet.Fluid.FromPS(exit.p, inlet.s, exit, out FluidState ideal) != Outcome.Ok) return RatingOutcome.OutsideRange;
        double isentropic = Energy.Velocity(inlet.h0, ideal.h) / ideal.v * geometry.ExitArea;
        rating = new NozzleRating
        {
            Regime = back >= inlet.p0 * (1 - DeviceSolver.LimitTolerance) ? Regime.NoFlow : Regime.Subsonic,
            MassFlow = geometry.DischargeCoefficient is double Cd ? Cd * isentropic : V / exit.v * geometry.ExitArea,
            IsentropicFlow = isentropic,
            Exit = exit,
            ExitVelocity = V,
        };
        return RatingOutcome.Ok;
    }

    private static double IsentropicFlux(in RatingInlet inlet, in FluidState ideal, double back)
    {
        double p = Math.Max(back, ideal.p);
        if (p >= inlet.p0 || inlet.Fluid.FromPS(p, inlet.s, ideal, out FluidState at) != Outcome.Ok) return 0;
        return Energy.Velocity(inlet.h0, at.h) / at.v;
    }

    // A lossy path is slower than the isentrope at each pressure, so its sonic point lies below.
    private static bool TrySonic(LossPath path, in FluidState ideal, double p0, out FluidState sonic, out double V)
    {
        sonic = ideal;
        V = Energy.Velocity(path.h0, ideal.h);
        if (path.Efficiency == 1) return true;
        var excess = new SonicExcess(path);
        double high = Math.Min(ideal.p, p0), low = high, atHigh = excess.At(high), atLow = atHigh;
        while (atLow > 0 && double.IsFinite(atLow)) atLow = excess.At(low *= 0.9);
        if (!double.IsFinite(atLow)) return false;
        double p = atHigh > 0 ? RootFinder.Find(ref excess, low, high, atLow, atHigh) : high;
        return path.At(p, ideal, out sonic, out V) == Outcome.Ok && (ReferenceEquals(path.Fluid, path.Fluid.Relaxed) || NearSideOfReversion(path, p0, ref sonic, ref V));
    }

    // Where a held phase gives way before M = 1 is met the flux is greatest on the near side of that step.
    private static bool NearSideOfReversion(LossPath path, double p0, ref FluidState sonic, ref double V)
    {
        if (sonic.Phase != Phase.Wet) return true;
        double edge = RangeEdge.Find(p => path.At(p, default, out FluidState at, out _) == Outcome.Ok && at.Phase != Phase.Wet, p0, sonic.p);
        if (path.At(edge, default, out FluidState near, out double nearV) != Outcome.Ok) return false;
        if (nearV / near.v > V / sonic.v) (sonic, V) = (near, nearV);
        return true;
    }

    private readonly struct SonicExcess(LossPath path) : IScalarFunction
    {
        public double At(double p) => path.At(p, default, out FluidState at, out double V) == Outcome.Ok ? (at.w * at.w) - (V * V) : double.PositiveInfinity;
    }
}
