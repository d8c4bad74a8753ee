using FlowDuct.Flow;

namespace FlowDuct.Fluids.Water;

/// <summary>A state from p and density: volume rises with T at constant p, save in liquid water below about 4 degC.</summary>
/// <remarks>Where cold water has two temperatures for one density, the warmer one is taken.</remarks>
internal static class PressureDensity
{
    // Water at 273.15 K is as dense as at 281 K; beyond this temperature each density belongs to one temperature.
    private const double OneToOne = 290;
    private const int MostSteps = 60;

    internal static Outcome Solve(double p, double rho, out FluidState state)
    {
        state = default;
        if (!(p >= WaterConstants.pLeast)) return Outcome.PressureTooLow;
        if (!(p <= WaterConstants.pMost)) return Outcome.PressureTooHigh;
        if (!(rho > 0)) return Outcome.PairTooHigh;
        double v = 1 / rho, low = WaterConstants.TLeast, high = p <= WaterConstants.pMost5 ? WaterConstants.TMost : WaterConstants.T25;
        if (p >= SaturationLine.pAtLeastT && p < WaterConstants.pc)
        {
            double T = SaturationLine.Temperature(p);
            var pair = SaturatedPair.At(p, T);
            if (v >= pair.Liquid.v && v <= pair.Vapour.v) return Wet(pair, v, out state);
            if (v < pair.Liquid.v) high = T;
            else low = T;
        }

        if (p > SaturationLine.pAtT13 && TryRegion3(p, rho, out state)) return Outcome.Ok;
        double cold = Math.Min(OneToOne, high * (1 - 1e-13));
        if (low == WaterConstants.TLeast && p >= SaturationLine.pAtLeastT && v <= Volume(p, cold) * (1 + 1e-12)) low = Densest(p, v, cold);
        return Between(p, v, low, high, out state);
    }

    // Region 3 knows its density exactly, and at constant density p rises with T everywhere: Newton inside a bracket.
    private static bool TryRegion3(double p, double rho, out FluidState state)
    {
        state = default;
        double edge = Boundaries.TB23(p), v = 1 / rho;
        if (v <= Region1.State(p, WaterConstants.T13).v || v >= Region2.State(p, edge).v) return false;
        double low = WaterConstants.T13 - 1, high = Math.Min(edge, WaterConstants.TB23Most) + 1, T = low;
        RegionState at = default;
        for (int i = 0; i < MostSteps; i++)
        {
            at = Region3.State(rho, T, out _, out double pT);
            if (at.p > p) high = T;
            else low = T;
            double next = T - ((at.p - p) / pT);
            if (!(next >= low && next <= high)) next = (low + high) / 2;
            if (Math.Abs(next - T) <= 2e-16 * T) break;
            T = next;
        }

        bool outside = T < WaterConstants.T13 || T > edge;
        Notices notices = NoticesOf.State(p, T) | (outside ? Notices.RegionGap : Notices.None);
        state = new FluidState(p, T, v, at.h, at.s, at.cp, at.cv, at.w, 0, PhaseOf(p, T, rho), notices);
        return true;
    }

    private static Phase PhaseOf(double p, double T, double rho)
    {
        if (p > WaterConstants.pc && T > WaterConstants.Tc) return Phase.Supercritical;
        return T <= WaterConstants.Tc && rho > WaterConstants.rhoc ? Phase.Liquid : Phase.SuperheatedVapour;
    }

    private static Outcome Wet(in SaturatedPair pair, double v, out FluidState state)
    {
        double x = (v - pair.Liquid.v) / (pair.Vapour.v - pair.Liquid.v);
        return WaterFluid.Instance.FromPX(pair.p, double.IsNaN(x) ? 1 : Math.Clamp(x, 0, 1), out state);
    }

    // The ends are nudged off the saturation line, which belongs to the vapour.
    private static Outcome Between(double p, double v, double low, double high, out FluidState state)
    {
        double inside = high - ((high - low) * 1e-13);
        double atLow = Volume(p, low) - v, atHigh = Volume(p, inside) - v;
        state = default;
        if (atLow > 0) return atLow <= 1e-12 * v ? WaterFluid.Instance.FromPT(p, low, out state) : Outcome.PairTooLow;
        if (atHigh < 0) return atHigh >= -1e-9 * v ? WaterFluid.Instance.FromPT(p, inside, out state) : Outcome.PairTooHigh;
        var excess = new VolumeExcess(p, v);
        return WaterFluid.Instance.FromPT(p, RootFinder.Find(ref excess, low, inside, atLow, atHigh), out state);
    }

    private readonly struct VolumeExcess(double p, double v) : IScalarFunction
    {
        public double At(double T) => Volume(p, T) - v;
    }

    private static double Volume(double p, double T) => WaterFluid.RegionAt(p, T, out _).v;

    // Golden section to the temperature of the density maximum, or to the cold edge where there is none.
    private static double Densest(double p, double v, double b)
    {
        const double Golden = 0.6180339887498949;
        double a = WaterConstants.TLeast;
        if (Volume(p, a) < v) return a;
        for (int i = 0; i < 60; i++)
        {
            double c = b - (Golden * (b - a)), d = a + (Golden * (b - a));
            if (Volume(p, c) < Volume(p, d)) b = d;
            else a = c;
        }

        return (a + b) / 2;
    }
}
