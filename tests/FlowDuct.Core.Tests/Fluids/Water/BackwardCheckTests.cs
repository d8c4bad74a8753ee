using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water.Verification;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Values in the running text of the supplementary releases, and which printed digits exact arithmetic misses.</summary>
public class BackwardCheckTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("water/backward_check.csv");

    // Rows that exact arithmetic misses, with the last-digit units allowed instead of one half.
    private static readonly Dictionary<string, double> s_units = new(StringComparer.Ordinal)
    {
        // The sum is 3.70194000947E-03 also when added exactly, 0.53 units from the 3.701940010E-03 that Table 13 prints.
        ["v(p,T) subregion 3z"] = 0.6,

        // Four edges of subregions, which the releases print with more digits than they evaluated: Eq. (28) at the critical point gives
        // 4.4120214822363, the crossing 19.00881189174, the volumes 21.93161558 and 21.90096270. The printed numbers are the edges.
        ["region3: s at the critical point"] = 200,
        ["Tsat(p) = T3cd(p)"] = 200,
        ["psat at v' = 0.00264 m3/kg"] = 10,
        ["psat at v\" = 0.00385 m3/kg"] = 10,
    };

    public static TheoryData<int, string> Rows()
    {
        var rows = new TheoryData<int, string>();
        for (int i = 0; i < s_rows.Count; i++)
        {
            // The table rows are checked with all others, in CheckRowTests.
            IReadOnlyDictionary<string, string> row = s_rows[i];
            if (!row["table"].EndsWith("(text value)", StringComparison.Ordinal)) continue;
            rows.Add(i, $"{row["source"]} {row["table"]} {row["equation"]} {row["input1_value"]} {row["input2_value"]}");
        }

        return rows;
    }

    // Half a unit of the last printed digit; a hundredth of it more for sums of doubles that end on a tie.
    [Theory]
    [MemberData(nameof(Rows))]
    public void The_printed_value_is_met(int index, string what)
    {
        Printed printed = Printed.Parse(s_rows[index]["output_value"]);
        double computed = Compute(s_rows[index], 1);
        Assert.True(Math.Abs(computed - printed.Value) <= Room(s_rows[index], printed), $"{what}: printed {printed.Value:R}, computed {computed:R}");
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void A_nudged_input_misses_it(int index, string what)
    {
        Printed printed = Printed.Parse(s_rows[index]["output_value"]);
        double computed = Compute(s_rows[index], 0.999);
        Assert.True(Math.Abs(computed - printed.Value) > Room(s_rows[index], printed), what);
    }

    // An allowance that is not needed any more would hide the next error. The row of 3z stays so near to half a unit that the rounding of
    // the sum decides on which side it falls, so it is left out here.
    [Fact]
    public void Each_exception_names_a_row_that_needs_it()
    {
        IEnumerable<string> missed = s_rows.Where(row => !IsMetWithinHalf(row)).Select(row => row["equation"]);
        Assert.Equal(Edges(s_units.Keys), Edges(missed));

        static IEnumerable<string> Edges(IEnumerable<string> names) =>
            names.Where(name => name != "v(p,T) subregion 3z").Order(StringComparer.Ordinal);
    }

    [Theory]
    [InlineData("IAPWS SR2-01(2014)", "Table 3", 3)]
    [InlineData("IAPWS SR2-01(2014)", "Table 9", 9)]
    [InlineData("IAPWS SR2-01(2014)", "Section 6.1 (check point)", 1)]
    [InlineData("IAPWS SR3-03(2014)", "Table 18", 3)]
    [InlineData("IAPWS SR3-03(2014)", "Table 20", 3)]
    [InlineData("IAPWS SR4-04(2014)", "Table 5", 6)]
    [InlineData("IAPWS SR4-04(2014)", "Table 11", 6)]
    [InlineData("IAPWS SR4-04(2014)", "Table 18", 6)]
    [InlineData("IAPWS SR4-04(2014)", "Table 24", 3)]
    [InlineData("IAPWS SR4-04(2014)", "Table 26", 3)]
    [InlineData("IAPWS SR4-04(2014)", "Table 29", 3)]
    [InlineData("IAPWS SR5-05(2016)", "Table 3", 10)]
    [InlineData("IAPWS SR5-05(2016)", "Table 5", 40)]
    [InlineData("IAPWS SR5-05(2016)", "Table 11", 2)]
    [InlineData("IAPWS SR5-05(2016)", "Table 13", 12)]
    public void No_row_of_a_table_is_left_out(string source, string table, int count) =>
        Assert.Equal(count, s_rows.Count(row => row["source"] == source && row["table"] == table));

    [Fact]
    public void The_texts_are_checked_too() =>
        Assert.Equal(17, s_rows.Count(row => row["table"].EndsWith("(text value)", StringComparison.Ordinal)));

    private static bool IsMetWithinHalf(IReadOnlyDictionary<string, string> row)
    {
        Printed printed = Printed.Parse(row["output_value"]);
        return Math.Abs(Compute(row, 1) - printed.Value) <= 1.01 * printed.HalfDigit;
    }

    private static double Room(IReadOnlyDictionary<string, string> row, Printed printed) =>
        2 * printed.HalfDigit * (s_units.TryGetValue(row["equation"], out double units) && IsException(row) ? units : 0.505);

    // Subregion 3z has two rows; only the one at 22.064 MPa is missed.
    private static bool IsException(IReadOnlyDictionary<string, string> row) => row["table"] != "Table 13" || row["input1_value"] == "22.064";

    private static double Compute(IReadOnlyDictionary<string, string> row, double nudge)
    {
        double a = Number(row["input1_value"]) * nudge, b = Number(row["input2_value"]);
        return row["table"].EndsWith("(text value)", StringComparison.Ordinal)
            ? TextValues.Of(row["equation"], a, b, nudge)
            : SupplementaryEquations.Of(row["equation"], a, b);
    }

    private static double Number(string text) => text.Length == 0 ? 0 : double.Parse(text, CultureInfo.InvariantCulture);
}
