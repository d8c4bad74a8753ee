namespace FlowDuct.Fluids.Water;

/// <summary>Backward equations p(h,s) of regions 1 and 2: pressure, Pa, from h, J/kg, and s, J/(kg.K). SR2-01(2014); checks: Tables 3 and 9.</summary>
internal static class EnthalpyEntropyGuess
{
    // Between 2b and 2c; SR2-01(2014), section 6.
    private const double s2bc = 5850;

    /// <summary>Region 1. Eq. (1); within 0.6 % up to 2.5 MPa and 15 kPa above (Table 4).</summary>
    internal static double p1(double h, double s) =>
        100e6 * PowerSum.Of((h / 3400e3) + 0.05, (s / 7.6e3) + 0.05, WaterTables.Region1PHsI, WaterTables.Region1PHsJ, WaterTables.Region1PHsN);

    /// <summary>Region 2, the subregion chosen by h2ab(s) and s = 5.85 kJ/(kg.K).</summary>
    internal static double p2(double h, double s)
    {
        if (s < s2bc) return p2c(h, s);
        return h <= h2ab(s) ? p2a(h, s) : p2b(h, s);
    }

    /// <summary>Subregion 2a, up to 4 MPa. Eq. (3); within 0.0035 % (Table 10).</summary>
    internal static double p2a(double h, double s) => 4e6 * Fourth(
        PowerSum.Of((h / 4200e3) - 0.5, (s / 12e3) - 1.2, WaterTables.Region2aPHsI, WaterTables.Region2aPHsJ, WaterTables.Region2aPHsN));

    /// <summary>Subregion 2b, above 4 MPa and s at least 5.85 kJ/(kg.K). Eq. (4); within 0.0035 % (Table 10).</summary>
    internal static double p2b(double h, double s) => 100e6 * Fourth(
        PowerSum.Of((h / 4100e3) - 0.6, (s / 7.9e3) - 1.01, WaterTables.Region2bPHsI, WaterTables.Region2bPHsJ, WaterTables.Region2bPHsN));

    /// <summary>Subregion 2c, s below 5.85 kJ/(kg.K). Eq. (5); within 0.0088 % (Table 10).</summary>
    internal static double p2c(double h, double s) => 100e6 * Fourth(
        PowerSum.Of((h / 3500e3) - 0.7, (s / 5.9e3) - 1.1, WaterTables.Region2cPHsI, WaterTables.Region2cPHsJ, WaterTables.Region2cPHsN));

    /// <summary>Enthalpy, J/kg, between subregions 2a and 2b at s, J/(kg.K): the 4 MPa isobar within 22 kPa. Eq. (2).</summary>
    internal static double h2ab(double s) => 1e3 * PowerSum.Of(s / 1e3, WaterTables.H2abN);

    private static double Fourth(double x) => x * x * x * x;
}
