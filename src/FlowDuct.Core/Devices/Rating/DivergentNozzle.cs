using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>A nozzle with a throat before its exit: limits first, then the regime, then the states.</summary>
/// <remarks>
/// The throat is isentropic, losses fall into the divergence; the exit carries the flow of the throat. The efficiency is that of the supersonic
/// expansion to the exit plane, and of a subsonic exit that follows the throat. Behind a shock the remaining divergence has the share of the loss
/// that its share of the area growth gives, so that the regimes meet without a step.
/// </remarks>
internal static class DivergentNozzle
{
    /// <summary>Rates the nozzle at a back pressure, Pa.</summary>
    internal static RatingOutcome Rate(in RatingInlet inlet, in NozzleGeometry geometry, double back, out NozzleRating rating)
    {
        RatingOutcome outcome = DivergentLimits.Find(inlet, geometry, out DivergentLimits limits);
        rating = default;
        return outcome == RatingOutcome.Ok ? Rate(inlet, geometry, limits, back, out rating) : outcome;
    }

    /// <summary>The same with the limits found before, for many back pressures of one nozzle.</summary>
    internal static RatingOutcome Rate(in RatingInlet inlet, in NozzleGeometry geometry, in DivergentLimits limits, double back, out NozzleRating rating)
    {
        rating = default;
        double band = DeviceSolver.LimitTolerance * inlet.p0;
        if (back > inlet.p0 + band) return RatingOutcome.Reversed;
        double choked = (geometry.DischargeCoefficient ?? 1) * limits.Flux * geometry.ThroatArea;
        var all = new NozzleRating
        {
            MassFlow = choked,
            IsentropicFlow = limits.Flux * geometry.ThroatArea,
            Throat = limits.Throat,
            ThroatVelocity = limits.ThroatVelocity,
            CriticalPressure = limits.Throat.p,
            AtKink = limits.AtKink,
            Choked = true,
            Limits = limits.Pressures,
        };
        if (back > limits.Pressures.Subsonic + band) return Subsonic(inlet, geometry, limits, back, all, out rating);
        if (back >= limits.Pressures.Subsonic - band) return BackFixesExit(inlet.Fluid, inlet, geometry, back, all with { Regime = Regime.ChokedSubsonicExit }, out rating);
        if (limits.Pressures.ShockAtExit is not double shocked) return limits.Hidden;
        if (back > shocked + band) return WithShock(inlet, geometry, limits, back, all, out rating);
        Regime regime = back >= shocked - band ? Regime.ShockAtExit
            : back > limits.Pressures.FullExpansion + band ? Regime.Overexpanded
            : back >= limits.Pressures.FullExpansion - band ? Regime.FullyExpanded : Regime.Underexpanded;
        rating = all with { Regime = regime, Exit = limits.Exit, ExitVelocity = limits.ExitVelocity };
        if (regime == Regime.ShockAtExit) rating = rating with { Exit = limits.Behind.Downstream, ExitVelocity = limits.Behind.V2, Shock = limits.Behind };
        return RatingOutcome.Ok;
    }

    // Nothing chokes: the exit lies at the back pressure and fixes the flow; the throat carries it isentropically.
    private static RatingOutcome Subsonic(
        in RatingInlet inlet, in NozzleGeometry geometry, in DivergentLimits limits, double back, in NozzleRating all, out NozzleRating rating)
    {
        rating = default;
        var path = new LossPath(inlet.Fluid, inlet.h0, inlet.h0, inlet.s, geometry.Efficiency);
        if (path.At(Math.Min(back, inlet.p0), default, out FluidState exit, out double V) != Outcome.Ok) return RatingOutcome.OutsideRange;
        bool still = back >= inlet.p0 * (1 - DeviceSolver.LimitTolerance);
        double flow = V / exit.v * geometry.ExitArea, throatFlux = flow / (geometry.ThroatArea * (geometry.DischargeCoefficient ?? 1));
        FluidState throat = exit;
        double throatV = V;
        var isentrope = path with { Efficiency = 1 };
        if (!still && !FluxRoot.TryFind(isentrope, throatFlux, limits.Throat.p, inlet.p0, (limits.Throat.p + inlet.p0) / 2, out throat, out throatV))
            return RatingOutcome.NotConverged;
        rating = all with
        {
            Regime = still ? Regime.NoFlow : Regime.Subsonic,
            MassFlow = flow,
            IsentropicFlow = flow / (geometry.DischargeCoefficient ?? 1),
            Exit = exit,
            ExitVelocity = V,
            Throat = throat,
            ThroatVelocity = throatV,
            Choked = false,
        };
        return RatingOutcome.Ok;
    }

    // A subsonic exit at the back pressure that carries the flow of the choked throat: mass and energy alone fix it.
    private static RatingOutcome BackFixesExit(Fluid fluid, in RatingInlet inlet, in NozzleGeometry geometry, double back, in NozzleRating all, out NozzleRating rating)
    {
        bool found = SubsonicExit.TryFind(fluid, inlet.h0, back, all.MassFlow / geometry.ExitArea, out FluidState exit, out double V);
        rating = all with { Exit = exit, ExitVelocity = V };
        return found ? RatingOutcome.Ok : RatingOutcome.NotConverged;
    }

    private static RatingOutcome WithShock(
        in RatingInlet inlet, in NozzleGeometry geometry, in DivergentLimits limits, double back, in NozzleRating all, out NozzleRating rating)
    {
        RatingOutcome outcome = WithShock(inlet.Fluid, inlet, geometry, limits, back, all, out rating);
        bool held = !ReferenceEquals(inlet.Fluid, inlet.Fluid.Relaxed);
        if (!held || (outcome == RatingOutcome.Ok && rating.Shock!.Value.Upstream.Phase != Phase.Wet)) return outcome;

        // The held phase has given way before the shock: what follows is in equilibrium.
        return WithShock(inlet.Fluid.Relaxed, inlet, geometry, limits, back, all, out rating);
    }

    private static RatingOutcome WithShock(
        Fluid behind, in RatingInlet inlet, in NozzleGeometry geometry, in DivergentLimits limits, double back, in NozzleRating all, out NozzleRating rating)
    {
        RatingOutcome outcome = BackFixesExit(behind, inlet, geometry, back, all with { Regime = Regime.ShockInDivergence }, out rating);
        if (outcome != RatingOutcome.Ok) return outcome;
        if (!ShockPosition.TryFind(behind, inlet, geometry, limits, rating.Exit, rating.ExitVelocity, out ShockAnswer shock)) return RatingOutcome.NotConverged;
        rating = rating with { Shock = shock };
        return RatingOutcome.Ok;
    }
}
