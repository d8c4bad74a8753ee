namespace FlowDuct.Fluids.Water;

/// <summary>
/// Liquid near 273.15 K from h and s. Below 4 degC an isentrope cools as its pressure rises, so that it may leave the range on the way to a
/// state inside; Newton in p and T on Eq. (7) itself, which is smooth across the edge, does not mind.
/// </summary>
internal static class ColdLiquid
{
    // Up to about 290 K at any pressure.
    private const double MostS = 250;
    private const double MostH = 170e3;

    // h and s pass through zero here: differences of terms a thousand times as large.
    private const double ClosureH = 2e-9;
    private const double ClosureS = 4e-12;
    private const int MostSteps = 20;

    /// <summary>True where the pair names a cold liquid; the outcome then tells whether it lies inside the range.</summary>
    internal static bool TrySolve(double h, double s, out Outcome outcome, out FluidState state)
    {
        (outcome, state) = (Outcome.Ok, default);
        if (!(s < MostS && s > -100 && h < MostH && h > -1e4)) return false;

        // h - T s changes by v dp alone at constant T; s by cp dT/T alone at constant p.
        double T = WaterConstants.Tt * Math.Exp(s / 4200), p = Math.Max((h - (WaterConstants.Tt * s)) * 1e3, WaterConstants.pLeast);
        for (int i = 0; i < MostSteps; i++)
        {
            RegionState at = Region1.State(p, T);
            double dh = h - at.h, ds = s - at.s, hp = at.v - (T * at.vT), det = (hp * at.cp / T) + (at.cp * at.vT);
            if (Math.Abs(dh) <= ClosureH && Math.Abs(ds) <= ClosureS)
                return Judge(at, ref outcome, ref state);
            p += ((dh * at.cp / T) - (at.cp * ds)) / det;
            T += ((hp * ds) + (at.vT * dh)) / det;
            if (!(p > -1e6 && p < 2 * WaterConstants.pMost && T > 250 && T < 320)) return false;
        }

        return false;
    }

    private static bool Judge(in RegionState at, ref Outcome outcome, ref FluidState state)
    {
        if (at.p > WaterConstants.pMost * (1 + 1e-9)) outcome = Outcome.PairTooHigh;
        else if (at.T < WaterConstants.TLeast - ByEdge) outcome = Outcome.PairTooLow;
        else if (at.p < SaturationLine.Pressure(Math.Max(at.T, WaterConstants.TLeast))) return false;
        state = at.ToState(Phase.Liquid, NoticesOf.State(at.p, at.T));
        return true;
    }

    private const double ByEdge = Inverse<ByEntropy>.EdgeRounding;
}
