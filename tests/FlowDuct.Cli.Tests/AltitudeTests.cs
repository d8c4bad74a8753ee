using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The ambient state by altitude: U.S. Standard Atmosphere, 1976, whose 1500 m have 84 556 Pa and 278.4 K (geopotential).</summary>
public class AltitudeTests
{
    private const string Nozzle = "flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --exit \"p=4 barg\" --ambient ";

    [Theory]
    [InlineData("altitude=1500.354 m", "- ambient: 0.84556 bar, 5.25 degC (standard atmosphere at 1500.35 m)")]
    [InlineData("p=0.9 bar, altitude=1500.354 m", "- ambient: 0.9 bar, 5.25 degC (T of the standard atmosphere at 1500.35 m)")]
    [InlineData("altitude=1500.354 m, T=20 degC", "- ambient: 0.84556 bar, 20 degC (p of the standard atmosphere at 1500.35 m)")]
    public void An_altitude_stands_in_for_what_is_not_given(string ambient, string line)
    {
        string output = CommandRun.RunLine(Nozzle + $"\"{ambient}\"").Output.ReplaceLineEndings(" ").Replace("  ", " ", StringComparison.Ordinal);
        Assert.Contains(line, output.Replace("  ", " ", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("altitude=1500 m, p=0.9 bar, T=20 degC")]
    [InlineData("p=0.9 bar")]
    public void It_has_nothing_to_say_where_the_rest_is_given(string ambient) =>
        Assert.DoesNotContain("ambient:", CommandRun.RunLine(Nozzle + $"\"{ambient}\"").Output, StringComparison.Ordinal);

    [Fact]
    public void Gauge_readings_start_from_its_pressure_in_either_order()
    {
        string absolute = CommandRun.RunLine("flowduct state --fluid air --at \"p=1.84556005 bar, T=300 K\" --digits 6").Output;
        Assert.Equal(absolute, CommandRun.RunLine("flowduct state --fluid air --at \"p=1 barg, T=300 K\" --ambient \"altitude=1500.354 m\" --digits 6").Output);
    }

    [Fact]
    public void Json_tells_the_altitude_and_what_came_from_it()
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(Nozzle + "\"altitude=1500 m, T=20 degC\" --format json").Output);
        JsonElement of = json.RootElement.GetProperty("case");
        Assert.Equal(1500, of.GetProperty("given").GetProperty("ambient.altitude").GetDouble());
        Assert.Equal(84_560, of.GetProperty("assumed").GetProperty("ambient.p").GetDouble(), 5.0);
        Assert.False(of.GetProperty("assumed").TryGetProperty("ambient.T", out _));
    }

    [Fact]
    public void An_altitude_outside_the_standard_is_refused()
    {
        CommandRun run = CommandRun.RunLine(Nozzle + "\"altitude=90 km\"");
        Assert.Equal(2, run.Status);
        Assert.Contains("-5 to 86 km", run.Error, StringComparison.Ordinal);
    }
}
