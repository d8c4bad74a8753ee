using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Humid air on the command line.</summary>
public class HumidAirTests
{
    private const string State = "flowduct state --fluid humid-air --at ";
    private const string Nozzle = "flowduct nozzle --fluid humid-air --inlet \"p0=3 bar, T0=60 degC, humidity=30%\" --throat \"d=18 mm\" --exit \"d=20 mm\" --back \"p=1 bar\"";

    [Fact]
    public void A_device_shows_the_vapour_at_each_station_and_where_it_leaves_the_gas()
    {
        string output = CommandRun.RunLine(Nozzle).Output;
        Assert.Contains("\nvapour  humidity  dew-point  humidity-ratio\n               -       degC               -\ninlet    0.30000     36.", output, StringComparison.Ordinal);
        Assert.Contains("it starts at 2.159 bar, 30.25 degC, where the area is 1.093 times the narrowest, before it", string.Join(' ', output.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)), StringComparison.Ordinal);
        Assert.DoesNotContain("vapour  humidity", CommandRun.RunLine(Nozzle.Replace("humid-air", "air", StringComparison.Ordinal).Replace(", humidity=30%", string.Empty, StringComparison.Ordinal)).Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_flue_gas_has_a_dew_point_too()
    {
        string output = CommandRun.RunLine("flowduct state --fluid N2=0.72,CO2=0.13,H2O=0.15 --at \"p=1 atm, T=400 K\"").Output;
        Assert.Contains("  dew point                             dew-point       54.2", output, StringComparison.Ordinal); // 15.199 kPa: 54.27 degC by R7-97(2012)
    }

    [Fact]
    public void Json_gives_the_three_figures_or_null()
    {
        JsonElement at = At(State + "\"p=1 bar, T=300 K, dew-point=285 K\"");
        Assert.Equal(285, at.GetProperty("dew_point").GetDouble(), 1e-9);
        Assert.InRange(at.GetProperty("humidity").GetDouble(), 0.3, 0.5);
        Assert.Equal(JsonValueKind.Null, At("flowduct state --fluid air --at \"p=1 bar, T=300 K\"").GetProperty("humidity").ValueKind);
        Assert.Equal(JsonValueKind.Null, At("flowduct state --fluid steam --at \"p=1 bar, T=400 K\"").GetProperty("dew_point").ValueKind);
    }

    [Fact]
    public void A_humidity_can_be_asked_backwards()
    {
        CommandRun run = CommandRun.RunLine("flowduct nozzle --fluid humid-air --inlet \"p=3 bar, T=60 degC, V=20 m/s\" --exit \"p=2.5 bar\" --find inlet.dew-point --target \"exit.humidity=1\"");
        Assert.Equal(string.Empty, run.Error);
        Assert.Contains("inlet.dew_point", run.Output, StringComparison.Ordinal);
    }

    // The velocity in the pipe follows from throat and pressures, and with it the static state that the humidity belongs to.
    [Theory]
    [InlineData("p0=3 bar, T0=60 degC, d=40 mm", "--back \"p=2.8 bar\"")]
    [InlineData("p=3 bar, T=60 degC, d=40 mm", "--flow \"1200 Nm3/h dry\"")]
    public void A_venturi_takes_it_too(string inlet, string flow)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine($"flowduct venturi --fluid humid-air --inlet \"{inlet}, humidity=60%\" --throat \"d=30 mm\" --exit \"d=60 mm\" {flow} --format json").Output);
        JsonElement at = json.RootElement.GetProperty("stations").GetProperty("inlet");
        Assert.Equal(0.6, at.GetProperty("humidity").GetDouble(), 1e-9);
        Assert.True(at.GetProperty("V").GetDouble() > 50);
    }

    [Theory]
    [InlineData(2, State + "\"p=1 bar, T=20 degC\"", "--at: nothing says how humid the air is\n  add one of humidity, dew-point, humidity-ratio, for example humidity=60%; --fluid air is dry")]
    [InlineData(2, State + "\"p=1 bar, T=20 degC, humidity=50%, dew-point=9 degC\"", "--at: humidity, dew-point say the same twice\n  keep one of them")]
    [InlineData(2, State + "\"p=1 bar, T=20 degC, humidity=101%\"", "--at: humidity=101% is outside 0 to 100 %\n  write for example humidity=60%")]
    [InlineData(2, "flowduct state --fluid air --at \"p=1 bar, T=20 degC, humidity=50%\"", "--at: humidity belongs to --fluid humid-air, and the fluid is air\n  write --fluid humid-air")]
    [InlineData(2, "flowduct state --fluid N2=0.9,H2O=0.1 --at \"p=1 bar, T=80 degC, dew-point=9 degC\"", "--at: dew-point belongs to --fluid humid-air, and the fluid is N2=0.9,H2O=0.1\n  leave it out; in a mixture give the fraction of H2O")]
    [InlineData(3, State + "\"p=1 bar, T=20 degC, dew-point=25 degC\"", "--at: dew-point=25 degC: its vapour would have 0.0317 bar, and 0.02339 bar at 20 degC is saturation: the rest is liquid\n  a dew point is not above the static temperature")]
    [InlineData(3, State + "\"p=1 bar, T=20 degC, humidity-ratio=0.03\"", "--at: humidity-ratio=0.03: its vapour would have 0.04601 bar, and 0.02339 bar at 20 degC is saturation: the rest is liquid\n  the humidity ratio is at most 0.0149 there")]
    [InlineData(2, "flowduct state --fluid humid-air --fractions mass --at \"p=1 bar, T=20 degC, humidity=50%\"", "--fractions: humid-air is no mixture and has no fractions\n  leave it out, or give --fluid such as N2=0.72,CO2=0.13,H2O=0.15")]
    [InlineData(2, "flowduct diffuser --fluid humid-air --inlet \"p=1 bar, T=20 degC, V=40 m/s, humidity=50%\" --exit \"p=1.005 bar, T=21 degC\" --flow \"300 Nm3/h\" --heat \"1 kW\"", "--heat: a heat rate needs the mass flow that takes it, and that of humid air by volume follows from its humidity\n  give --flow in kg/s, or the heat in kJ/kg")]
    public void A_slip_is_met_by_its_message(int status, string line, string message)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(status, run.Status);
    }

    private static JsonElement At(string line)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(line + " --format json").Output);
        return json.RootElement.GetProperty("stations").GetProperty("at").Clone();
    }
}
