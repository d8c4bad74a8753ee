using FlowDuct.Fluids.Water;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Numbers that stand in the running text of the supplementary releases, from the basic equations; MPa, kJ and K.</summary>
internal static class TextValues
{
    // A row without an input is nudged where its curve is.
    internal static double Of(string what, double a, double b, double nudge) => what switch
    {
        "region1: h'(623.15 K)" => Region1.State(SaturationLine.Pressure(a), a).h / 1e3,
        "region1: s'(623.15 K)" or "region1: s'(273.15 K)" => Region1.State(SaturationLine.Pressure(a), a).s / 1e3,
        "region2: h\"(623.15 K)" => Region2.State(SaturationLine.Pressure(a), a).h / 1e3,
        "region2: s\"(623.15 K)" or "region2: s\"(273.15 K)" => Region2.State(SaturationLine.Pressure(a), a).s / 1e3,
        "region1: s(100 MPa, 623.15 K)" => Region1.State(a * 1e6, b).s / 1e3,
        "region2: h(100 MPa, 863.15 K)" => Region2.State(a * 1e6, b).h / 1e3,
        "region3: s at the critical point" => Region3.State(b, a).s / 1e3,
        "region3: h at the critical point" => Region3.State(b, a).h / 1e3,
        "saturation-pressure equation (30)" => SaturationLine.Pressure(a) / 1e6,
        "region2 along B23: smallest s" => AlongB23(nudge).Min(),
        "region2 along B23: largest s" => AlongB23(nudge).Max(),
        "Tsat(p) = T3cd(p)" => Root(p => SaturationLine.Temperature(p * 1e6) - (nudge * Region3Edges.T3cd(p)), 16.6, 22),
        "psat at v' = 0.00264 m3/kg" => Root(p => Saturated(p, liquid: true) - a, 20, 22.06),
        "psat at v\" = 0.00385 m3/kg" => Root(p => a - Saturated(p, liquid: false), 20, 22.06),
        "region3: T at 100 MPa on the critical isentrope s_c" => Root(T => Dense(a * 1e6, T).s - (b * 1e3), 630, 860),
        _ => throw new ArgumentOutOfRangeException(nameof(what), what, "no such text"),
    };

    // Steps of 0.5 mK: at the smallest entropy, where the curve is flat, they miss less than the last digit.
    private static IEnumerable<double> AlongB23(double nudge) => Enumerable.Range(0, 480_001).Select(i =>
    {
        double T = 623.15 + (i * 5e-4);
        return Region2.State(Boundaries.pB23(T) * nudge, T).s / 1e3;
    });

    private static double Saturated(double p, bool liquid)
    {
        double T = SaturationLine.Temperature(p * 1e6);
        return 1 / (liquid ? Region3Density.Liquid(p * 1e6, T) : Region3Density.Vapour(p * 1e6, T));
    }

    private static RegionState Dense(double p, double T) => Region3.State(Region3Density.Of(p, T), T);

    // Bisection of a rising function.
    private static double Root(Func<double, double> f, double low, double high)
    {
        for (int i = 0; i < 80; i++)
        {
            double middle = (low + high) / 2;
            if (f(middle) < 0) low = middle;
            else high = middle;
        }

        return (low + high) / 2;
    }
}
