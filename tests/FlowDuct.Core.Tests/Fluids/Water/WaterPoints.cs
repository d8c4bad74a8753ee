using FlowDuct.Fluids.Water;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Fixed, evenly spread states of the regions of IAPWS R7-97(2012) from their basic equations.</summary>
internal static class WaterPoints
{
    private const int Count = 6000;

    /// <summary>An additive recurrence with the reciprocals of the plastic number and its square: no point twice, no clusters.</summary>
    internal static IEnumerable<(double u, double w)> Square(int count)
    {
        for (int i = 1; i <= count; i++) yield return ((0.5 + (i * 0.7548776662466927)) % 1, (0.5 + (i * 0.5698402909980532)) % 1);
    }

    /// <summary>Even steps with both ends.</summary>
    internal static IEnumerable<double> Line(double from, double to, int count = 3000) =>
        Enumerable.Range(0, count).Select(i => from + (i * (to - from) / (count - 1)));

    internal static IEnumerable<RegionState> Region1(double pLow, double pHigh)
    {
        double THigh = pHigh < SaturationLine.pAtT13 ? SaturationLine.Temperature(pHigh) : WaterConstants.T13;
        foreach ((double u, double w) in Square(Count))
        {
            double T = WaterConstants.TLeast + (u * (THigh - WaterConstants.TLeast)), low = Math.Max(pLow, SaturationLine.Pressure(T));
            yield return FlowDuct.Fluids.Water.Region1.State(low + (w * (pHigh - low)), T);
        }
    }

    /// <summary>Subregion 2a: up to 4 MPa, evenly in ln p.</summary>
    internal static IEnumerable<RegionState> Region2a()
    {
        foreach ((double u, double w) in Square(Count))
        {
            double T = WaterConstants.TLeast + (u * 800), high = Math.Min(4e6, GreatestP2(T));
            yield return Region2.State(611.153 * Math.Pow(Math.Max(high / 611.153, 1), w), T);
        }
    }

    /// <summary>Subregions 2b and 2c: above 4 MPa.</summary>
    internal static IEnumerable<RegionState> Region2bc()
    {
        foreach ((double u, double w) in Square(6 * Count))
        {
            double T = 523.5 + (u * (WaterConstants.T25 - 523.5)), high = GreatestP2(T);
            if (high > 4e6) yield return Region2.State(4e6 + (w * (high - 4e6)), T);
        }
    }

    internal static IEnumerable<RegionState> Region3()
    {
        foreach ((double u, double w) in Square(3 * Count))
        {
            // More of them at low pressure, towards the critical point.
            double p = SaturationLine.pAtT13 + (w * w * (100e6 - SaturationLine.pAtT13));
            yield return Dense(p, WaterConstants.T13 + (u * (Boundaries.TB23(p) - WaterConstants.T13)));
        }
    }

    internal static RegionState Dense(double p, double T) => FlowDuct.Fluids.Water.Region3.State(Region3Density.Of(p, T), T);

    /// <summary>Saturated pairs from one temperature to another. Above 623.15 K both phases come from region 3.</summary>
    internal static IEnumerable<SaturatedPair> Saturation(double from, double to) =>
        Line(from, to).Select(T => SaturatedPair.At(SaturationLine.Pressure(T), T));

    /// <summary>Wet mixtures up to 623.15 K that the equation Tsat(h,s) covers, with their quality.</summary>
    internal static IEnumerable<(SaturatedPair Pair, double x, double h, double s)> Wet()
    {
        foreach ((double u, double x) in Square(3 * Count))
        {
            double T = WaterConstants.TLeast + (u * (WaterConstants.T13 - WaterConstants.TLeast));
            var pair = SaturatedPair.At(SaturationLine.Pressure(T), T);
            double h = pair.Liquid.h + (x * (pair.Vapour.h - pair.Liquid.h)), s = pair.Liquid.s + (x * (pair.Vapour.s - pair.Liquid.s));
            if (s >= 5210.887825) yield return (pair, x, h, s);
        }
    }

    private static double GreatestP2(double T) =>
        T <= WaterConstants.T13 ? SaturationLine.Pressure(T) : T <= WaterConstants.TB23Most ? Boundaries.pB23(T) : 100e6;
}
