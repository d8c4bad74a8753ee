namespace FlowDuct.Fluids.Gases;

/// <summary>Saturated liquid and vapour in equilibrium at one temperature and pressure, and the mixture of them.</summary>
internal readonly struct HelmholtzPair(double p, double T, in HelmholtzPoint liquid, in HelmholtzPoint vapour)
{
    internal readonly double p = p;
    internal readonly double T = T;
    internal readonly HelmholtzPoint Liquid = liquid;
    internal readonly HelmholtzPoint Vapour = vapour;

    /// <summary>True where the two phases are one: at the critical point.</summary>
    internal bool IsCritical => !(Liquid.rho > Vapour.rho);

    /// <summary>Slope of the saturation line, Pa/K, by Clapeyron's equation; on the critical isochore where the phases are one.</summary>
    internal double Slope => IsCritical ? Vapour.pT : (Vapour.s - Liquid.s) / (Vapour.v - Liquid.v);

    /// <summary>The homogeneous equilibrium mixture of quality x.</summary>
    internal FluidState Mix(double x, Notices notices)
    {
        double v = Liquid.v + (x * (Vapour.v - Liquid.v));
        double h = Liquid.h + (x * (Vapour.h - Liquid.h));
        double s = Liquid.s + (x * (Vapour.s - Liquid.s));
        return new FluidState(p, T, v, h, s, 0, 0, SpeedOfSound(x, v), x, Phase.Wet, notices);
    }

    /// <summary>
    /// Speed of sound, m/s, of the mixture of quality x. The pressure of a mixture is a function of temperature alone, so that
    /// (dp/dv) at constant s is -(T/c) (dp/dT)^2 with c its heat capacity at constant volume.
    /// </summary>
    internal double SpeedOfSound(double x, double v)
    {
        double slope = Slope, c = ((1 - x) * AlongSaturation(Liquid, slope)) + (x * AlongSaturation(Vapour, slope));
        return v * slope * Math.Sqrt(T / c);
    }

    // T (ds/dT - (dp/dT) dv/dT) of one phase along the line.
    private static double AlongSaturation(in HelmholtzPoint at, double slope)
    {
        double drho = (slope - at.pT) / at.prho;
        return at.T * (at.sT + (at.srho * drho) + (slope * drho / (at.rho * at.rho)));
    }
}
