using FlowDuct.Fluids.Water;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Steps of the basic equations where two regions meet. R7-97(2012), Table 43 and section 6.2.</summary>
internal static class BasicEdges
{
    internal static IEnumerable<double> Of(string subject, string quantity) => subject switch
    {
        "basic equations at the boundary of regions 1/3 at 623.15 K" => WaterPoints.Line(SaturationLine.pAtT13 * (1 + 1e-9), 100e6)
            .Select(p => Step(quantity, Region1.State(p, WaterConstants.T13), WaterPoints.Dense(p, WaterConstants.T13))),
        "basic equations at the boundary of regions 2/3 on B23" => WaterPoints.Line(WaterConstants.T13, WaterConstants.TB23Most).Select(OnB23(quantity)),
        "basic equations at the boundary of regions 2/5 at 1073.15 K" => WaterPoints.Line(1e3, 50e6)
            .Select(p => Step(quantity, Region2.State(p, WaterConstants.T25), Region5.State(p, WaterConstants.T25))),
        _ => throw new ArgumentOutOfRangeException(nameof(subject), subject, "no such edge"),
    };

    internal static IEnumerable<double> Metastable(string quantity) =>
        WaterPoints.Line(WaterConstants.Tt, SaturationLine.Temperature(10e6)).Select(T =>
        {
            double p = SaturationLine.Pressure(T);
            return Step(quantity, Region2.State(p, T), MetastableVapour.State(p, T));
        });

    /// <summary>Difference of one property in the unit of the release: %, kJ/kg or J/(kg.K).</summary>
    internal static double Step(string quantity, RegionState a, RegionState b) => quantity switch
    {
        "|dv|" => 100 * ((b.v / a.v) - 1),
        "|dh|" => (b.h - a.h) / 1e3,
        "|dcp|" => 100 * ((b.cp / a.cp) - 1),
        "|ds|" => b.s - a.s,
        "|dg|" => Gibbs(b, a) / 1e3,
        "|dw|" => 100 * ((b.w / a.w) - 1),
        _ => throw new ArgumentOutOfRangeException(nameof(quantity), quantity, "no such property"),
    };

    /// <summary>Gibbs energy of b above that of a, J/kg.</summary>
    internal static double Gibbs(RegionState b, RegionState a) => b.h - (b.T * b.s) - (a.h - (a.T * a.s));

    // At 623.15 K the edge is the saturation line within its rounding; the vapour is meant.
    private static Func<double, double> OnB23(string quantity) => T =>
    {
        double p = Boundaries.pB23(T);
        double rho = T < WaterConstants.Tc ? Region3Density.Vapour(p, T) : Region3Density.Of(p, T);
        return Step(quantity, Region2.State(p, T), Region3.State(rho, T));
    };
}
