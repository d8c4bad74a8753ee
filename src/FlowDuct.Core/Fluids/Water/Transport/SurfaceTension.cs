namespace FlowDuct.Fluids.Water;

/// <summary>Surface tension between water and its vapour at saturation. IAPWS R1-76(2014).</summary>
internal static class SurfaceTension
{
    /// <summary>Surface tension, N/m, at T, K, from the triple point to 647.096 K. Eq. (1); check: Table 1.</summary>
    internal static double Of(double T)
    {
        double tau = 1 - (T / WaterConstants.Tc);
        return tau > 0 ? 235.8e-3 * Math.Exp(1.256 * Math.Log(tau)) * (1 - (0.625 * tau)) : 0;
    }
}
