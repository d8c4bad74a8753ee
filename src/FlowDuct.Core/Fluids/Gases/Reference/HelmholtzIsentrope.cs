namespace FlowDuct.Fluids.Gases;

/// <summary>Where an isentrope meets the saturation line of a pure fluid: s" falls and s' rises with T to the critical entropy, so once at most.</summary>
internal static class HelmholtzIsentrope
{
    private const int MostSteps = 80;

    /// <summary>The saturated state that has the entropy s, J/(kg.K); false where none has it.</summary>
    internal static bool TryMeet(SaturatedBoundary boundary, double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        HelmholtzEquation of = boundary.Equation;
        bool vapour = s >= of.At(of.rhoReducing, boundary.Tc).s;
        (double low, double high) = (of.Parameters.Tleast, boundary.Tc * (1 - 2e-7));
        if (Excess(boundary, low, s, vapour, out _, out _) * Excess(boundary, high, s, vapour, out _, out _) > 0) return false;
        double T = 0.9 * boundary.Tc;
        HelmholtzPair pair = default;
        for (int i = 0; i < MostSteps; i++)
        {
            double excess = Excess(boundary, T, s, vapour, out double slope, out pair);

            // Vapour: too much entropy means too cold. Liquid: too hot.
            if (excess > 0 == vapour) low = T;
            else high = T;
            double next = T - (excess / slope);
            if (!(next >= low && next <= high)) next = (low + high) / 2;
            if (Math.Abs(next - T) <= 4e-16 * T || Math.Abs(excess) <= 1e-14 * Math.Abs(s)) break;
            T = next;
        }

        singlePhaseSide = HelmholtzState.Saturated(boundary, pair, vapour ? 1 : 0);
        return true;
    }

    private static double Excess(SaturatedBoundary boundary, double T, double s, bool vapour, out double slope, out HelmholtzPair pair)
    {
        slope = 0;
        if (!boundary.TryAtTemperature(T, out pair)) return 0;
        HelmholtzPoint at = vapour ? pair.Vapour : pair.Liquid;
        slope = at.sT + (at.srho * (pair.Slope - at.pT) / at.prho);
        return at.s - s;
    }
}
