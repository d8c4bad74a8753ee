using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>The functions behind <see cref="InletRecipes"/>.</summary>
internal static class InletSolvers
{
    // A Mach number that the path steps over (at saturation) is no solution; any real root is far closer than this.
    private const double MachClosure = 1e-8;

    internal static Outcome Static(
        Fluid fluid, StationFigures given, StatePairs.Pair pair, VelocityDatum datum, out FluidState state, out double V)
    {
        Outcome outcome = pair.Solve(fluid, given[pair.First], given[pair.Second], out state);
        V = outcome == Outcome.Ok ? datum.At(state) : 0;
        return outcome;
    }

    internal static Outcome PitotPair(Fluid fluid, StationFigures given, StatePairs.Pair pair, out FluidState state, out double V)
    {
        V = 0;
        Outcome outcome = pair.Solve(fluid, given[pair.First], given[pair.Second], out state);
        if (outcome != Outcome.Ok) return outcome;
        outcome = fluid.FromPS(given[Figure.P0], state.s, state, out FluidState rest);
        if (outcome == Outcome.Ok) V = Energy.Velocity(rest.h, state.h);
        return outcome;
    }

    internal static Outcome PitotFromStagnation(
        Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V)
    {
        V = 0;
        Outcome outcome = StagnationState(fluid, given, out FluidState rest);
        state = rest;
        if (outcome == Outcome.Ok) outcome = fluid.FromPS(given[Figure.P], rest.s, rest, out state);
        if (outcome == Outcome.Ok) V = Energy.Velocity(rest.h, state.h);
        return outcome;
    }

    internal static Outcome Plenum(Fluid fluid, StationFigures given, StatePairs.Pair pair, out FluidState state, out double V)
    {
        V = 0;
        return pair.Solve(fluid, given[Figure.P0], given[pair.Second], out state);
    }

    /// <summary>p with T0 or h0 and a velocity: the static enthalpy whose stagnation state meets the probe.</summary>
    internal static Outcome StaticTapWithStagnationProbe(
        Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V)
    {
        V = 0;
        double p = given[Figure.P];
        bool byTemperature = given.Has(Figure.T0);
        Outcome outcome = byTemperature ? fluid.FromPT(p, given[Figure.T0], out state) : fluid.FromPH(p, given[Figure.H0], default, out state);
        if (outcome != Outcome.Ok) return outcome;

        double Excess(double h)
        {
            if (fluid.FromPH(p, h, default, out FluidState at) != Outcome.Ok) return double.NegativeInfinity;
            if (Stagnation.Of(fluid, at, datum.At(at), out FluidState rest) != Outcome.Ok) return double.PositiveInfinity;
            return byTemperature ? rest.T - given[Figure.T0] : rest.h - given[Figure.H0];
        }

        double high = state.h, above = Excess(high), step = Math.Max(datum.At(state) * datum.At(state) / 2, 1), low = high - step;
        while (Excess(low) > 0) low -= step *= 2;
        double below = Excess(low);
        if (!double.IsFinite(below) || !double.IsFinite(above)) return Outcome.PairTooLow;
        outcome = fluid.FromPH(p, RootFinder.Find(Excess, low, high, below, above), default, out state);
        V = datum.At(state);
        return outcome;
    }

    /// <summary>p0 with one static property and a velocity: the static pressure whose stagnation pressure is p0.</summary>
    internal static Outcome StaticWithStagnationPressure(
        Fluid fluid, StationFigures given, StatePairs.Pair pair, VelocityDatum datum, out FluidState state, out double V)
    {
        double p0 = given[Figure.P0], second = given[pair.Second];
        double Excess(double p)
        {
            if (pair.Solve(fluid, p, second, out FluidState at) != Outcome.Ok) return double.NegativeInfinity;
            return Stagnation.Of(fluid, at, datum.At(at), out FluidState rest) == Outcome.Ok ? rest.p - p0 : double.PositiveInfinity;
        }

        V = 0;
        state = default;
        double high = p0, above = Excess(high), low = 0.95 * p0;
        while (Excess(low) > 0) low *= 0.9;
        double below = Excess(low);
        if (!double.IsFinite(below) || !double.IsFinite(above)) return Outcome.PairTooLow;
        Outcome outcome = pair.Solve(fluid, RootFinder.Find(Excess, low, high, below, above), second, out state);
        if (outcome == Outcome.Ok) V = datum.At(state);
        return outcome;
    }

    /// <summary>p0 with T0 or h0: at rest, or the static state at the given velocity on the isentrope.</summary>
    internal static Outcome FromStagnation(Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V)
    {
        V = 0;
        Outcome outcome = StagnationState(fluid, given, out FluidState rest);
        state = rest;
        if (outcome != Outcome.Ok || datum.Kind == VelocityKind.None) return outcome;
        if (datum.Kind == VelocityKind.Velocity)
        {
            V = datum.Value;
            return fluid.FromHS(rest.h - (V * V / 2), rest.s, rest, out state);
        }

        outcome = datum.Kind == VelocityKind.Mach ? AtMach(fluid, rest, datum.Value, out state) : AtFlux(fluid, rest, datum.Value, out state);
        if (outcome == Outcome.Ok) V = Energy.Velocity(rest.h, state.h);
        return outcome;
    }

    private static Outcome StagnationState(Fluid fluid, StationFigures given, out FluidState rest) => given.Has(Figure.T0)
        ? fluid.FromPT(given[Figure.P0], given[Figure.T0], out rest)
        : fluid.FromPH(given[Figure.P0], given[Figure.H0], default, out rest);

    private static Outcome AtMach(Fluid fluid, in FluidState rest, double M, out FluidState state)
    {
        double h0 = rest.h, s = rest.s;
        double Excess(double p) => fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok
            ? Energy.Velocity(h0, at.h) - (M * at.w)
            : double.NaN;
        state = rest;
        if (M == 0) return Outcome.Ok;
        double low = rest.p, below = Excess(low);
        while (Excess(low) <= 0) low *= 0.9;
        double above = Excess(low);
        if (double.IsNaN(above)) return Outcome.PairTooLow;
        double root = RootFinder.Find(Excess, low, rest.p, above, below);
        Outcome outcome = fluid.FromPS(root, s, default, out state);
        if (outcome != Outcome.Ok) return outcome;
        return Math.Abs(Excess(root)) <= MachClosure * state.w ? Outcome.Ok : Outcome.PairTooLow;
    }

    private static Outcome AtFlux(Fluid fluid, in FluidState rest, double G, out FluidState state)
    {
        state = rest;
        if (!Choking.TryFind(fluid, rest.h, rest.s, rest.p, out FluidState throat, out _)) return Outcome.PairTooLow;
        if (G > Energy.Velocity(rest.h, throat.h) / throat.v) return Outcome.PairTooHigh;
        double p = Choking.SubsonicPressure(fluid, rest.h, rest.s, G, throat.p, rest.p);
        return fluid.FromPS(p, rest.s, default, out state);
    }
}
