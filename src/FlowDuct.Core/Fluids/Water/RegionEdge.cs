namespace FlowDuct.Fluids.Water;

/// <summary>
/// A state from h and s beside an edge, where the cooler equation ends. In a gap that equation is followed past its edge; at the end of the
/// range, where it would need more pressure than the range has, the hotter equation holds the pair.
/// </summary>
internal static class RegionEdge
{
    private const int MostSteps = 30;
    private const double Closure = 1e-13;

    // The same pair by two equations: their states differ by a few parts in a thousand at most.
    private const double Rounding = 1e-9;

    /// <summary>Moves a state at the edge of the cooler region to h and s by Newton on that region's own equation.</summary>
    internal static bool Extend(double h, double s, ref FluidState state)
    {
        if (!Newton(h, s, CoolerRegion(state), state, out RegionState at)) return false;
        state = at.ToState(state.Phase, state.Notices | Notices.RegionGap);
        return true;
    }

    /// <summary>Moves a state at the end of the pressure range to h and s by the equation of the region above its edge.</summary>
    internal static bool Hotter(double h, double s, ref FluidState state)
    {
        int cooler = CoolerRegion(state), hotter = cooler switch { 1 => 3, 3 => 2, _ => 5 };
        double most = hotter == 5 ? WaterConstants.pMost5 : WaterConstants.pMost;
        if (!Newton(h, s, hotter, state, out RegionState at) || at.p > most * (1 + Rounding) || at.T < LeastOf(hotter, at.p)) return false;
        Phase phase = at.p > WaterConstants.pc && at.T > WaterConstants.Tc ? Phase.Supercritical : state.Phase;
        state = at.ToState(phase, NoticesOf.State(at.p, at.T));
        return true;
    }

    private static double LeastOf(int region, double p) => (1 - Rounding) * region switch
    {
        3 => WaterConstants.T13,
        2 => Boundaries.TB23(p),
        _ => WaterConstants.T25,
    };

    private static int CoolerRegion(in FluidState at)
    {
        bool dense = at.T > WaterConstants.T13 && at.T <= WaterConstants.TB23Most && at.p > Boundaries.pB23(at.T) * (1 - 1e-6);
        return dense ? 3 : at.T <= WaterConstants.T13 && at.Phase == Phase.Liquid ? 1 : 2;
    }

    private static bool Newton(double h, double s, int region, in FluidState start, out RegionState at)
    {
        double scaleH = Math.Max(Math.Abs(h), 1e3), scaleS = Math.Max(Math.Abs(s), 1), T = start.T;
        double first = region == 3 ? start.rho : start.p;
        at = default;
        for (int i = 0; i < MostSteps; i++)
        {
            at = Evaluate(region, first, T, out double hFirst, out double hT, out double sFirst, out double sT);
            double dh = at.h - h, ds = at.s - s;
            if (Math.Abs(dh) <= Closure * scaleH && Math.Abs(ds) <= Closure * scaleS) return true;
            double det = (hFirst * sT) - (hT * sFirst);
            first -= ((dh * sT) - (hT * ds)) / det;
            T -= ((hFirst * ds) - (sFirst * dh)) / det;
            if (!(first > 0 && T > WaterConstants.TLeast - 1 && T < 1079)) return false;
        }

        return false;
    }

    // h and s with their derivatives by the first variable (density in region 3, else pressure) and by T.
    private static RegionState Evaluate(
        int region, double first, double T, out double hFirst, out double hT, out double sFirst, out double sT)
    {
        if (region == 3)
        {
            RegionState thick = Region3.State(first, T, out double prho, out double pT);
            (hFirst, hT) = (ByEnthalpy.ByDensity(thick, prho, pT), ByEnthalpy.ByTAtDensity(thick, pT));
            (sFirst, sT) = (ByEntropy.ByDensity(thick, prho, pT), ByEntropy.ByTAtDensity(thick, pT));
            return thick;
        }

        RegionState at = region switch { 1 => Region1.State(first, T), 2 => Region2.State(first, T), _ => Region5.State(first, T) };
        (hFirst, hT, sFirst, sT) = (at.v - (T * at.vT), at.cp, -at.vT, at.cp / T);
        return at;
    }
}
