namespace FlowDuct.Fluids.Water;

/// <summary>Saturated liquid and vapour at one pressure, and how a mixture of them behaves.</summary>
internal readonly struct SaturatedPair(double p, double T, in RegionState liquid, in RegionState vapour)
{
    internal readonly double p = p;
    internal readonly double T = T;
    internal readonly RegionState Liquid = liquid;
    internal readonly RegionState Vapour = vapour;

    /// <summary>Both states at p, Pa, from its saturation temperature T, K: regions 1 and 2 up to 623.15 K, region 3 above.</summary>
    internal static SaturatedPair At(double p, double T) => T <= WaterConstants.T13
        ? new SaturatedPair(p, T, Region1.State(p, T), Region2.State(p, T))
        : new SaturatedPair(p, T, Region3.State(Region3Density.SaturatedLiquid(p, T), T), Region3.State(Region3Density.SaturatedVapour(p, T), T));

    /// <summary>Saturated liquid alone.</summary>
    internal static RegionState LiquidAt(double p, double T) =>
        T <= WaterConstants.T13 ? Region1.State(p, T) : Region3.State(Region3Density.SaturatedLiquid(p, T), T);

    /// <summary>Saturated vapour alone.</summary>
    internal static RegionState VapourAt(double p, double T) =>
        T <= WaterConstants.T13 ? Region2.State(p, T) : Region3.State(Region3Density.SaturatedVapour(p, T), T);

    /// <summary>The homogeneous equilibrium mixture of quality x.</summary>
    internal FluidState Mix(double x)
    {
        double v = Liquid.v + (x * (Vapour.v - Liquid.v));
        double h = Liquid.h + (x * (Vapour.h - Liquid.h));
        double s = Liquid.s + (x * (Vapour.s - Liquid.s));
        return new FluidState(p, T, v, h, s, 0, 0, SpeedOfSound(x, v), x, Phase.Wet, NoticesOf.State(p, T));
    }

    // (dv/dp) at constant s of the mixture: both phases move along the saturation line and mass changes phase.
    internal double SpeedOfSound(double x, double v)
    {
        double slope = SaturationLine.Slope(p, T);
        double dvLiquid = Liquid.vp + (Liquid.vT * slope), dvVapour = Vapour.vp + (Vapour.vT * slope);
        double dsLiquid = (Liquid.cp / T * slope) - Liquid.vT, dsVapour = (Vapour.cp / T * slope) - Vapour.vT;
        double dx = -(dsLiquid + (x * (dsVapour - dsLiquid))) / (Vapour.s - Liquid.s);
        double dv = dvLiquid + (x * (dvVapour - dvLiquid)) + ((Vapour.v - Liquid.v) * dx);
        return dv < 0 ? v / Math.Sqrt(-dv) : Vapour.w;
    }
}

/// <summary>Notices that follow from where a state of water lies.</summary>
internal static class NoticesOf
{
    // Within 1 K and 1 % of the critical point heat capacities and compressibility change manifold: chosen here.
    private const double NearT = 1;
    private const double NearP = 0.01;

    internal static Notices State(double p, double T)
    {
        Notices notices = p < IceLine.TriplePressure ? Notices.BelowTriplePoint : Notices.None;
        if (T < WaterConstants.Tt && IceLine.Holds(p, T)) notices |= Notices.Ice;
        bool near = Math.Abs(T - WaterConstants.Tc) < NearT && Math.Abs(p - WaterConstants.pc) < NearP * WaterConstants.pc;
        return near ? notices | Notices.NearCritical : notices;
    }
}
