using System.Globalization;
using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Tables of states over a range, the air table of the handbooks among them.</summary>
public class StateTableTests
{
    // From memory but for four rows, as the files say. The handbooks' air rests on older spectroscopic data: h and u within 0.15 %, p_r within 0.1 %,
    // s0 within 0.0005 kJ/(kg.K) of its rise from 300 K; v_r has p_r in it, and half of its own last printed digit.
    [Theory]
    [InlineData("air_table.csv", "", 300, 46)]
    [InlineData("air_table_us.csv", " --units us", 540, 20)]
    public void The_air_table_is_that_of_the_handbooks(string file, string units, double scale, int count)
    {
        List<double[]> printed = [.. File.ReadLines(Path.Combine(AppContext.BaseDirectory, "reference", "gas", file)).Where(line => char.IsAsciiDigit(line[0])).Select(Numbers)];
        Assert.Equal(count, printed.Count);
        double[] at = printed.Single(row => row[0] == scale), ours = Row(scale, units);
        foreach (double[] row in printed)
        {
            double[] here = Row(row[0], units);
            Assert.Equal(row[0], here[0], 1e-3);
            Assert.Equal(1, here[1] / row[1], 1.5e-3);
            Assert.Equal(1, here[2] / row[2], 1.5e-3);
            Assert.Equal(row[3] - at[3], here[3] - ours[3], units.Length == 0 ? 5e-4 : 5e-4 / 4.1868);
            Assert.Equal(1, here[4] / row[4], 1e-3);
            Assert.Equal(1, here[5] / row[5], 1.2e-3);
        }
    }

