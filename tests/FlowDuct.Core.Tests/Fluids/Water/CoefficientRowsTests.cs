using System.Globalization;
using FlowDuct.Core.Tests.Support;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Each coefficient table has as many rows as the release prints and as its own first line says.</summary>
public class CoefficientRowsTests
{
    private static readonly string s_folder = SourceTree.File("src/FlowDuct.Core/Fluids/Water/Coefficients");

    // Tables of IAPWS R7-97(2012), SR2-01(2014), SR3-03(2014), SR4-04(2014), SR5-05(2016), R12-08, R15-11 and R14-08(2011), in this order.
    private static readonly Dictionary<string, int> s_printed = new(StringComparer.Ordinal)
    {
        ["region1"] = 34,
        ["region2_ideal"] = 9,
        ["region2_residual"] = 43,
        ["region2_metastable_ideal"] = 9,
        ["region2_metastable_residual"] = 13,
        ["region3"] = 40,
        ["region4"] = 10,
        ["region5_ideal"] = 6,
        ["region5_residual"] = 6,
        ["b23"] = 5,
        ["b2bc"] = 5,
        ["region1_T_ph"] = 20,
        ["region1_T_ps"] = 20,
        ["region2a_T_ph"] = 34,
        ["region2b_T_ph"] = 38,
        ["region2c_T_ph"] = 23,
        ["region2a_T_ps"] = 46,
        ["region2b_T_ps"] = 44,
        ["region2c_T_ps"] = 30,
        ["region1_p_hs"] = 19,
        ["region2a_p_hs"] = 29,
        ["region2b_p_hs"] = 33,
        ["region2c_p_hs"] = 31,
        ["h2ab"] = 4,
        ["h3ab"] = 4,
        ["region3a_T_ph"] = 31,
        ["region3b_T_ph"] = 33,
        ["region3a_v_ph"] = 32,
        ["region3b_v_ph"] = 30,
        ["region3a_T_ps"] = 33,
        ["region3b_T_ps"] = 28,
        ["region3a_v_ps"] = 28,
        ["region3b_v_ps"] = 31,
        ["region3_psat_h"] = 14,
        ["region3_psat_s"] = 10,
        ["region3a_p_hs"] = 33,
        ["region3b_p_hs"] = 35,
        ["hsat_liq_1_s"] = 27,
        ["hsat_liq_3a_s"] = 19,
        ["hsat_vap_2ab_s"] = 30,
        ["hsat_vap_2c3b_s"] = 16,
        ["hB13_s"] = 6,
        ["TB23_hs"] = 25,
        ["Tsat_hs"] = 36,
        ["region3_v_pT"] = 855,
        ["region3_v_pT_parameters"] = 26,
        ["region3_v_pT_boundaries"] = 51,
        ["viscosity_h0"] = 4,
        ["viscosity_h1"] = 21,
        ["conductivity_l0"] = 5,
        ["conductivity_l1"] = 30,
        ["conductivity_zeta"] = 30,
        ["melting_ih"] = 3,
        ["sublimation"] = 3,
    };

    // These are printed without a number to the row, or numbered from 0.
    private static readonly string[] s_withoutNumbers = ["region3_v_pT_parameters", "viscosity_h0", "viscosity_h1", "conductivity_l0", "conductivity_l1", "conductivity_zeta"];

    public static TheoryData<string> Tables() => [.. s_printed.Keys];

    [Fact]
    public void No_table_stands_outside_the_list() => Assert.Equal(
        s_printed.Keys.Order(StringComparer.Ordinal),
        Directory.GetFiles(s_folder, "*.csv").Select(Path.GetFileNameWithoutExtension).Order(StringComparer.Ordinal));

    [Theory]
    [MemberData(nameof(Tables))]
    public void A_table_has_the_rows_that_are_printed(string table)
    {
        string first = File.ReadLines(Path.Combine(s_folder, table + ".csv")).First();
        Assert.Contains(FormattableString.Invariant($"; {s_printed[table]} rows, as printed"), first, StringComparison.Ordinal);
        Assert.Equal(s_printed[table], Rows(table).Count);
    }

    // SR5-05(2016), Tables 4 and 12 print the number of terms of each subregion.
    [Fact]
    public void Each_subregion_has_its_number_of_terms()
    {
        Dictionary<string, int> counted = Rows("region3_v_pT").CountBy(row => row["subregion"]).ToDictionary(StringComparer.Ordinal);
        foreach (IReadOnlyDictionary<string, string> row in Rows("region3_v_pT_parameters"))
            Assert.Equal(int.Parse(row["N"], CultureInfo.InvariantCulture), counted[row["subregion"]]);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Rows_are_numbered_without_a_gap(string table)
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = Rows(table);
        if (!rows[0].TryGetValue("i", out string? begin) || begin == "0")
        {
            Assert.Contains(table, s_withoutNumbers);
            return;
        }

        string group = rows[0].ContainsKey("subregion") ? "subregion" : rows[0].ContainsKey("boundary") ? "boundary" : "i";
        IEnumerable<string[]> groups = rows.GroupBy(row => group == "i" ? "all" : row[group]).Select(g => g.Select(row => row["i"]).ToArray());
        foreach (string[] numbers in groups)
            Assert.Equal(Enumerable.Range(1, numbers.Length).Select(i => i.ToString(CultureInfo.InvariantCulture)), numbers);
    }

    // The edges are evaluated without reading their exponents.
    [Fact]
    public void Edges_have_the_exponents_of_their_form()
    {
        foreach (IGrouping<string, IReadOnlyDictionary<string, string>> edge in Rows("region3_v_pT_boundaries").GroupBy(row => row["boundary"]))
        {
            int[] powers = [.. edge.Select(row => int.Parse(row["I"], CultureInfo.InvariantCulture))];
            int[] expected = edge.First()["form"] switch
            {
                "poly_ln_pi" => [0, 1, 2, -1, -2],
                "linear_pi_c" => [1],
                _ => [.. Enumerable.Range(0, powers.Length)],
            };
            Assert.Equal(expected, powers);
        }
    }

    private static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows(string table) =>
        ReferenceTable.Read(Path.Combine(s_folder, table + ".csv"));
}
