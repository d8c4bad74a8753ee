namespace FlowDuct.Fluids.Water;

/// <summary>Backward equations p(h,s) of region 3: pressure, Pa, from h, J/kg, and s, J/(kg.K). SR4-04(2014); check: Table 5.</summary>
internal static class Region3EnthalpyEntropy
{
    /// <summary>Region 3, the subregion chosen by the critical entropy.</summary>
    internal static double p3(double h, double s) => s <= WaterConstants.sc ? p3a(h, s) : p3b(h, s);

    /// <summary>Subregion 3a, s up to the critical entropy. Eq. (1); within 0.01 % (Table 6).</summary>
    internal static double p3a(double h, double s) =>
        99e6 * PowerSum.Of((h / 2300e3) - 1.01, (s / 4.4e3) - 0.750, WaterTables.Region3aPHsI, WaterTables.Region3aPHsJ, WaterTables.Region3aPHsN);

    /// <summary>Subregion 3b, s above the critical entropy. Eq. (2), which gives 1/p; within 0.01 % (Table 6).</summary>
    internal static double p3b(double h, double s) =>
        16.6e6 / PowerSum.Of((h / 2800e3) - 0.681, (s / 5.3e3) - 0.792, WaterTables.Region3bPHsI, WaterTables.Region3bPHsJ, WaterTables.Region3bPHsN);
}
