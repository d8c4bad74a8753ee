namespace FlowDuct.Fluids.Gases;

/// <summary>Density and temperature to start a search from, by the ideal part of an equation of state alone.</summary>
internal static class HelmholtzStart
{
    private const int MostSteps = 4;

    // A per cent is close enough for a start.
    private const double Enough = 0.01;

    /// <summary>From pressure, Pa, and a property: p = rho R T.</summary>
    internal static void FromPressure<TKind>(HelmholtzEquation of, double p, double y, out double rho, out double T)
        where TKind : struct, IHelmholtzKind
    {
        T = Math.Max(of.Treducing, 300);
        rho = p / (of.R * T);
        for (int i = 0; i < MostSteps; i++)
        {
            HelmholtzPoint at = Ideal(of, rho, T);
            double step = (y - TKind.Of(at)) / TKind.ByTemperatureAtPressure(at);
            T = Limited(of, T, step);
            rho = p / (of.R * T);
            if (Math.Abs(step) < Enough * T) break;
        }
    }

    /// <summary>From enthalpy, J/kg, and entropy, J/(kg.K).</summary>
    internal static void FromEnthalpyAndEntropy(HelmholtzEquation of, double h, double s, out double rho, out double T)
    {
        T = Math.Max(of.Treducing, 300);
        rho = of.rhoReducing;
        for (int i = 0; i < MostSteps; i++)
        {
            HelmholtzPoint at = Ideal(of, rho, T);
            double step = (h - at.h) / at.cp;
            T = Limited(of, T, step);
            if (Math.Abs(step) < Enough * T) break;
        }

        HelmholtzPoint there = Ideal(of, rho, T);
        rho = Math.Min(rho * Math.Exp((there.s - s) / of.R), 2.5 * of.rhoReducing);
    }

    private static HelmholtzPoint Ideal(HelmholtzEquation of, double rho, double T)
    {
        of.Ideal(of.Treducing / T, out double g, out double gy, out double gyy);
        return new HelmholtzPoint(rho, T, of.R, g + Math.Log(rho / of.rhoReducing), gy, gyy, default);
    }

    private static double Limited(HelmholtzEquation of, double T, double step) => Math.Clamp(T + step, of.Parameters.Tleast, of.Parameters.Tmost);
}
