namespace FlowDuct.Fluids.Water;

/// <summary>Enthalpy, J/kg, of saturated liquid and vapour from entropy s, J/(kg.K). SR4-04(2014); checks: Tables 11 and 18.</summary>
internal static class SaturatedEnthalpy
{
    /// <summary>Liquid of region 1, s'(273.15 K) to s'(623.15 K). Eq. (3); within 3.4 J/kg (Table 12).</summary>
    internal static double Liquid1(double s) =>
        1700e3 * PowerSum.Of((s / 3.8e3) - 1.09, (s / 3.8e3) + 0.366e-4, WaterTables.HsatLiq1SI, WaterTables.HsatLiq1SJ, WaterTables.HsatLiq1SN);

    /// <summary>Liquid of region 3, s'(623.15 K) to the critical entropy. Eq. (4); within 4.5 J/kg (Table 12).</summary>
    internal static double Liquid3a(double s) =>
        1700e3 * PowerSum.Of((s / 3.8e3) - 1.09, (s / 3.8e3) + 0.366e-4, WaterTables.HsatLiq3aSI, WaterTables.HsatLiq3aSJ, WaterTables.HsatLiq3aSN);

    /// <summary>Vapour of region 2, 5.85 kJ/(kg.K) to s"(273.15 K). Eq. (5); within 1.2 J/kg (Table 19).</summary>
    internal static double Vapour2ab(double s) => 2800e3 * Math.Exp(
        PowerSum.Of((5.21e3 / s) - 0.513, (s / 9.2e3) - 0.524, WaterTables.HsatVap2abSI, WaterTables.HsatVap2abSJ, WaterTables.HsatVap2abSN));

    /// <summary>Vapour of regions 2 and 3, the critical entropy to 5.85 kJ/(kg.K). Eq. (6); within 7.3 J/kg (Table 19).</summary>
    internal static double Vapour2c3b(double s)
    {
        double root = PowerSum.Of(
            (s / 5.9e3) - 1.02, (s / 5.9e3) - 0.726, WaterTables.HsatVap2c3bSI, WaterTables.HsatVap2c3bSJ, WaterTables.HsatVap2c3bSN);
        return 2800e3 * root * root * root * root;
    }
}
