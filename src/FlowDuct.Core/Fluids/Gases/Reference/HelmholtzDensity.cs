namespace FlowDuct.Fluids.Gases;

/// <summary>Density from pressure and temperature on a known side of saturation: Newton, held by a bracket.</summary>
internal static class HelmholtzDensity
{
    private const int MostSteps = 200;

    // Of density, and of pressure: rounding of the sums.
    private const double Closure = 1e-15;
    private const double PressureClosure = 3e-15;

    // Reduced density beyond that of any state inside the ranges, up to their greatest pressures.
    private const double Most = 6;

    /// <summary>Density, kg/m3, at p, Pa, and T, K.</summary>
    internal static double Of(PhaseBoundary boundary, double p, double T, PhaseSide side)
    {
        HelmholtzEquation of = boundary.Equation;
        double rhoc = of.rhoReducing, most = Most * rhoc, ideal = p / (of.R * T);
        if (side == PhaseSide.Vapour) return Newton(of, p, T, ideal, 0, rhoc);
        if (side == PhaseSide.Liquid) return Newton(of, p, T, 1.01 * boundary.LiquidStart(T), boundary.LiquidFloor(T), most);
        return of.Pressure(rhoc, T, out _) >= p ? Newton(of, p, T, Math.Min(ideal, rhoc), 0, rhoc) : Newton(of, p, T, 1.5 * rhoc, rhoc, most);
    }

    // Vapour: from below, where p(rho) is concave, Newton walks up to the root. Liquid: from above, where it is convex, down to it.
    private static double Newton(HelmholtzEquation of, double p, double T, double start, double low, double high)
    {
        double rho = start;
        for (int i = 0; i < MostSteps; i++)
        {
            double excess = of.Pressure(rho, T, out double slope) - p;
            if (Math.Abs(excess) <= PressureClosure * p || (slope > 0 && Math.Abs(excess) <= Closure * rho * slope)) return rho;
            if (excess > 0) high = Math.Min(high, rho);
            else low = Math.Max(low, rho);
            double next = slope > 0 ? rho - (excess / slope) : 0;
            if (next > 1.4 * rho) next = 1.4 * rho;
            if (!(next > low && next < high)) next = (low + high) / 2;
            if (Math.Abs(next - rho) <= 2e-16 * rho) return next;
            rho = next;
        }

        return rho;
    }
}
