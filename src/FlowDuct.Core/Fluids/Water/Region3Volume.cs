namespace FlowDuct.Fluids.Water;

/// <summary>Backward equation v(p,T) of region 3 in 26 subregions. SR5-05(2016), Eqs. (4) and (5); checks: Tables 5 and 13.</summary>
internal static class Region3Volume
{
    /// <summary>
    /// Volume, m3/kg, at p, Pa, and T, K: within 0.001 % (Table 6), but close to the critical point, in 3u to 3z, within 0.1 to 1.8 %
    /// only (Table 14), where it serves as a first guess. At saturation temperature the liquid is meant.
    /// </summary>
    internal static double Of(double p, double T) => InSubregion(Region3Subregion.Of(p * 1e-6, T), p, T);

    /// <summary>The same for a chosen subregion, 0 for 3a to 25 for 3z.</summary>
    internal static double InSubregion(int k, double p, double T)
    {
        double x = Root((p * 1e-6 / Region3VolumeTables.PStar[k]) - Region3VolumeTables.A[k], Region3VolumeTables.RootP[k]);
        double y = Root((T / Region3VolumeTables.TStar[k]) - Region3VolumeTables.B[k], Region3VolumeTables.RootT[k]);
        return Region3VolumeTables.VStar[k] * Whole(Region3VolumeKernels.Sum(k, x, y), Region3VolumeTables.Power[k]);
    }

    private static double Root(double x, byte root) => root switch
    {
        1 => x,
        2 => Math.Sqrt(x),
        _ => Math.Sqrt(Math.Sqrt(x)),
    };

    // Power 0 marks the exponential form of subregion 3n, Eq. (5).
    private static double Whole(double sum, byte power) => power switch
    {
        1 => sum,
        4 => sum * sum * (sum * sum),
        _ => Math.Exp(sum),
    };
}
