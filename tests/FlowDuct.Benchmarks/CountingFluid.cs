using FlowDuct.Fluids;

namespace FlowDuct.Benchmarks;

/// <summary>A fluid that counts the states it is asked for.</summary>
internal sealed class CountingFluid(Fluid fluid) : Fluid
{
    internal int States { get; set; }

    public override string Name => fluid.Name;

    public override string Formulation => fluid.Formulation;

    public override string RangeText => fluid.RangeText;

    public override bool HasSaturation => fluid.HasSaturation;

    internal override double LeastPressure => fluid.LeastPressure;

    internal override double GreatestPressure => fluid.GreatestPressure;

    internal override Outcome FromPT(double p, double T, out FluidState state)
    {
        States++;
        return fluid.FromPT(p, T, out state);
    }

    internal override Outcome FromPH(double p, double h, in FluidState near, out FluidState state)
    {
        States++;
        return fluid.FromPH(p, h, near, out state);
    }

    internal override Outcome FromPS(double p, double s, in FluidState near, out FluidState state)
    {
        States++;
        return fluid.FromPS(p, s, near, out state);
    }

    internal override Outcome FromHS(double h, double s, in FluidState near, out FluidState state)
    {
        States++;
        return fluid.FromHS(h, s, near, out state);
    }

    internal override Outcome FromPX(double p, double x, out FluidState state)
    {
        States++;
        return fluid.FromPX(p, x, out state);
    }

    internal override Outcome FromTX(double T, double x, out FluidState state)
    {
        States++;
        return fluid.FromTX(T, x, out state);
    }

    internal override Outcome FromPRho(double p, double rho, out FluidState state)
    {
        States++;
        return fluid.FromPRho(p, rho, out state);
    }

    internal override bool TrySaturationTemperature(double p, out double T) => fluid.TrySaturationTemperature(p, out T);

    internal override bool TrySaturationPressure(double T, out double p) => fluid.TrySaturationPressure(T, out p);

    internal override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        States++;
        return fluid.TrySaturationOnIsentrope(s, out singlePhaseSide);
    }

    internal override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) => fluid.Explain(outcome, pair, first, second);
}
