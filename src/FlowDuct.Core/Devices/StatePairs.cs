using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>A state from two independent static properties: the pairs that are accepted, as data.</summary>
internal static class StatePairs
{
    internal delegate Outcome PairSolver(Fluid fluid, double first, double second, out FluidState state);

    /// <summary>A pair: the two figures, how it is solved, and which fluid call explains a failure.</summary>
    internal sealed record Pair(Figure First, Figure Second, StatePair Call, PairSolver Solve)
    {
        internal Figure Mask => First | Second;
    }

    internal static readonly Pair[] All =
    [
        new(Figure.P, Figure.T, StatePair.PT, (Fluid f, double p, double T, out FluidState at) => f.FromPT(p, T, out at)),
        new(Figure.P, Figure.H, StatePair.PH, (Fluid f, double p, double h, out FluidState at) => f.FromPH(p, h, default, out at)),
        new(Figure.P, Figure.S, StatePair.PS, (Fluid f, double p, double s, out FluidState at) => f.FromPS(p, s, default, out at)),
        new(Figure.P, Figure.U, StatePair.PH, FromPU),
        new(Figure.P, Figure.Rho, StatePair.PRho, (Fluid f, double p, double rho, out FluidState at) => f.FromPRho(p, rho, out at)),
        new(Figure.P, Figure.X, StatePair.PX, (Fluid f, double p, double x, out FluidState at) => f.FromPX(p, x, out at)),
        new(Figure.P, Figure.Superheat, StatePair.PX, FromPSuperheat),
        new(Figure.T, Figure.X, StatePair.TX, (Fluid f, double T, double x, out FluidState at) => f.FromTX(T, x, out at)),
        new(Figure.T, Figure.Superheat, StatePair.TX, FromTSuperheat),
        new(Figure.T, Figure.Rho, StatePair.PT, FromTRho),
        new(Figure.H, Figure.S, StatePair.HS, (Fluid f, double h, double s, out FluidState at) => f.FromHS(h, s, default, out at)),
    ];

    /// <summary>The pair made of exactly these figures, or null.</summary>
    internal static Pair? Find(Figure mask) => Array.Find(All, pair => pair.Mask == mask);

    /// <summary>The partners that a figure has in some pair.</summary>
    internal static Figure PartnersOf(Figure figure) =>
        All.Where(pair => (pair.Mask & figure) != 0).Aggregate(Figure.None, (set, pair) => set | pair.Mask) & ~figure;

    /// <summary>Solves a pair or refuses with the limit that was crossed.</summary>
    internal static FluidState Solve(Fluid fluid, Pair pair, StationFigures figures, Station station)
    {
        Outcome outcome = pair.Solve(fluid, figures[pair.First], figures[pair.Second], out FluidState state);
        return outcome == Outcome.Ok
            ? state
            : throw Refusals.OutsideRange(station, fluid, outcome, pair, figures[pair.First], figures[pair.Second]);
    }

    // At constant p both u and h rise with T, so u has one solution; h = u + p v lies above u by the flow work.
    private static Outcome FromPU(Fluid fluid, double p, double u, out FluidState state)
    {
        double Excess(double h) => fluid.FromPH(p, h, default, out FluidState at) == Outcome.Ok ? at.u - u : double.PositiveInfinity;
        state = default;
        Outcome outcome = fluid.FromPH(p, u, default, out FluidState low);
        if (outcome != Outcome.Ok) return outcome;
        double high = u + (p * low.v);
        while (Excess(high) < 0) high += p * low.v;
        double top = Excess(high);
        return double.IsFinite(top) ? fluid.FromPH(p, RootFinder.Find(Excess, u, high, low.u - u, top), default, out state) : Outcome.PairTooHigh;
    }

    private static Outcome FromPSuperheat(Fluid fluid, double p, double superheat, out FluidState state)
    {
        state = default;
        if (!fluid.TrySaturationTemperature(p, out double T)) return Outcome.NoSaturation;
        return superheat == 0 ? fluid.FromPX(p, 1, out state) : fluid.FromPT(p, T + superheat, out state);
    }

    private static Outcome FromTSuperheat(Fluid fluid, double T, double superheat, out FluidState state)
    {
        state = default;
        if (!fluid.TrySaturationPressure(T - superheat, out double p)) return Outcome.NoSaturation;
        return superheat == 0 ? fluid.FromPX(p, 1, out state) : fluid.FromPT(p, T, out state);
    }

    // Density rises with pressure at constant T; between the saturated densities the state is wet.
    private static Outcome FromTRho(Fluid fluid, double T, double rho, out FluidState state)
    {
        double low = fluid.LeastPressure, high = fluid.GreatestPressure;
        if (fluid.TrySaturationPressure(T, out double pSat))
        {
            Outcome wet = fluid.FromPX(pSat, 0, out FluidState liquid);
            if (wet == Outcome.Ok) wet = fluid.FromPX(pSat, 1, out state);
            else state = default;
            if (wet != Outcome.Ok) return wet;
            if (rho <= liquid.rho && rho >= state.rho)
                return fluid.FromPX(pSat, ((1 / rho) - liquid.v) / (state.v - liquid.v), out state);
            if (rho > liquid.rho) low = pSat * (1 + 1e-12);
            else high = pSat;
        }

        double Excess(double p) => fluid.FromPT(p, T, out FluidState at) == Outcome.Ok ? at.rho - rho : double.PositiveInfinity;
        state = default;
        double fLow = Excess(low), fHigh = Excess(high);
        while (double.IsInfinity(fHigh) && high > low * 1.01) fHigh = Excess(high /= 1.01);
        if (fLow > 0) return Outcome.PairTooHigh;
        if (!(fHigh > 0) || double.IsInfinity(fHigh)) return Outcome.PairTooLow;
        return fluid.FromPT(RootFinder.Find(Excess, low, high, fLow, fHigh), T, out state);
    }
}
