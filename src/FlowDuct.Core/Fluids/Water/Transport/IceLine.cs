namespace FlowDuct.Fluids.Water;

/// <summary>Where water freezes: melting and sublimation of ice Ih. IAPWS R14-08(2011).</summary>
/// <remarks>IF97 begins at 273.15 K, ten millikelvins below the triple point: in that strip ice may be the stable phase.</remarks>
internal static class IceLine
{
    /// <summary>Triple-point pressure, Pa. R7-97(2012), Eq. (9) and R14-08(2011), section 2.</summary>
    internal const double TriplePressure = 611.657;

    /// <summary>Melting pressure of ice Ih, Pa, at T, K, from 251.165 K to 273.16 K. Eq. (1); check: Table 3.</summary>
    internal static double MeltingPressure(double T)
    {
        ReadOnlySpan<double> a = WaterTables.MeltingIhN, b = WaterTables.MeltingIhI;
        double log = Math.Log(T / WaterConstants.Tt), sum = 0;
        for (int i = 0; i < a.Length; i++) sum += a[i] * Lost(b[i], log);
        return TriplePressure * (1 + sum);
    }

    /// <summary>Sublimation pressure, Pa, at T, K, from 50 K to 273.16 K. Eq. (6); check: Table 3.</summary>
    internal static double SublimationPressure(double T)
    {
        ReadOnlySpan<double> a = WaterTables.SublimationN, b = WaterTables.SublimationI;
        double theta = T / WaterConstants.Tt, log = Math.Log(theta), sum = 0;
        for (int i = 0; i < a.Length; i++) sum += a[i] * Math.Exp(b[i] * log);
        return TriplePressure * Math.Exp(sum / theta);
    }

    /// <summary>True where ice is the stable phase at p, Pa, and T, K, at or above 273.15 K.</summary>
    internal static bool Holds(double p, double T) => T < WaterConstants.Tt && p > SublimationPressure(T) && p < MeltingPressure(T);

    // 1 - theta^b, with its digits near theta = 1.
    private static double Lost(double b, double logTheta) => -2 * Math.Exp(b * logTheta / 2) * Math.Sinh(b * logTheta / 2);
}
