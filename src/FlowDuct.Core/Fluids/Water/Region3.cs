namespace FlowDuct.Fluids.Water;

/// <summary>Region 3, around the critical point: a Helmholtz equation in density and temperature.</summary>
internal static class Region3
{
    private const int MostDelta = 11;
    private const int MostTau = 26;

    /// <summary>State from rho, kg/m3, and T, K. R7-97(2012), Eq. (28) and Table 31; check: Table 33.</summary>
    internal static RegionState State(double rho, double T) => State(rho, T, out _, out _);

    /// <summary>The same, with (dp/drho) at constant T and (dp/dT) at constant density, which stay finite at the critical point.</summary>
    internal static RegionState State(double rho, double T, out double prho, out double pT)
    {
        Sums sums = Walk(rho, T);
        const double R = WaterConstants.R;
        double rt = R * T, p = rho * rt * sums.fd;
        pT = rho * R * (sums.fd - sums.fdt);
        prho = rt * ((2 * sums.fd) + sums.fdd);
        double cv = -R * sums.ftt, cp = cv + (T * pT * pT / (rho * rho * prho));
        double w = Math.Sqrt(prho + (T * pT * pT / (rho * rho * cv)));
        double vp = -1 / (rho * rho * prho);
        return new RegionState(p, T, 1 / rho, rt * (sums.ft + sums.fd), R * (sums.ft - sums.f), cp, cv, w, -pT * vp, vp);
    }

    /// <summary>Pressure, Pa, and its derivative by density at constant T.</summary>
    internal static double Pressure(double rho, double T, out double byDensity)
    {
        Sums sums = Walk(rho, T);
        double rt = WaterConstants.R * T;
        byDensity = rt * ((2 * sums.fd) + sums.fdd);
        return rho * rt * sums.fd;
    }

    // phi and its scaled derivatives: delta phi_d, delta^2 phi_dd, tau phi_t, tau^2 phi_tt, delta tau phi_dt.
    private readonly record struct Sums(double f, double fd, double fdd, double ft, double ftt, double fdt);

    private static Sums Walk(double rho, double T)
    {
        double delta = rho / WaterConstants.rhoc, tau = WaterConstants.Tc / T;
        Span<double> d = stackalloc double[MostDelta + 1], t = stackalloc double[MostTau + 1];
        Fill(d, delta);
        Fill(t, tau);
        ReadOnlySpan<sbyte> I = WaterTables.Region3I, J = WaterTables.Region3J;
        ReadOnlySpan<double> n = WaterTables.Region3N;
        double f = n[0] * Math.Log(delta), fd = n[0], fdd = -n[0], ft = 0, ftt = 0, fdt = 0;
        for (int i = 1; i < n.Length; i++)
        {
            double term = n[i] * d[I[i]] * t[J[i]];
            f += term;
            fd += I[i] * term;
            fdd += I[i] * (I[i] - 1) * term;
            ft += J[i] * term;
            ftt += J[i] * (J[i] - 1) * term;
            fdt += I[i] * J[i] * term;
        }

        return new Sums(f, fd, fdd, ft, ftt, fdt);
    }

    private static void Fill(Span<double> powers, double x)
    {
        powers[0] = 1;
        for (int i = 1; i < powers.Length; i++) powers[i] = powers[i - 1] * x;
    }
}
