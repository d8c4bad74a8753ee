namespace FlowDuct.Fluids.Water;

/// <summary>Region 2, vapour: 273.15 K to 1073.15 K up to saturation, to the edge B23, or to 100 MPa.</summary>
internal static class Region2
{
    // Between 2b and 2c; R7-97(2012), section 6.3.
    private const double s2bc = 5850;
    private const double p2ab = 4e6;

    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eqs. (15)-(17) and Table 12; check: Table 15.</summary>
    internal static RegionState State(double p, double T)
    {
        double pi = p * 1e-6, tau = 540 / T, y = tau - 0.5;
        Region2Kernel.Sums(pi, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
        Region2Kernel.Ideal(tau, out double i, out double it, out double itt);
        double ty = tau / y;
        return RegionState.FromGibbs(p, T, Math.Log(pi) + i + g, 1 + gx, gxx - 1, it + (ty * gy), itt + (ty * ty * gyy), ty * gxy);
    }

    /// <summary>h, J/kg, s and cp, J/(kg.K), without the derivatives by pressure.</summary>
    internal static void Caloric(double p, double T, out double h, out double s, out double cp)
    {
        double pi = p * 1e-6, tau = 540 / T, y = tau - 0.5, ty = tau / y;
        Region2Kernel.Search(pi, y, out double g, out double gy, out double gyy);
        Region2Kernel.Ideal(tau, out double i, out double it, out double itt);
        double gt = it + (ty * gy);
        h = WaterConstants.R * T * gt;
        s = WaterConstants.R * (gt - Math.Log(pi) - i - g);
        cp = -WaterConstants.R * (itt + (ty * ty * gyy));
    }

    /// <summary>First guess of T, K, from p, Pa, and h, J/kg. R7-97(2012), Eqs. (21)-(24); within 25 mK.</summary>
    internal static double TFromPH(double p, double h)
    {
        double x = p * 1e-6, y = h / 2000e3;
        if (p <= p2ab) return BackwardKernels.Region2aTph(x, y - 2.1);
        return p < 6.5467e6 || h >= Boundaries.h2bc(p) ? BackwardKernels.Region2bTph(x - 2, y - 2.6) : BackwardKernels.Region2cTph(x + 25, y - 1.8);
    }

    /// <summary>First guess of T, K, from p, Pa, and s, J/(kg.K). R7-97(2012), Eqs. (25)-(27); within 25 mK.</summary>
    internal static double TFromPS(double p, double s)
    {
        double x = p * 1e-6;
        if (p <= p2ab) return BackwardKernels.Region2aTps(Math.Sqrt(Math.Sqrt(x)), (s / 2e3) - 2);
        return s >= s2bc ? BackwardKernels.Region2bTps(x, 10 - (s / 785.3)) : BackwardKernels.Region2cTps(x, 2 - (s / 2925.1));
    }
}
