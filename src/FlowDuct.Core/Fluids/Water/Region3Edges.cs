namespace FlowDuct.Fluids.Water;

/// <summary>Temperature, K, of the edges between subregions of v(p,T) at p, MPa. SR5-05(2016); checks: Tables 3 and 11.</summary>
internal static class Region3Edges
{
    /// <summary>Eq. (2).</summary>
    internal static double T3ab(double p) => InLogarithm(p, Region3VolumeTables.Edgeab);

    /// <summary>Eq. (1).</summary>
    internal static double T3cd(double p) => PowerSum.Of(p, Region3VolumeTables.Edgecd);

    /// <summary>Eq. (3): the saturation line, extended straight on from the critical point.</summary>
    internal static double T3ef(double p) => (Region3VolumeTables.Edgeef[0] * (p - (WaterConstants.pc / 1e6))) + WaterConstants.Tc;

    /// <summary>Eq. (1).</summary>
    internal static double T3gh(double p) => PowerSum.Of(p, Region3VolumeTables.Edgegh);

    /// <summary>Eq. (1).</summary>
    internal static double T3ij(double p) => PowerSum.Of(p, Region3VolumeTables.Edgeij);

    /// <summary>Eq. (1).</summary>
    internal static double T3jk(double p) => PowerSum.Of(p, Region3VolumeTables.Edgejk);

    /// <summary>Eq. (1).</summary>
    internal static double T3mn(double p) => PowerSum.Of(p, Region3VolumeTables.Edgemn);

    /// <summary>Eq. (2).</summary>
    internal static double T3op(double p) => InLogarithm(p, Region3VolumeTables.Edgeop);

    /// <summary>Eq. (1).</summary>
    internal static double T3qu(double p) => PowerSum.Of(p, Region3VolumeTables.Edgequ);

    /// <summary>Eq. (1).</summary>
    internal static double T3rx(double p) => PowerSum.Of(p, Region3VolumeTables.Edgerx);

    /// <summary>Eq. (1).</summary>
    internal static double T3uv(double p) => PowerSum.Of(p, Region3VolumeTables.Edgeuv);

    /// <summary>Eq. (2).</summary>
    internal static double T3wx(double p) => InLogarithm(p, Region3VolumeTables.Edgewx);

    // The rows stand in the order 0, 1, 2, -1, -2 of the powers of ln(p).
    private static double InLogarithm(double p, ReadOnlySpan<double> n)
    {
        double x = Math.Log(p), y = 1 / x;
        return n[0] + (x * (n[1] + (x * n[2]))) + (y * (n[3] + (y * n[4])));
    }
}
