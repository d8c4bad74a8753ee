namespace FlowDuct.Fluids.Water;

/// <summary>The edges between regions that have equations of their own.</summary>
internal static class Boundaries
{
    /// <summary>Pressure, Pa, of the edge of regions 2 and 3 at T, K. R7-97(2012), Eq. (5).</summary>
    internal static double pB23(double T)
    {
        ReadOnlySpan<double> n = WaterTables.B23N;
        return (n[0] + (n[1] * T) + (n[2] * T * T)) * 1e6;
    }

    /// <summary>Temperature, K, of the edge of regions 2 and 3 at p, Pa. R7-97(2012), Eq. (6).</summary>
    internal static double TB23(double p)
    {
        ReadOnlySpan<double> n = WaterTables.B23N;
        return n[3] + Math.Sqrt(((p * 1e-6) - n[4]) / n[2]);
    }

    /// <summary>Enthalpy, J/kg, between subregions 2b and 2c at p, Pa. R7-97(2012), Eq. (21).</summary>
    internal static double h2bc(double p)
    {
        ReadOnlySpan<double> n = WaterTables.B2bcN;
        return (n[3] + Math.Sqrt(((p * 1e-6) - n[4]) / n[2])) * 1e3;
    }

    /// <summary>Enthalpy, J/kg, between subregions 3a and 3b at p, Pa. SR3-03(2014), Eq. (1).</summary>
    internal static double h3ab(double p)
    {
        ReadOnlySpan<double> n = WaterTables.H3abN;
        double pi = p * 1e-6;
        return (n[0] + (pi * (n[1] + (pi * (n[2] + (pi * n[3])))))) * 1e3;
    }
}
