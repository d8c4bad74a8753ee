namespace FlowDuct.Fluids.Water;

/// <summary>A state from h and s: along an isentrope dh = v dp, so h rises with p and one bracketed Newton in p finds it.</summary>
internal static class EnthalpyEntropy
{
    private const int MostSteps = 100;
    private const double Closure = 2e-14;

    // Vapour is started here without a neighbour: the middle of what plants use.
    private const double Start = 1e6;

    internal static Outcome Solve(double h, double s, in FluidState near, out FluidState state)
    {
        double low = WaterConstants.pLeast, high = WaterConstants.pMost;
        double p = near.Phase != Phase.None ? near.p : Start;
        Outcome last = Outcome.PairTooLow;
        for (int i = 0; i < MostSteps; i++)
        {
            Outcome outcome = Inverse<ByEntropy>.Solve(p, s, out state);
            double next;
            if (outcome == Outcome.Ok)
            {
                double gap = h - state.h;
                if (Math.Abs(gap) <= Closure * Math.Max(Math.Abs(h), 1e3)) return Outcome.Ok;
                if (gap > 0) low = p;
                else high = p;
                next = Next(p, gap, state);
            }
            else
            {
                // Too little entropy for this pressure lies at a lower temperature: the isentrope is met at higher pressures.
                last = outcome;
                if (outcome == Outcome.PairTooLow) low = p;
                else high = p;
                next = double.NaN;
            }

            if (!(next > low && next < high)) next = Math.Sqrt(low * high);
            if (Math.Abs(next - p) <= 4e-16 * p) return Settled(outcome, h, state, last);
            p = next;
        }

        state = default;
        return last;
    }

    // A liquid is nearly linear in p, a vapour in ln p.
    private static double Next(double p, double gap, in FluidState at) =>
        at.Phase is Phase.Liquid ? p + (gap / at.v) : p * Math.Exp(Math.Clamp(gap / (p * at.v), -2, 2));

    // The bracket has closed: on the state, or on the end of the range that the isentrope runs into.
    private static Outcome Settled(Outcome outcome, double h, in FluidState at, Outcome last)
    {
        if (outcome != Outcome.Ok) return outcome;
        double gap = h - at.h;
        if (Math.Abs(gap) <= 1e-11 * Math.Max(Math.Abs(h), 1e3)) return Outcome.Ok;
        return last == Outcome.Ok || gap > 0 ? Outcome.PairTooHigh : Outcome.PairTooLow;
    }
}
