using FlowDuct.Flow;

namespace FlowDuct.Fluids.Water;

/// <summary>A state from p and density: volume rises with T at constant p, save in liquid water below about 4 degC.</summary>
/// <remarks>Where cold water has two temperatures for one density, the warmer one is taken.</remarks>
internal static class PressureDensity
{
    // Water at 273.15 K is as dense as at 281 K; beyond this temperature each density belongs to one temperature.
    private const double OneToOne = 290;

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

        double cold = Math.Min(OneToOne, high * (1 - 1e-13));
        if (low == WaterConstants.TLeast && p >= SaturationLine.pAtLeastT && v <= Volume(p, cold)) low = Densest(p, v, cold);
        Outcome outcome = Between(p, v, low, high, out state);
        bool dense = state.T > WaterConstants.T13 && state.T <= WaterConstants.TB23Most && p > Boundaries.pB23(state.T);
        if (outcome == Outcome.Ok && dense) state = AtDensity(p, rho, state);
        return outcome;
    }

    // Near the critical point the density hangs on the last bits of T; region 3 knows it exactly, so T is found beside it.
    private static FluidState AtDensity(double p, double rho, in FluidState near)
    {
        double T = near.T;
        for (int i = 0; i < 8; i++)
        {
            RegionState trial = Region3.State(rho, T, out _, out double pT);
            T -= (trial.p - p) / pT;
        }

        RegionState at = Region3.State(rho, T);
        return new FluidState(p, T, 1 / rho, at.h, at.s, at.cp, at.cv, at.w, 0, near.Phase, near.Notices);
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
        return WaterFluid.Instance.FromPT(p, RootFinder.Find(T => Volume(p, T) - v, low, inside, atLow, atHigh), out state);
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
