using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water;
using FlowDuct.Fluids.Water.Verification;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>The choice of a subregion of v(p,T) against the printed tables of choice, IAPWS SR5-05(2016), Tables 2 and 10.</summary>
public class SubregionTests
{
    private static readonly IReadOnlyList<SubregionCell> s_cells = SubregionCell.All;

    [Fact]
    public void The_tables_name_all_twenty_six_subregions() =>
        Assert.Equal(Enumerable.Range(0, 26), s_cells.Select(cell => cell.Subregion).Distinct().Order());

    [Fact]
    public void Every_cell_of_the_tables_is_chosen_inside_it()
    {
        foreach (SubregionCell cell in s_cells)
        {
            foreach ((double p, double T) in cell.Points(2000))
                Assert.True(Region3Subregion.Of(p, T) == cell.Subregion, FormattableString.Invariant($"{cell} at {p:R} MPa, {T:R} K"));
        }
    }

    // "p <= p_upto" and "T <= T_upto": an edge belongs to the lower side.
    [Fact]
    public void An_edge_belongs_to_the_cell_below_it()
    {
        foreach (SubregionCell cell in s_cells.Where(cell => cell.TUpto.Length > 0))
        {
            double p = cell.PUpto, T = SupplementaryEquations.Edge(cell.TUpto, p);
            if (cell.Low(p) < T) Assert.True(Region3Subregion.Of(p, T) == cell.Subregion, cell.ToString());
        }
    }

    [Fact]
    public void A_volume_comes_out_of_every_cell()
    {
        foreach (SubregionCell cell in s_cells)
        {
            foreach ((double p, double T) in cell.Points(2000))
                Assert.InRange(Region3Volume.Of(p * 1e6, T), 1 / 800.0, 1 / 100.0);
        }
    }

    // Tables 5 and 13 print points inside the subregion they name.
    [Fact]
    public void The_printed_points_lie_in_the_subregion_of_their_row()
    {
        IReadOnlyDictionary<string, string>[] rows =
            [.. ReferenceTable.Read("water/backward_check.csv").Where(row => row["equation"].StartsWith("v(p,T)", StringComparison.Ordinal))];
        Assert.Equal(52, rows.Length);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            double p = double.Parse(row["input1_value"], CultureInfo.InvariantCulture), T = double.Parse(row["input2_value"], CultureInfo.InvariantCulture);
            Assert.True(Region3Subregion.Of(p, T) == row["equation"][^1] - 'a', row["equation"]);
        }
    }
}
