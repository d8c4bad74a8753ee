using FlowDuct.Fluids;

namespace FlowDuct.Core.Tests.Support;

/// <summary>
/// A gas of constant heat capacity in closed form, the fluid of NACA Report 1135. It joins the devices through the same abstract
/// class as water and air, so what they solve on it can be held against the report's relations to many digits.
/// </summary>
internal sealed class PerfectGas(double gamma, double R) : Fluid
{
    private readonly double _cp = R * gamma / (gamma - 1);

    public override string Name => "perfect-gas";

    public override string Formulation => "constant heat capacity";

    public override string RangeText => "p 1e-3 Pa to 1e12 Pa";

    public override bool HasSaturation => false;

    internal override double LeastPressure => 1e-3;

    internal override double GreatestPressure => 1e12;

    internal override Outcome FromPT(double p, double T, out FluidState state)
    {
        state = default;
        if (!(T > 0) || !(p > 0)) return Outcome.TemperatureTooLow;
        double v = R * T / p, s = (_cp * Math.Log(T)) - (R * Math.Log(p));
        state = new FluidState(p, T, v, _cp * T, s, _cp, _cp - R, Math.Sqrt(gamma * R * T), 0, Phase.Gas, Notices.None);
        return Outcome.Ok;
    }

    internal override Outcome FromPH(double p, double h, in FluidState near, out FluidState state) => FromPT(p, h / _cp, out state);

    internal override Outcome FromPS(double p, double s, in FluidState near, out FluidState state) =>
        FromPT(p, Math.Exp((s + (R * Math.Log(p))) / _cp), out state);

    internal override Outcome FromHS(double h, double s, in FluidState near, out FluidState state)
    {
        double T = h / _cp;
        state = default;
        return T > 0 ? FromPT(Math.Exp(((_cp * Math.Log(T)) - s) / R), T, out state) : Outcome.PairTooLow;
    }

    internal override Outcome FromPX(double p, double x, out FluidState state)
    {
        state = default;
        return Outcome.NoSaturation;
    }

    internal override Outcome FromTX(double T, double x, out FluidState state) => FromPX(T, x, out state);

    internal override Outcome FromPRho(double p, double rho, out FluidState state) => FromPT(p, p / (rho * R), out state);

    internal override bool TrySaturationTemperature(double p, out double T)
    {
        T = 0;
        return false;
    }

    internal override bool TrySaturationPressure(double T, out double p) => TrySaturationTemperature(T, out p);

    internal override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        return false;
    }

    internal override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        new("T", first, 0, false, "a temperature above zero");
}
