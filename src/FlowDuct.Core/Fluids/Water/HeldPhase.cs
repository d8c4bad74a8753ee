using FlowDuct.Flow;

namespace FlowDuct.Fluids.Water;

/// <summary>
/// Water of one phase that is kept from changing into the other: vapour that does not condense, liquid that does not flash. At and beyond
/// saturation it is the equilibrium fluid; on the far side the one phase goes on to its onset, at which it returns to equilibrium at constant
/// pressure and enthalpy (so at constant velocity too) and gains entropy.
/// </summary>
/// <param name="onset">Where the phase gives way.</param>
internal abstract class HeldPhase(Onset onset) : Fluid
{
    // A quality this close to the line is the line and its rounding.
    protected const double OnTheLine = 1e-9;

    // An onset is met from within by a root of the same functions: their rounding, as a mass fraction or in hundreds of kelvins.
    private const double Rounding = 1e-11;
    private const double DifferenceScale = 100;

    // In pressure, on the way from saturation to the onset.
    private const double Stride = 0.97;

    private const int MostSteps = 60;
    private const double Closure = 2e-14;

    public sealed override string Name => "water";

    // The devices ask for it to look for a change of phase, and here there is none.
    public sealed override bool HasSaturation => false;

    internal sealed override double LeastPressure => WaterConstants.pLeast;

    internal sealed override double GreatestPressure => WaterConstants.pMost;

    /// <summary>True where the equilibrium state is the held one.</summary>
    protected abstract bool IsEquilibrium(in FluidState at);

    /// <summary>The equation of the held phase, past saturation too.</summary>
    protected abstract RegionState Equation(double p, double T);

    /// <summary>Whether the equation holds at a state past saturation.</summary>
    protected abstract Outcome Check(in RegionState at);

    /// <summary>Mass fraction of the other phase at equilibrium.</summary>
    protected abstract double OtherPhase(in SaturatedPair pair, double h);

    /// <summary>Water in equilibrium.</summary>
    internal sealed override Fluid Relaxed => WaterFluid.Instance;

    /// <summary>The phase that is held.</summary>
    protected abstract Phase Held { get; }

    internal sealed override Outcome FromPT(double p, double T, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPT(p, T, out state);
        if (outcome != Outcome.Ok || IsEquilibrium(state)) return outcome;
        RegionState held = Equation(p, T);
        return Excess(held) > 0 ? Outcome.PairTooLow : Accept(held, out state);
    }

    internal sealed override Outcome FromPH(double p, double h, in FluidState near, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPH(p, h, near, out state);
        if (outcome != Outcome.Ok || IsEquilibrium(state)) return outcome;
        FluidState relaxed = state;
        if (FractionExcess(p, h) > Rounding) return Outcome.Ok;
        outcome = Solve(p, h, byEntropy: false, out state, out bool beyond);
        if (!beyond && (outcome == Outcome.Ok || double.IsInfinity(onset.Difference))) return outcome;
        state = relaxed;
        return Outcome.Ok;
    }

    internal sealed override Outcome FromPS(double p, double s, in FluidState near, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPS(p, s, near, out state);
        if (outcome != Outcome.Ok || IsEquilibrium(state)) return outcome;
        outcome = Solve(p, s, byEntropy: true, out state, out bool beyond);
        return beyond || outcome != Outcome.Ok ? Reverted(p, s, near, outcome, out state) : outcome;
    }

    // Along an isentrope dh = v dp.
    internal sealed override Outcome FromHS(double h, double s, in FluidState near, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromHS(h, s, near, out state);
        if (outcome != Outcome.Ok || IsEquilibrium(state)) return outcome;
        double p = near.p > 0 ? near.p : state.p;
        for (int i = 0; i < MostSteps; i++)
        {
            outcome = FromPS(p, s, near, out state);
            if (outcome != Outcome.Ok) return outcome;
            double gap = h - state.h;
            if (Math.Abs(gap) <= 1e-12 * Math.Max(Math.Abs(h), 1e3)) return Outcome.Ok;
            p *= Math.Exp(Math.Clamp(gap / (p * state.v), -1, 1));
            if (!(p >= WaterConstants.pLeast && p <= WaterConstants.pMost)) return Outcome.PairTooLow;
        }

        return Outcome.NotConverged;
    }

    internal sealed override Outcome FromPX(double p, double x, out FluidState state) => WaterFluid.Instance.FromPX(p, x, out state);

    internal sealed override Outcome FromTX(double T, double x, out FluidState state) => WaterFluid.Instance.FromTX(T, x, out state);

    internal sealed override Outcome FromPRho(double p, double rho, out FluidState state) => WaterFluid.Instance.FromPRho(p, rho, out state);

