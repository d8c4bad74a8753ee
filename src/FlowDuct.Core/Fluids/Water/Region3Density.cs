namespace FlowDuct.Fluids.Water;

/// <summary>Density in region 3 from pressure and temperature, by Newton inside a bracket on the forward equation.</summary>
internal static class Region3Density
{
    // Region 3 holds 113 kg/m3 (saturated vapour, 623.15 K) to 744 kg/m3 (100 MPa, 623.15 K), with room past its edges.
    private const double Least = 90;
    private const double Most = 800;
    private const int MostSteps = 200;
    private const double Closure = 2e-15;

    // After so small a step the next one is below the last digit.
    private const double LastStep = 1e-9;
    private const int MostQuickSteps = 5;

    // Closer to the critical point the two roots of Eq. (28) at the pressure of Eq. (30) vanish.
    private const double CriticalBand = 1e-4;

    /// <summary>Density, kg/m3, of the stable phase at p, Pa, and T, K.</summary>
    internal static double Of(double p, double T) => TryFromGuess(p, T, out double rho) ? rho : Thorough(p, T);

    // v(p,T) of SR5-05(2016) is within 0.001 % but for the surroundings of the critical point: two steps of Newton.
    private static bool TryFromGuess(double p, double T, out double rho)
    {
        rho = 1 / Region3Volume.Of(p, T);
        for (int i = 0; i < MostQuickSteps; i++)
        {
            double step = (p - Region3.Pressure(rho, T, out double slope)) / slope;
            if (!(slope > 0 && Math.Abs(step) < 0.02 * rho)) return false;
            rho += step;
            if (Math.Abs(step) > LastStep * rho) continue;
            return T >= WaterConstants.Tc || (rho > WaterConstants.rhoc) == (p >= SaturationLine.Pressure(T));
        }

        return false;
    }

    private static double Thorough(double p, double T)
    {
        if (T >= WaterConstants.Tc) return Newton(p, T, Least, Most, WaterConstants.rhoc);
        return p >= SaturationLine.Pressure(T) ? Liquid(p, T) : Vapour(p, T);
    }

    /// <summary>Density of the saturated liquid, p being the saturation pressure of T.</summary>
    internal static double SaturatedLiquid(double p, double T) => WaterConstants.Tc - T < CriticalBand ? WaterConstants.rhoc : Liquid(p, T);

    /// <summary>Density of the saturated vapour, p being the saturation pressure of T.</summary>
    internal static double SaturatedVapour(double p, double T) => WaterConstants.Tc - T < CriticalBand ? WaterConstants.rhoc : Vapour(p, T);

    /// <summary>Root on the liquid side: from above, where p(rho) is convex, Newton walks down to it.</summary>
    internal static double Liquid(double p, double T) => Newton(p, T, WaterConstants.rhoc, Most, LiquidStart(T));

    /// <summary>Root on the vapour side: from below, where p(rho) is concave, Newton walks up to it.</summary>
    internal static double Vapour(double p, double T) => Newton(p, T, Least, WaterConstants.rhoc, Least);

    private static double LiquidStart(double T) => T > 640 ? 640 : Most;

    private static double Newton(double p, double T, double low, double high, double start)
    {
        double rho = start;
        for (int i = 0; i < MostSteps; i++)
        {
            double excess = Region3.Pressure(rho, T, out double slope) - p;
            if (Math.Abs(excess) <= Closure * p) return rho;
            if (excess > 0) high = rho;
            else low = rho;
            double next = slope > 0 ? rho - (excess / slope) : double.NaN;
            if (!(next > low && next < high)) next = (low + high) / 2;
            if (Math.Abs(next - rho) <= 2e-16 * rho) return rho;
            rho = next;
        }

        return rho;
    }
}
