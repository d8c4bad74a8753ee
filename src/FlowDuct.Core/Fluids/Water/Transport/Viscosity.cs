namespace FlowDuct.Fluids.Water;

/// <summary>Dynamic viscosity of water: IAPWS R12-08 in its industrial form, without the critical enhancement (mu2 = 1).</summary>
/// <remarks>
/// Up to 1173.15 K over the pressures of IF97. The enhancement passes 2 % only between 645.91 K and 650.77 K together with 245.8 kg/m3 to
/// 405.3 kg/m3 (R12-08, section 2.8).
/// </remarks>
internal static class Viscosity
{
    /// <summary>Greatest temperature, K. R12-08, section 3.</summary>
    internal const double MostT = 1173.15;

    /// <summary>Viscosity, Pa.s, from T, K, and rho, kg/m3. R12-08, Eqs. (10)-(12); check: Table 4.</summary>
    internal static double Of(double T, double rho)
    {
        double t = T / WaterConstants.Tc, delta = rho / WaterConstants.rhoc;
        return Dilute(t) * Math.Exp(delta * PowerSum.Of((1 / t) - 1, delta - 1, WaterTables.ViscosityH1I, WaterTables.ViscosityH1J, WaterTables.ViscosityH1N)) * 1e-6;
    }

    /// <summary>Viscosity of the vapour in the limit of zero density, Pa.s, from T, K. R12-08, Eq. (11).</summary>
    internal static double OfDilute(double T) => Dilute(T / WaterConstants.Tc) * 1e-6;

    // Eq. (11): the limit of zero density.
    private static double Dilute(double t)
    {
        ReadOnlySpan<double> H = WaterTables.ViscosityH0N;
        return 100 * Math.Sqrt(t) / (H[0] + ((H[1] + ((H[2] + (H[3] / t)) / t)) / t));
    }
}
