namespace FlowDuct.Fluids.Water;

/// <summary>Where an isentrope meets the saturation line: s" falls and s' rises with T to the critical entropy, so once at most.</summary>
internal static class SaturationByEntropy
{
    private const int MostSteps = 80;

    // Beyond it the two phases of Eq. (28) merge at the pressure of Eq. (30).
    private const double HighestT = WaterConstants.Tc - 1e-3;

    /// <summary>Saturation temperature, K, at which the saturated vapour (s above the critical entropy) or liquid has s, J/(kg.K).</summary>
    internal static bool TryTemperature(double s, out double T)
    {
        bool vapour = s >= WaterConstants.sc;
        double low = WaterConstants.TLeast, high = HighestT;
        T = 0;
        if (Excess(low, s, vapour, out _) * Excess(high, s, vapour, out _) > 0) return false;
        T = Start(s, vapour);
        for (int i = 0; i < MostSteps; i++)
        {
            double excess = Excess(T, s, vapour, out double slope);

            // Vapour: too much entropy means too cold. Liquid: too hot.
            if (excess > 0 == vapour) low = T;
            else high = T;
            double next = T - (excess / slope);
            if (!(next >= low && next <= high)) next = (low + high) / 2;
            if (Math.Abs(next - T) <= 4e-16 * T) break;
            T = next;
        }

        return true;
    }

    // SR4-04(2014): h" of s, then T of h and s; h' of s over a heat capacity that grows slowly.
    private static double Start(double s, bool vapour)
    {
        if (vapour && s > 5850) return Math.Clamp(WetTemperature.Of(SaturatedEnthalpy.Vapour2ab(s), s), WaterConstants.TLeast, HighestT);
        double T = vapour ? 600 : WaterConstants.Tt * Math.Exp(s / 4300);
        return Math.Clamp(T, WaterConstants.TLeast, HighestT);
    }

    private static double Excess(double T, double s, bool vapour, out double slope)
    {
        double p = SaturationLine.Pressure(T);
        RegionState at = vapour ? SaturatedPair.VapourAt(p, T) : SaturatedPair.LiquidAt(p, T);
        slope = (at.cp / T) - (at.vT / SaturationLine.Slope(p, T));
        return at.s - s;
    }
}
