namespace FlowDuct.Fluids.Water;

/// <summary>Region 1, liquid: 273.15 K to 623.15 K from saturation to 100 MPa.</summary>
internal static class Region1
{
    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eq. (7) and Table 3; check: Table 5.</summary>
    internal static RegionState State(double p, double T)
    {
        double pi = p / 16.53e6, tau = 1386 / T, x = 7.1 - pi, y = tau - 1.222;
        Region1Kernel.Sums(x, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);

        // x falls as pi rises, hence the sign of each odd derivative.
        double px = pi / x, ty = tau / y;
        return RegionState.FromGibbs(p, T, g, -px * gx, px * px * gxx, ty * gy, ty * ty * gyy, -px * ty * gxy);
    }

    /// <summary>h, J/kg, s and cp, J/(kg.K), without the derivatives by pressure.</summary>
    internal static void Caloric(double p, double T, out double h, out double s, out double cp)
    {
        double tau = 1386 / T, y = tau - 1.222, ty = tau / y;
        Region1Kernel.Search(7.1 - (p / 16.53e6), y, out double g, out double gy, out double gyy);
        h = WaterConstants.R * T * ty * gy;
        s = WaterConstants.R * ((ty * gy) - g);
        cp = -WaterConstants.R * ty * ty * gyy;
    }

    /// <summary>First guess of T, K, from p, Pa, and h, J/kg. R7-97(2012), Eq. (11); within 25 mK.</summary>
    internal static double TFromPH(double p, double h) => BackwardKernels.Region1Tph(p * 1e-6, (h / 2500e3) + 1);

    /// <summary>First guess of T, K, from p, Pa, and s, J/(kg.K). R7-97(2012), Eq. (13); within 25 mK.</summary>
    internal static double TFromPS(double p, double s) => BackwardKernels.Region1Tps(p * 1e-6, (s / 1e3) + 2);
}
