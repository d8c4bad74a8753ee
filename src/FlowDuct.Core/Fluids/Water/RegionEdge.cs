namespace FlowDuct.Fluids.Water;

/// <summary>A state from h and s in the gap between two regions: the cooler region's equation is followed past its edge.</summary>
internal static class RegionEdge
{
    private const int MostSteps = 30;
    private const double Closure = 1e-13;

    /// <summary>Moves a state at the edge of the cooler region to h and s by Newton on that region's own equation.</summary>
    internal static bool Extend(double h, double s, ref FluidState state)
    {
        bool dense = state.T > WaterConstants.T13 && state.T <= WaterConstants.TB23Most && state.p > Boundaries.pB23(state.T) * (1 - 1e-6);
        double scaleH = Math.Max(Math.Abs(h), 1e3), scaleS = Math.Max(Math.Abs(s), 1), first = dense ? state.rho : state.p, T = state.T;
        bool liquid = state.Phase == Phase.Liquid && !dense;
        for (int i = 0; i < MostSteps; i++)
        {
            RegionState at = Evaluate(dense, liquid, first, T, out double hFirst, out double hT, out double sFirst, out double sT);
            double dh = at.h - h, ds = at.s - s;
            if (Math.Abs(dh) <= Closure * scaleH && Math.Abs(ds) <= Closure * scaleS)
            {
                state = at.ToState(state.Phase, state.Notices | Notices.RegionGap);
                return true;
            }

            double det = (hFirst * sT) - (hT * sFirst);
            first -= ((dh * sT) - (hT * ds)) / det;
            T -= ((hFirst * ds) - (sFirst * dh)) / det;
            if (!(first > 0 && T > WaterConstants.TLeast - 1 && T < 1079)) return false;
        }

        return false;
    }

    // h and s with their derivatives by the first variable (density in region 3, else pressure) and by T.
    private static RegionState Evaluate(
        bool dense, bool liquid, double first, double T, out double hFirst, out double hT, out double sFirst, out double sT)
    {
        if (dense)
        {
            RegionState thick = Region3.State(first, T, out double prho, out double pT);
            (hFirst, hT) = (ByEnthalpy.ByDensity(thick, prho, pT), ByEnthalpy.ByTAtDensity(thick, pT));
            (sFirst, sT) = (ByEntropy.ByDensity(thick, prho, pT), ByEntropy.ByTAtDensity(thick, pT));
            return thick;
        }

        RegionState at = liquid ? Region1.State(first, T) : Region2.State(first, T);
        (hFirst, hT, sFirst, sT) = (at.v - (T * at.vT), at.cp, -at.vT, at.cp / T);
        return at;
    }
}
