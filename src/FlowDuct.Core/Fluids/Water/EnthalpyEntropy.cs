namespace FlowDuct.Fluids.Water;

/// <summary>A state from h and s: along an isentrope dh = v dp, so h rises with p and one bracketed Newton in p finds it.</summary>
internal static class EnthalpyEntropy
{
    private const int MostSteps = 120;

    // Met at once by most states; liquids far from h = 0 keep two digits less, which is still far inside 1e-11.
    private const double Closure = 2e-14;
    private const double NoiseFloor = 2e-12;

    // A bracket this narrow holds a step, not a root: p keeps no more digits.
    private const double BracketEnd = 4e-15;

    internal static Outcome Solve(double h, double s, in FluidState near, out FluidState state)
    {
        if (ColdLiquid.TrySolve(h, s, out Outcome cold, out state)) return cold;
        double p = near.Phase != Phase.None ? near.p : EnthalpyEntropyStart.Pressure(h, s), scale = Math.Max(Math.Abs(h), 1e3);
        (double low, double high) = (WaterConstants.pLeast, WaterConstants.pMost);

        // What stands at each end of the bracket: the end of the range, or a state with too little or too much enthalpy.
        (Outcome atLow, Outcome atHigh) = (Outcome.PairTooLow, Outcome.PairTooHigh);
        for (int i = 0; i < MostSteps && high - low > BracketEnd * high; i++)
        {
            Outcome outcome = Inverse<ByEntropy>.Solve(p, s, out state);
            double gap = outcome == Outcome.Ok ? h - state.h : outcome == Outcome.PairTooLow ? double.PositiveInfinity : double.NegativeInfinity;
            double size = Math.Abs(gap) / scale;
            if (size <= Closure) return Outcome.Ok;
            if (gap > 0) (low, atLow) = (p, outcome);
            else (high, atHigh) = (p, outcome);
            double next = outcome == Outcome.Ok ? Next(p, gap, state) : 0;
            if (size <= NoiseFloor && Math.Abs(next - p) <= 1e-14 * p) return Outcome.Ok;
            p = next > low && next < high ? next : Middle(low, high);
        }

        return Settled(h, s, low, high, atLow, atHigh, out state);
    }

    // A liquid is nearly linear in p, a vapour in ln p.
    private static double Next(double p, double gap, in FluidState at) =>
        at.Phase is Phase.Liquid ? p + (gap / at.v) : p * Math.Exp(Math.Clamp(gap / (p * at.v), -2, 2));

    private static double Middle(double low, double high) => high > 2 * low ? Math.Sqrt(low * high) : (low + high) / 2;

    // The bracket has closed: on a root, its rounding carried past the end of the range; on that end; or on a step between two regions.
    private static Outcome Settled(double h, double s, double low, double high, Outcome atLow, Outcome atHigh, out FluidState state)
    {
        double most = NoiseFloor * Math.Max(Math.Abs(h), 1e3);
        Outcome below = Inverse<ByEntropy>.Solve(low, s, out state);
        if (below == Outcome.Ok && Math.Abs(h - state.h) <= most) return Outcome.Ok;
        Outcome above = Inverse<ByEntropy>.Solve(high, s, out FluidState upper);
        if (above == Outcome.Ok && Math.Abs(h - upper.h) <= most)
        {
            state = upper;
            return Outcome.Ok;
        }

        if (atLow != Outcome.Ok) return atLow;
        if (atHigh != Outcome.Ok) return below == Outcome.Ok && RegionEdge.Hotter(h, s, ref state) ? Outcome.Ok : atHigh;
        return below == Outcome.Ok && RegionEdge.Extend(h, s, ref state) ? Outcome.Ok : Outcome.NotConverged;
    }
}
