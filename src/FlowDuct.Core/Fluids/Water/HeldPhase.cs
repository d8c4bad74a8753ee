using FlowDuct.Flow;

namespace FlowDuct.Fluids.Water;

/// <summary>
/// Water of one phase that is kept from changing into the other: vapour that does not condense, liquid that does not flash. At and beyond
/// saturation it is the equilibrium fluid; on the far side the one phase goes on to the end of its equation.
/// </summary>
internal abstract class HeldPhase : Fluid
{
    // A quality this close to the line is the line and its rounding.
    protected const double OnTheLine = 1e-9;

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

    /// <summary>The phase that is held.</summary>
    protected abstract Phase Held { get; }

    internal sealed override Outcome FromPT(double p, double T, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPT(p, T, out state);
        return outcome != Outcome.Ok || IsEquilibrium(state) ? outcome : Accept(Equation(p, T), out state);
    }

    internal sealed override Outcome FromPH(double p, double h, in FluidState near, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPH(p, h, near, out state);
        return outcome != Outcome.Ok || IsEquilibrium(state) ? outcome : Solve(p, h, byEntropy: false, out state);
    }

    internal sealed override Outcome FromPS(double p, double s, in FluidState near, out FluidState state)
    {
        Outcome outcome = WaterFluid.Instance.FromPS(p, s, near, out state);
        return outcome != Outcome.Ok || IsEquilibrium(state) ? outcome : Solve(p, s, byEntropy: true, out state);
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

    internal sealed override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        return false;
    }

    internal sealed override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        WaterFluid.Instance.Explain(outcome, pair, first, second);

    // h and s rise with T along each equation: Newton at constant p from saturation.
    private Outcome Solve(double p, double y, bool byEntropy, out FluidState state)
    {
        state = default;
        if (!WaterFluid.Instance.TrySaturationTemperature(p, out double T)) return Outcome.NoSaturation;
        for (int i = 0; i < MostSteps; i++)
        {
            RegionState at = Equation(p, T);
            double excess = (byEntropy ? at.s : at.h) - y;
            if (Math.Abs(excess) <= Closure * Math.Max(Math.Abs(y), byEntropy ? 1 : 1e3)) return Accept(at, out state);
            double step = excess / (byEntropy ? at.cp / at.T : at.cp);
            if (!(Math.Abs(step) < 150) || !(T - step > 200 && T - step < WaterConstants.Tc)) return Outcome.PairTooLow;
            T -= step;
            if (Math.Abs(step) <= 4e-16 * T) return Accept(Equation(p, T), out state);
        }

        return Outcome.NotConverged;
    }

    private Outcome Accept(in RegionState at, out FluidState state)
    {
        state = at.ToState(Held, Notices.Metastable);
        return at.cp > 0 && at.w > 0 ? Check(at) : Outcome.PairTooLow;
    }
}
