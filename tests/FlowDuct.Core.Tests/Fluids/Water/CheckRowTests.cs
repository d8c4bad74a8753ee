using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water.Verification;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Every printed check value of the IAPWS releases, by the copy that ships for selfcheck.</summary>
public class CheckRowTests
{
    private static readonly CheckRow[] s_rows = [.. CheckRow.All()];

    public static TheoryData<int, string> Rows()
    {
        var rows = new TheoryData<int, string>();
        for (int i = 0; i < s_rows.Length; i++)
            rows.Add(i, $"{s_rows[i].Source} {s_rows[i].Table} {s_rows[i].Equation} {s_rows[i].Output}({s_rows[i].Value1}, {s_rows[i].Value2})");
        return rows;
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void The_printed_value_is_met(int index, string what)
    {
        var result = new CheckResult(s_rows[index], CheckedEquations.Of(s_rows[index], 1));
        Assert.True(result.Met, $"{what}: printed {s_rows[index].Printed}, computed {result.Computed:R}");
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void A_nudged_input_misses_it(int index, string what) =>
        Assert.False(new CheckResult(s_rows[index], CheckedEquations.Of(s_rows[index], 0.997)).Met, what);

    [Theory]
    [InlineData("0.100215168E-02", 1e-11)]
    [InlineData("273.16", 0.01)]
    [InlineData("7", 1)]
    [InlineData("1.234E+03", 1)]
    public void The_last_digit_is_read_from_the_print(string printed, double unit) =>
        Assert.Equal(unit, new CheckRow("", "", "", "", "", "", "", "", "", "", printed, "").LastDigit, unit * 1e-12);

    [Theory]
    [InlineData("IAPWS R7-97(2012)", "Table 5", 18)]
    [InlineData("IAPWS R7-97(2012)", "Table 7", 3)]
    [InlineData("IAPWS R7-97(2012)", "Table 9", 3)]
    [InlineData("IAPWS R7-97(2012)", "Table 15", 18)]
    [InlineData("IAPWS R7-97(2012)", "Table 18", 18)]
    [InlineData("IAPWS R7-97(2012)", "Table 24", 9)]
    [InlineData("IAPWS R7-97(2012)", "Table 29", 9)]
    [InlineData("IAPWS R7-97(2012)", "Table 33", 18)]
    [InlineData("IAPWS R7-97(2012)", "Table 35", 3)]
    [InlineData("IAPWS R7-97(2012)", "Table 36", 3)]
    [InlineData("IAPWS R7-97(2012)", "Table 42", 18)]
    [InlineData("IAPWS SR3-03(2014)", "Table 5", 6)]
    [InlineData("IAPWS SR3-03(2014)", "Table 8", 6)]
    [InlineData("IAPWS SR3-03(2014)", "Table 12", 6)]
    [InlineData("IAPWS SR3-03(2014)", "Table 15", 6)]
    [InlineData("IAPWS R12-08", "Table 4", 11)]
    [InlineData("IAPWS R15-11", "Table 4", 4)]
    [InlineData("IAPWS R15-11", "Table 5", 9)]
    [InlineData("IAPWS R15-11", "Table 7", 24)]
    [InlineData("IAPWS R15-11", "Table 8", 24)]
    [InlineData("IAPWS R15-11", "Table 9", 22)]
    [InlineData("IAPWS R1-76(2014)", "Table 1 column 4", 75)]
    [InlineData("IAPWS R14-08(2011)", "Table 3", 2)]
    public void No_row_of_a_table_is_left_out(string source, string table, int count) =>
        Assert.Equal(count, s_rows.Count(row => row.Source == source && row.Table == table));

    [Fact]
    public void The_shipped_copy_is_the_reference_tables()
    {
        string[] names = ["if97_check", "backward_check", "transport_check"];
        IEnumerable<string> rows = names.SelectMany(name => ReferenceTable.Read($"water/{name}.csv"))
            .Where(row => !row["table"].EndsWith("(text value)", StringComparison.Ordinal)).Select(row => row["output_value"]);
        Assert.Equal(rows, s_rows.Select(row => row.Printed));
    }
}
