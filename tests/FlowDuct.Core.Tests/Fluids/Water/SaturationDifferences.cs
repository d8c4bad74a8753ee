using FlowDuct.Fluids.Water;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Saturation from equal Gibbs energy of the basic equations against Eq. (30). R7-97(2012), Table 44.</summary>
internal static class SaturationDifferences
{
    internal static IEnumerable<double> Of(string subject, string quantity) => subject switch
    {
        "Eqs. (7),(15) against (30), saturation line up to 623.15 K" =>
            WaterPoints.Saturation(WaterConstants.TLeast, WaterConstants.T13).Select(pair => Off(quantity, pair)),

        // Nearer to the critical point both phases become one, and with them what divides the difference.
        "Eq. (28) against (30), saturation line 623.15 K to Tc" =>
            WaterPoints.Saturation(WaterConstants.T13 + 1e-6, 647.05).Select(pair => Off(quantity, pair)),
        "Eqs. (7),(15) against (28) at 623.15 K" => [Off(quantity, Outer) - Off(quantity, Inner)],
        _ => throw new ArgumentOutOfRangeException(nameof(subject), subject, "no such comparison"),
    };

    private static SaturatedPair Outer => SaturatedPair.At(SaturationLine.pAtT13, WaterConstants.T13);

    private static SaturatedPair Inner
    {
        get
        {
            const double T = WaterConstants.T13;
            double p = SaturationLine.pAtT13;
            return new SaturatedPair(p, T, Region3.State(Region3Density.Liquid(p, T), T), Region3.State(Region3Density.Vapour(p, T), T));
        }
    }

    // dg = v dp - s dT of each phase: the step to equal Gibbs energy, which is so small that one step is enough.
    private static double Off(string quantity, SaturatedPair pair)
    {
        double dg = BasicEdges.Gibbs(pair.Vapour, pair.Liquid);
        return quantity switch
        {
            "|dps|" => -100 * dg / (pair.Vapour.v - pair.Liquid.v) / pair.p,
            "|dTs|" => 100 * dg / (pair.Vapour.s - pair.Liquid.s) / pair.T,
            "|dg|" => dg / 1e3,
            _ => throw new ArgumentOutOfRangeException(nameof(quantity), quantity, "no such property"),
        };
    }
}
