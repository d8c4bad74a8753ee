using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Every printed check value of IAPWS R7-97(2012) and SR3-03(2014) for the equations that are used.</summary>
public class If97CheckTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("water/if97_check.csv");

    public static TheoryData<int, string> Rows()
    {
        var rows = new TheoryData<int, string>();
        for (int i = 0; i < s_rows.Count; i++)
        {
            IReadOnlyDictionary<string, string> row = s_rows[i];
            rows.Add(i, $"{row["table"]} {row["equation"]} {row["input1_value"]} {row["input2_value"]} {row["output_name"]}");
        }

        return rows;
    }

    // Half a unit of the last printed digit; a hundredth of it more for sums of doubles that end on a tie.
    [Theory]
    [MemberData(nameof(Rows))]
    public void The_printed_value_is_met(int index, string what)
    {
        (double printed, double half) = Printed.Parse(s_rows[index]["output_value"]);
        double computed = Compute(s_rows[index], 1);
        Assert.True(Math.Abs(computed - printed) <= 1.01 * half, $"{what}: printed {printed:R}, computed {computed:R}");
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void A_nudged_input_misses_it(int index, string what)
    {
        (double printed, double half) = Printed.Parse(s_rows[index]["output_value"]);
        Assert.True(Math.Abs(Compute(s_rows[index], 0.999) - printed) > half, what);
    }

    [Theory]
    [InlineData("Table 5", 18)]
    [InlineData("Table 7", 3)]
    [InlineData("Table 9", 3)]
    [InlineData("Table 15", 18)]
    [InlineData("Table 18", 18)]
    [InlineData("Table 24", 9)]
    [InlineData("Table 29", 9)]
    [InlineData("Table 33", 18)]
    [InlineData("Table 35", 3)]
    [InlineData("Table 36", 3)]
    [InlineData("Table 42", 18)]
    public void No_row_of_a_table_is_left_out(string table, int count) =>
        Assert.Equal(count, s_rows.Count(row => row["source"] == "IAPWS R7-97(2012)" && row["table"] == table));

    // The release prints MPa, kJ and K.
    private static double Compute(IReadOnlyDictionary<string, string> row, double nudge)
    {
        double a = Number(row["input1_value"]) * nudge, b = row["input2_value"].Length == 0 ? 0 : Number(row["input2_value"]);
        string equation = row["equation"];
        if (equation.Contains("basic equation", StringComparison.Ordinal) || equation.Contains("metastable", StringComparison.Ordinal))
            return Output(State(equation, a, b), row["output_name"]);
        return Backward(equation, a, b);
    }

    private static RegionState State(string equation, double T, double second) => equation[..7] switch
    {
        "region1" => Region1.State(second * 1e6, T),
        "region2" when equation.Contains("metastable", StringComparison.Ordinal) => MetastableVapour.State(second * 1e6, T),
        "region2" => Region2.State(second * 1e6, T),
        "region3" => Region3.State(second, T),
        "region5" => Region5.State(second * 1e6, T),
        _ => throw new ArgumentOutOfRangeException(nameof(equation), equation, "no such equation"),
    };

    private static double Output(RegionState at, string name) => name switch
    {
        "p" => at.p / 1e6,
        "v" => at.v,
        "h" => at.h / 1e3,
        "s" => at.s / 1e3,
        "u" => (at.h - (at.p * at.v)) / 1e3,
        "cp" => at.cp / 1e3,
        "w" => at.w,
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "no such property"),
    };

    private static double Backward(string equation, double a, double b) => equation switch
    {
        "B23-equation (5)" => Boundaries.pB23(a) / 1e6,
        "B23-equation (6)" => Boundaries.TB23(a * 1e6),
        "B2bc-equation (20)" => p2bc(a),
        "B2bc-equation (21)" => Boundaries.h2bc(a * 1e6) / 1e3,
        "saturation-pressure equation (30)" => SaturationLine.Pressure(a) / 1e6,
        "saturation-temperature equation (31)" => SaturationLine.Temperature(a * 1e6),
        _ when equation.StartsWith("backward T(p,h) region 1", StringComparison.Ordinal) => Region1.TFromPH(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,s) region 1", StringComparison.Ordinal) => Region1.TFromPS(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,h) subregion 2", StringComparison.Ordinal) => Region2.TFromPH(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,s) subregion 2", StringComparison.Ordinal) => Region2.TFromPS(a * 1e6, b * 1e3),
        _ when equation.StartsWith("boundary h3ab", StringComparison.Ordinal) => Boundaries.h3ab(a * 1e6) / 1e3,
        _ when equation.StartsWith("backward T(p,h) subregion 3", StringComparison.Ordinal) => Region3Backward.FromPH(a * 1e6, b * 1e3).T,
        _ when equation.StartsWith("backward T(p,s) subregion 3", StringComparison.Ordinal) => Region3Backward.FromPS(a * 1e6, b * 1e3).T,
        _ when equation.StartsWith("backward v(p,h) subregion 3", StringComparison.Ordinal) => 1 / Region3Backward.FromPH(a * 1e6, b * 1e3).rho,
        _ when equation.StartsWith("backward v(p,s) subregion 3", StringComparison.Ordinal) => 1 / Region3Backward.FromPS(a * 1e6, b * 1e3).rho,
        _ => throw new ArgumentOutOfRangeException(nameof(equation), equation, "no such equation"),
    };

    // Eq. (20) is the inverse of Eq. (21), which is the one that is used: found by bisection.
    private static double p2bc(double h)
    {
        (double low, double high) = (6.5467, 100);
        for (int i = 0; i < 100; i++)
        {
            double p = (low + high) / 2;
            if (Boundaries.h2bc(p * 1e6) / 1e3 < h) low = p;
            else high = p;
        }

        return low;
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
