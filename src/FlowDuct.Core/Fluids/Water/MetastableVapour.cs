namespace FlowDuct.Fluids.Water;

/// <summary>Supersaturated vapour from saturation to 5 % equilibrium moisture, up to 10 MPa.</summary>
internal static class MetastableVapour
{
    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eqs. (18), (19); check: Table 18.</summary>
    internal static RegionState State(double p, double T)
    {
        double pi = p * 1e-6, tau = 540 / T, y = tau - 0.5;
        MetastableKernel.Sums(pi, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
        MetastableKernel.Ideal(tau, out double i, out double it, out double itt);
        double ty = tau / y;
        return RegionState.FromGibbs(p, T, Math.Log(pi) + i + g, 1 + gx, gxx - 1, it + (ty * gy), itt + (ty * ty * gyy), ty * gxy);
    }
}
