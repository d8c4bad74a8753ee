namespace FlowDuct.Fluids.Water;

/// <summary>Region 5, hot vapour: 1073.15 K to 2273.15 K up to 50 MPa.</summary>
internal static class Region5
{
    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eqs. (32)-(34); check: Table 42.</summary>
    internal static RegionState State(double p, double T)
    {
        double pi = p * 1e-6, tau = 1000 / T;
        Region5Kernel.Sums(pi, tau, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
        Region5Kernel.Ideal(tau, out double i, out double it, out double itt);
        return RegionState.FromGibbs(p, T, Math.Log(pi) + i + g, 1 + gx, gxx - 1, it + gy, itt + gyy, gxy);
    }
}
