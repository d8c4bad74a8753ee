namespace FlowDuct.Fluids.Water;

/// <summary>Where the search for h and s begins: the published p(h,s) of the region that the pair seems to name, SR2-01(2014) and SR4-04(2014).</summary>
internal static class EnthalpyEntropyStart
{
    // s' and s" at 623.15 K, and the least and greatest s along the edge of regions 2 and 3; SR4-04(2014), sections 4.3 to 4.6.
    private const double s1At623 = 3778.281340;
    private const double s2At623 = 5210.887825;
    private const double sB23Least = 5048.096828;
    private const double s13Least = 3397.782955;
    private const double s2bc = 5850;

    // In the middle of what plants use; for wet states of little entropy no equation is published.
    private const double Middle = 1e6;

    /// <summary>A pressure, Pa, inside the range; close to the root where a published equation covers the pair.</summary>
    internal static double Pressure(double h, double s)
    {
        double p = s < WaterConstants.sc ? OfLiquid(h, s) : OfVapour(h, s);
        return p > WaterConstants.pLeast && p < WaterConstants.pMost ? p : Middle;
    }

    private static double OfLiquid(double h, double s)
    {
        if (s > s1At623) return h >= SaturatedEnthalpy.Liquid3a(s) ? Region3EnthalpyEntropy.p3(h, s) : Middle;
        if (h < SaturatedEnthalpy.Liquid1(s)) return Middle;
        return s > s13Least && h > EnthalpyEntropyEdges.hB13(s) ? Region3EnthalpyEntropy.p3(h, s) : EnthalpyEntropyGuess.p1(h, s);
    }

    private static double OfVapour(double h, double s)
    {
        double saturated = s < s2bc ? SaturatedEnthalpy.Vapour2c3b(s) : SaturatedEnthalpy.Vapour2ab(s);
        if (h >= saturated) return s < sB23Least ? Region3EnthalpyEntropy.p3(h, s) : EnthalpyEntropyGuess.p2(h, s);
        double T = s < s2At623 ? 0 : WetTemperature.Of(h, s);
        return T > WaterConstants.TLeast && T < WaterConstants.Tc ? SaturationLine.Pressure(T) : Middle;
    }
}
