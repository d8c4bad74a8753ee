namespace FlowDuct.Fluids.Water;

/// <summary>Region 3, around the critical point: a Helmholtz equation in density and temperature.</summary>
internal static class Region3
{
    /// <summary>State from rho, kg/m3, and T, K. R7-97(2012), Eq. (28) and Table 31; check: Table 33.</summary>
    internal static RegionState State(double rho, double T) => State(rho, T, out _, out _);

    /// <summary>The same, with (dp/drho) at constant T and (dp/dT) at constant density, which stay finite at the critical point.</summary>
    internal static RegionState State(double rho, double T, out double prho, out double pT)
    {
        const double R = WaterConstants.R;
        double delta = rho / WaterConstants.rhoc, rt = R * T;
        Region3Kernel.Sums(delta, WaterConstants.Tc / T, out double f, out double fd, out double fdd, out double ft, out double ftt, out double fdt);
        f += Region3Kernel.Log * Math.Log(delta);
        fd += Region3Kernel.Log;
        fdd -= Region3Kernel.Log;
        double p = rho * rt * fd;
        pT = rho * R * (fd - fdt);
        prho = rt * ((2 * fd) + fdd);
        double cv = -R * ftt, cp = cv + (T * pT * pT / (rho * rho * prho));
        double w = Math.Sqrt(prho + (T * pT * pT / (rho * rho * cv)));
        double vp = -1 / (rho * rho * prho);
        return new RegionState(p, T, 1 / rho, rt * (ft + fd), R * (ft - f), cp, cv, w, -pT * vp, vp);
    }

    /// <summary>Pressure, Pa, and its derivative by density at constant T.</summary>
    internal static double Pressure(double rho, double T, out double byDensity)
    {
        Region3Kernel.Search(rho / WaterConstants.rhoc, WaterConstants.Tc / T, out double fd, out double fdd);
        double rt = WaterConstants.R * T;
        byDensity = rt * ((2 * fd) + fdd + Region3Kernel.Log);
        return rho * rt * (fd + Region3Kernel.Log);
    }
}