    [Fact]
    public void Its_scales_stand_above_it()
    {
        string si = CommandRun.RunLine("flowduct state --fluid air --at \"T=200..1000 K by 100 K\"").Output;
        Assert.Contains("p_r = exp(s0/R) on the\nscale p_r = 1.386 at 300 K; v_r = 2.87 T/p_r, T in K\n", si, StringComparison.Ordinal);
        Assert.Contains(" 400.000 401.317 286.497 7.16044 3.80730 301.526 ", string.Join(' ', si.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)), StringComparison.Ordinal);
        string us = CommandRun.RunLine("flowduct state --fluid air --at \"T=360..1800 degR in 5 points\" --units us").Output;
        Assert.Contains("scale p_r = 1.386 at 540 degR; v_r = 0.3704 T/p_r, T in degR\n", us, StringComparison.Ordinal);
    }

    // Along an isentrope pressures are as p_r and volumes as v_r: the work of the table.
    [Fact]
    public void Relative_pressure_and_volume_lead_along_an_isentrope()
    {
        double[] low = Numbers(Csv("flowduct state --fluid CO2=0.3,N2=0.7 --at \"T=300..500 K by 200 K\" --digits 12")[1]), high = Numbers(Csv("flowduct state --fluid CO2=0.3,N2=0.7 --at \"T=300..500 K by 200 K\" --digits 12")[2]);
        double pressure = high[4] / low[4], volume = low[5] / high[5];
        JsonElement end = Json(FormattableString.Invariant($"flowduct state --fluid CO2=0.3,N2=0.7 --at \"p={pressure:R} bar, T=500 K\"")).GetProperty("stations").GetProperty("at");
        JsonElement start = Json("flowduct state --fluid CO2=0.3,N2=0.7 --at \"p=1 bar, T=300 K\"").GetProperty("stations").GetProperty("at");
        Assert.Equal(start.GetProperty("s").GetDouble(), end.GetProperty("s").GetDouble(), 1e-6);
        Assert.Equal(end.GetProperty("rho").GetDouble() / start.GetProperty("rho").GetDouble(), volume, 1e-9);
    }

    [Fact]
    public void A_row_of_a_table_is_the_state_by_itself()
    {
        JsonElement table = Json("flowduct state --fluid water --at \"p=1..9 bar by 2 bar, x=1\"").GetProperty("table");
        Assert.Equal(5, table.GetArrayLength());
        Assert.Equal(Json("flowduct state --fluid water --at \"p=5 bar, x=1\"").GetProperty("stations").GetProperty("at").ToString(), table[2].ToString());
    }

    [Theory]
    [InlineData("0.1..0.7 bar by 0.1 bar, x=1", 7, "0.7000000")] // 0.1 + 6 x 0.1 is not 0.7 in binary
    [InlineData("9..1 bar in 3 points, x=1", 3, "1.000000")]
    [InlineData("1..3 barg by 0.5 bar, x=1", 5, "4.013250")]
    public void Both_ends_are_met(string range, int count, string last)
    {
        string[] lines = Csv($"flowduct state --fluid water --at \"p={range}\"");
        Assert.Equal(count + 1, lines.Length);
        Assert.StartsWith("p [bar(a)],T [degC],x,", lines[0], StringComparison.Ordinal);
        Assert.StartsWith(last + ",", lines[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_finding_of_a_table_names_its_first_row() => Assert.Contains(
        "extrapolated: at T=-173.15 degC: ", CommandRun.RunLine("flowduct state --fluid air --at \"T=300..100 K by 100 K, p=1 bar\"").Output, StringComparison.Ordinal);

    [Theory]
    [InlineData(2, "T=300..400 K", "--at: T=300..400 K says no step\n  write for example T=300..400 K in 11 points, or by a step with its unit")]
    [InlineData(2, "T=300..400 K by 30 K", "--at: T=300..400 K by 30 K is 3.333 steps long, no whole number\n  move an end, or write in 4 points")]
    [InlineData(2, "T=300..400 K by 500 K", "--at: T=300..400 K by 500 K has a step longer than itself\n  give another step")]
    [InlineData(2, "T=300..400 K by 0.001 K", "--at: T=300..400 K by 0.001 K has more than 10000 values\n  give another step")]
    [InlineData(2, "T=300..400 K in x points", "--at: T=300..400 K in x points: x points is not a number of points from 2 to 10000\n  write for example in 11 points")]
    [InlineData(2, "T=300..300 K by 1 K", "--at: T=300..300 K by 1 K begins where it ends\n  give one value, or two that differ")]
    [InlineData(2, "T=300..400 K by 0 K", "--at: T=300..400 K by 0 K has a step of zero\n  give a step above zero")]
    [InlineData(2, "T=300..400 K by 10 bar", "--at: 10 bar: bar is a unit of pressure; for temperature difference write one of K, degC, degF, degR")]
    [InlineData(2, "T=300..400 K by 10 K, p=1..2 bar by 1 bar", "--at: T=300..400 K by 10 K and p=1..2 bar by 1 bar are two ranges, and a table has one\n  give one of them a value")]
    [InlineData(2, "T=300..400 by 10 K", "--at: T=400 has no unit; write for example T=400 degC")]
    [InlineData(2, "T=300..400 K by 10 K, T=3 K", "--at: T is given twice")]
    [InlineData(3, "T=300..7000 K by 100 K", "--at: T=5826.85 degC is above the limit 5726.85 degC of NASA/TP-2002-211556 (2002), record Air\n  valid range: 50 K to 6000 K, 1 Pa to 1 GPa; below 200 K the heat capacity keeps its 200 K value")]
    public void A_range_that_is_none_is_met_by_its_message(int status, string at, string message)
    {
        CommandRun run = CommandRun.RunLine($"flowduct state --fluid air --at \"{at}\"");
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(status, run.Status);
    }

    [Fact]
    public void Csv_is_for_tables_and_ranges_for_states()
    {
        Assert.Equal(2, CommandRun.RunLine("flowduct state --fluid air --at \"p=1 bar, T=300 K\" --format csv").Status);
        Assert.Contains("is a range, and one value is wanted here", CommandRun.RunLine("flowduct nozzle --fluid air --inlet \"p=1..3 bar by 1 bar, T=300 K\" --exit \"p=1 bar\"").Error, StringComparison.Ordinal);
    }

    // Seven digits of the CSV; a table of two rows, for the range cannot be one value.
    private static double[] Row(double T, string units)
    {
        string unit = units.Length == 0 ? "K" : "degR";
        return Numbers(Csv(FormattableString.Invariant($"flowduct state --fluid air --at \"T={T}..{T + 1} {unit} in 2 points\"{units}"))[1]);
    }

    private static string[] Csv(string line) => CommandRun.RunLine(line + " --format csv").Output.Split('\n', StringSplitOptions.RemoveEmptyEntries);

    private static double[] Numbers(string line) => [.. line.Split(',').Select(cell => double.Parse(cell, CultureInfo.InvariantCulture))];

    private static JsonElement Json(string line)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(line + " --format json").Output);
        return json.RootElement.Clone();
    }
}
