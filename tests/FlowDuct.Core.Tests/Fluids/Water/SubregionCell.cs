using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water;
using FlowDuct.Fluids.Water.Verification;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>One cell of SR5-05(2016), Tables 2 and 10: a span of p, MPa, between two edges in T.</summary>
internal sealed record SubregionCell(int Subregion, double PAbove, double PUpto, string TAbove, string TUpto)
{
    internal static readonly IReadOnlyList<SubregionCell> All = [.. ReferenceTable.Read("water/region3_subregions.csv").Select(row => new SubregionCell(
        row["subregion"][1] - 'a', Pressure(row["p_above_MPa"]), Pressure(row["p_upto_MPa"]), row["T_above"], row["T_upto"]))];

    internal double Low(double p) => TAbove.Length == 0 ? WaterConstants.T13 : SupplementaryEquations.Edge(TAbove, p);

    internal double High(double p) => TUpto.Length == 0 ? Boundaries.TB23(p * 1e6) : SupplementaryEquations.Edge(TUpto, p);

    /// <summary>Points strictly inside, spread evenly; where its edges cross, a cell has none.</summary>
    internal IEnumerable<(double p, double T)> Points(int count)
    {
        foreach ((double u, double w) in WaterPoints.Square(count))
        {
            double p = PAbove + (u * (PUpto - PAbove)), low = Low(p), high = High(p);
            if (high > low) yield return (p, low + (w * (high - low)));
        }
    }

    private static double Pressure(string text) => text switch
    {
        "psat(623.15 K)" => SaturationLine.pAtT13 / 1e6,

        // Section 5.1 prints it.
        "psat(643.15 K)" => 21.04336732,
        _ => double.Parse(text, CultureInfo.InvariantCulture),
    };
}
