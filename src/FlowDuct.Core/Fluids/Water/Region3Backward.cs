namespace FlowDuct.Fluids.Water;

/// <summary>First guesses of density and temperature in region 3. SR3-03(2014), Eqs. (2)-(9).</summary>
internal static class Region3Backward
{
    /// <summary>From p, Pa, and h, J/kg.</summary>
    internal static (double rho, double T) FromPH(double p, double h)
    {
        double pi = p / 100e6;
        return h <= Boundaries.h3ab(p)
            ? (1 / (0.0028 * Sum(pi + 0.128, (h / 2100e3) - 0.727, WaterTables.Region3aVPhI, WaterTables.Region3aVPhJ, WaterTables.Region3aVPhN)),
               760 * Sum(pi + 0.240, (h / 2300e3) - 0.615, WaterTables.Region3aTPhI, WaterTables.Region3aTPhJ, WaterTables.Region3aTPhN))
            : (1 / (0.0088 * Sum(pi + 0.0661, (h / 2800e3) - 0.720, WaterTables.Region3bVPhI, WaterTables.Region3bVPhJ, WaterTables.Region3bVPhN)),
               860 * Sum(pi + 0.298, (h / 2800e3) - 0.720, WaterTables.Region3bTPhI, WaterTables.Region3bTPhJ, WaterTables.Region3bTPhN));
    }

    /// <summary>From p, Pa, and s, J/(kg.K).</summary>
    internal static (double rho, double T) FromPS(double p, double s)
    {
        double pi = p / 100e6;
        return s <= WaterConstants.sc
            ? (1 / (0.0028 * Sum(pi + 0.187, (s / 4.4e3) - 0.755, WaterTables.Region3aVPsI, WaterTables.Region3aVPsJ, WaterTables.Region3aVPsN)),
               760 * Sum(pi + 0.240, (s / 4.4e3) - 0.703, WaterTables.Region3aTPsI, WaterTables.Region3aTPsJ, WaterTables.Region3aTPsN))
            : (1 / (0.0088 * Sum(pi + 0.298, (s / 5.3e3) - 0.816, WaterTables.Region3bVPsI, WaterTables.Region3bVPsJ, WaterTables.Region3bVPsN)),
               860 * Sum(pi + 0.760, (s / 5.3e3) - 0.818, WaterTables.Region3bTPsI, WaterTables.Region3bTPsJ, WaterTables.Region3bTPsN));
    }

    private static double Sum(double x, double y, ReadOnlySpan<sbyte> I, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n)
    {
        double sum = 0;
        for (int i = 0; i < n.Length; i++) sum += n[i] * IntegerPower.Of(x, I[i]) * IntegerPower.Of(y, J[i]);
        return sum;
    }
}
