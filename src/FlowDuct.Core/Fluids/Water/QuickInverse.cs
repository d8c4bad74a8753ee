namespace FlowDuct.Fluids.Water;

/// <summary>
/// The common case of an inverse: the published guess, Newton on the forward equation, and a state clear of every edge. Its phase needs
/// no saturated state: h and s rise with T at constant p, so a root above (below) saturation lies above h" (below h').
/// </summary>
internal static class QuickInverse<TKind>
    where TKind : struct, IInverseKind
{
    // Guesses are within 25 mK inside their region (R7-97, Table 24); one that is moved further was used outside it.
    private const double MostStep = 0.1;

    // Overlaps and gaps between regions are narrower, 0.07 K at most.
    private const double Clear = 0.15;

    // So small a step moves h, s and v by their first order and every other property by less than 1e-10 of itself.
    private const double Last = 3e-8;
    private const int MostSteps = 3;

    /// <summary>True with the state, or false where the thorough way has to be gone.</summary>
    internal static bool TrySolve(double p, double y, out FluidState state)
    {
        state = default;
        if (y > TKind.LeastOfRegion2) return TryRegion<VapourRegion>(p, y, TKind.GuessRegion2(p, y), ColdEdge(p), WaterConstants.T25, ref state);
        return y < TKind.MostOfRegion1 && p > SaturationLine.pAtLeastT
            && TryRegion<LiquidRegion>(p, y, TKind.GuessRegion1(p, y), WaterConstants.TLeast, HotEdge(p), ref state);
    }

    private static bool TryRegion<TRegion>(double p, double y, double T, double cold, double hot, ref FluidState state)
        where TRegion : struct, IOnePhaseRegion
    {
        (cold, hot) = (cold + Clear, hot - Clear);
        if (!(T > cold && T < hot)) return false;
        TRegion.Caloric(p, T, out double h, out double s, out double cp);
        double step = (y - TKind.Pick(h, s)) / TKind.Slope(cp, T);
        for (int i = 0; i < MostSteps && Math.Abs(step) < MostStep; i++)
        {
            T += step;
            RegionState at = TRegion.State(p, T);
            step = (y - TKind.Of(at)) / TKind.ByT(at);
            if (Math.Abs(step) > Last) continue;
            state = Moved(at, step, TRegion.PhaseAt(p, T));
            return T > cold && T < hot;
        }

        return false;
    }

    private static double HotEdge(double p) => p < SaturationLine.pAtT13 ? SaturationLine.Temperature(p) : WaterConstants.T13;

    private static double ColdEdge(double p)
    {
        if (p > SaturationLine.pAtT13) return Boundaries.TB23(p);
        return p < SaturationLine.pAtLeastT ? WaterConstants.TLeast : SaturationLine.Temperature(p);
    }

    private static FluidState Moved(in RegionState at, double step, Phase phase) => new(
        at.p, at.T + step, at.v + (at.vT * step), at.h + (at.cp * step), at.s + (at.cp / at.T * step), at.cp, at.cv, at.w, 0, phase, Notices.None);
}