    internal sealed override bool TrySaturationTemperature(double p, out double T) => WaterFluid.Instance.TrySaturationTemperature(p, out T);

    internal sealed override bool TrySaturationPressure(double T, out double p) => WaterFluid.Instance.TrySaturationPressure(T, out p);

    /// <summary>For the devices the onset is what saturation is to the equilibrium fluid: the one-phase side of a step.</summary>
    internal sealed override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        if (!WaterFluid.Instance.TrySaturationOnIsentrope(s, out singlePhaseSide)) return false;
        double inside = singlePhaseSide.p, outside = inside;
        var excess = new OnsetExcess(this, s);

        // The equation of the held phase meets that of the region to a few digits only: so early an onset is saturation itself.
        if (excess.At(inside) > 0) return true;
        do
        {
            inside = outside;
            outside *= Stride;
            if (!(outside > WaterConstants.pLeast) || !excess.IsKnown(outside)) return false;
        }
        while (!(excess.At(outside) > 0));
        double p = RootFinder.Find(ref excess, outside, inside, excess.At(outside), excess.At(inside));
        if (excess.At(p) > Rounding) p *= 1 + 1e-12;
        return Solve(p, s, byEntropy: true, out singlePhaseSide, out bool beyond) == Outcome.Ok && !beyond;
    }

    internal sealed override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        WaterFluid.Instance.Explain(outcome, pair, first, second);

    // Behind the onset the stream is in equilibrium, at the entropy that it has after the return.
    private Outcome Reverted(double p, double s, in FluidState near, Outcome otherwise, out FluidState state)
    {
        state = default;
        if (!TrySaturationOnIsentrope(s, out FluidState edge) || p >= edge.p) return otherwise == Outcome.Ok ? Outcome.NotConverged : otherwise;
        Outcome outcome = WaterFluid.Instance.FromPH(edge.p, edge.h, default, out FluidState relaxed);
        return outcome == Outcome.Ok ? WaterFluid.Instance.FromPS(p, relaxed.s, near, out state) : outcome;
    }

    // Above zero behind the onset.
    private double Excess(in RegionState at) => WaterFluid.Instance.TrySaturationTemperature(at.p, out double T)
        ? Math.Max(FractionExcess(at.p, at.h), (Math.Abs(T - at.T) - onset.Difference) / DifferenceScale)
        : double.PositiveInfinity;

    private double FractionExcess(double p, double h) => double.IsInfinity(onset.Fraction) ? double.NegativeInfinity
        : WaterFluid.Instance.TrySaturationTemperature(p, out double T) ? OtherPhase(SaturatedPair.At(p, T), h) - onset.Fraction
        : double.PositiveInfinity;

    // h and s rise with T along each equation: Newton at constant p from saturation.
    private Outcome Solve(double p, double y, bool byEntropy, out FluidState state, out bool beyond)
    {
        beyond = false;
        Outcome outcome = Newton(p, y, byEntropy, out RegionState at);
        if (outcome != Outcome.Ok)
        {
            state = default;
            return outcome;
        }

        outcome = Accept(at, out state);
        beyond = outcome == Outcome.Ok && Excess(at) > Rounding;
        return outcome;
    }

    private Outcome Newton(double p, double y, bool byEntropy, out RegionState at)
    {
        at = default;
        if (!WaterFluid.Instance.TrySaturationTemperature(p, out double T)) return Outcome.NoSaturation;
        for (int i = 0; i < MostSteps; i++)
        {
            at = Equation(p, T);
            double excess = (byEntropy ? at.s : at.h) - y;
            if (Math.Abs(excess) <= Closure * Math.Max(Math.Abs(y), byEntropy ? 1 : 1e3)) return Outcome.Ok;
            double step = excess / (byEntropy ? at.cp / at.T : at.cp);
            if (!(Math.Abs(step) < 150) || !(T - step > 200 && T - step < WaterConstants.Tc)) return Outcome.PairTooLow;
            T -= step;
            if (Math.Abs(step) > 4e-16 * T) continue;
            at = Equation(p, T);
            return Outcome.Ok;
        }

        return Outcome.NotConverged;
    }

    private Outcome Accept(in RegionState at, out FluidState state)
    {
        state = at.ToState(Held, Notices.Metastable);
        return at.cp > 0 && at.w > 0 ? Check(at) : Outcome.PairTooLow;
    }

    private readonly struct OnsetExcess(HeldPhase fluid, double s) : IScalarFunction
    {
        public double At(double p) => Outcome.Ok == fluid.Newton(p, s, byEntropy: true, out RegionState at) ? fluid.Excess(at) : double.PositiveInfinity;

        internal bool IsKnown(double p) => fluid.Newton(p, s, byEntropy: true, out RegionState at) == Outcome.Ok && fluid.Check(at) == Outcome.Ok;
    }
}
