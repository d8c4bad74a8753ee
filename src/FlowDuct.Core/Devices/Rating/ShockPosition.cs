using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>Where in the divergence a normal shock has to stand so that the flow behind it reaches the exit state.</summary>
internal static class ShockPosition
{
    // Of the kinetic energy of the exit: a hundred times the closure of the property calls.
    private const double Closure = 1e-11;

    /// <summary>Finds the shock; the exit state is known from mass, energy and the back pressure.</summary>
    internal static bool TryFind(
        Fluid behind, in RatingInlet inlet, in NozzleGeometry geometry, in DivergentLimits limits, in FluidState exit, double exitVelocity, out ShockAnswer shock)
    {
        var excess = new Excess(behind, inlet, geometry, limits, exit.p, exitVelocity);
        double strong = limits.Exit.p, weak = limits.Throat.p * (1 - 1e-9), atStrong = excess.Of(limits.Behind), atWeak = excess.WithoutLoss;

        // So near the throat (or the exit) that rounding decides: the shock stands there.
        double p = Math.Sign(atStrong) == Math.Sign(atWeak)
            ? Math.Abs(atStrong) < Math.Abs(atWeak) ? strong : weak
            : RootFinder.Find(ref excess, strong, weak, atStrong, atWeak, Closure * exitVelocity * exitVelocity);
        return excess.TryShock(p, out shock);
    }

    // In terms of the pressure before the shock: how much kinetic energy the exit would have too much.
    private readonly struct Excess(Fluid fluid, RatingInlet inlet, NozzleGeometry geometry, DivergentLimits limits, double back, double exitVelocity) : IScalarFunction
    {
        private readonly LossPath _path = new(inlet.Fluid, inlet.h0, limits.Throat.h, inlet.s, limits.DivergenceEfficiency);
        private readonly double _throatFlux = limits.Flux * (geometry.DischargeCoefficient ?? 1);

        public double At(double p) => TryShock(p, out ShockAnswer shock) ? Of(shock) : double.NegativeInfinity;

        /// <summary>What a shock too weak to lose anything leaves: it would stand in the throat.</summary>
        internal double WithoutLoss => inlet.Fluid.FromPS(back, inlet.s, limits.Throat, out FluidState ideal) == Outcome.Ok
            ? (geometry.Efficiency * (inlet.h0 - ideal.h)) - (exitVelocity * exitVelocity / 2)
            : double.NegativeInfinity;

        internal double Of(in ShockAnswer shock)
        {
            if (fluid.FromPS(back, shock.Downstream.s, shock.Downstream, out FluidState ideal) != Outcome.Ok) return double.NegativeInfinity;
            double share = (shock.AreaRatio - 1) / ((geometry.ExitArea / geometry.ThroatArea) - 1);
            double efficiency = 1 - ((1 - geometry.Efficiency) * Math.Clamp(1 - share, 0, 1));
            return (efficiency * (inlet.h0 - ideal.h)) - (exitVelocity * exitVelocity / 2);
        }

        internal bool TryShock(double p, out ShockAnswer shock)
        {
            shock = default;
            if (_path.At(p, limits.Throat, out FluidState before, out double V) != Outcome.Ok) return false;
            double area = _throatFlux * before.v / V;
            if (!NormalShock.TryFind(fluid, before, V, out FluidState behind, out double V2)) (behind, V2) = (before, V);
            shock = new ShockAnswer(before, V, behind, V2, area);
            return true;
        }
    }
}
