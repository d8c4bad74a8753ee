using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Flows of gas by volume: actual at the inlet, normal, standard, and at a reference state that is given.</summary>
public class FlowUnitTests
{
    private const string Flue = "flowduct nozzle --fluid \"N2=0.72,CO2=0.13,H2O=0.15\" --inlet \"p=5 bar, T=800 K, V=20 m/s\" --exit \"p=4 bar\" --flow ";
    private const string At60F = " --reference-state \"T=60 degF, p=14.696 psi\"";

    // Molar masses as the report NASA/TP-2002-211556 (2002) prints them, g/mol.
    private const double FlueMolarMass = (0.72 * 28.0134) + (0.13 * 44.0095) + (0.15 * 18.01528);

    // Molar volume of an ideal gas, L/mol: 22.413 969 54 at 0 degC, 101.325 kPa (CODATA 2018, from memory); 23.644 8 at 15 degC (from memory, as
    // ISO 13443 counts); 379.48 ft3/lbmol at 60 degF, 14.696 psi (common practice of the gas trade, from memory), 1 lbmol = 453.59237 mol.
    [Theory]
    [InlineData("\"3600 Nm3/h\"", "", 1000 / 22.41396954, 5e-9)]
    [InlineData("\"3600 Sm3/h\"", "", 1000 / 23.6448, 2.2e-6)]
    [InlineData("\"3600 Nm3/h wet\"", "", 1000 / 22.41396954, 5e-9)]
    [InlineData("\"3600 Nm3/h dry\"", "", 1000 / 22.41396954 / 0.85, 5e-9)]
    [InlineData("\"6000 scfm\"", At60F, 100 * 453.59237 / 379.48, 1e-5)]
    [InlineData("\"6000 scfm dry\"", At60F, 100 * 453.59237 / 379.48 / 0.85, 1e-5)]
    [InlineData("\"60000 NL/min\"", " --reference-state \"T=0 degC, p=1.01325 bar\"", 1000 / 22.41396954, 5e-9)]
    [InlineData("\"60000 slpm\"", " --reference-state \"T=273.15 K, p=101.325 kPa\"", 1000 / 22.41396954, 5e-9)]
    [InlineData("\"8.64 MMscfd\"", At60F, 100 * 453.59237 / 379.48, 1e-5)]
    [InlineData("\"3600 m3/h(ref)\"", " --reference-state \"T=20 degC, p=1 bar\"", 1000 / (22.41396954 * 293.15 / 273.15 * 1.01325), 5e-9)]
    public void A_reference_volume_is_an_amount_of_the_mixture(string flow, string state, double molesPerSecond, double relative)
    {
        JsonElement performance = Json(Flue + flow + state).GetProperty("performance");
        Assert.Equal(1, performance.GetProperty("mass_flow").GetDouble() / (molesPerSecond * FlueMolarMass / 1000), relative);
        Assert.Equal(1, performance.GetProperty("normal_volume_flow").GetDouble() / (molesPerSecond * 22.41396954e-3), relative);
        Assert.Equal(1, performance.GetProperty("standard_volume_flow").GetDouble() / (molesPerSecond * 23.6448e-3), relative + 2.2e-6);
    }

    [Theory]
    [InlineData("\"360 m3/h\"", 0.1)]
    [InlineData("\"100 acfm\"", 0.0471947443)] // 1 ft = 0.3048 m
    public void An_actual_volume_is_one_at_the_static_state_of_the_inlet(string flow, double volume)
    {
        JsonElement answer = Json(Flue + flow);
        double rho = answer.GetProperty("stations").GetProperty("inlet").GetProperty("rho").GetDouble();
        Assert.Equal(volume * rho, answer.GetProperty("performance").GetProperty("mass_flow").GetDouble(), 1e-9);
    }

    [Theory]
    [InlineData("\"900 Nm3/h\"", "", "flow: 900 Nm3/h counts ideal gas at 0 degC, 1.01325 bar (DIN 1343), taken wet, with the water vapour of the gas: dry or wet was not said")]
    [InlineData("\"900 Sm3/h dry\"", "", "flow: 900 Sm3/h counts ideal gas at 15 degC, 1.01325 bar (ISO 13443), dry: without the water vapour of the gas")]
    [InlineData("\"300 scfm wet\"", At60F, "flow: 300 scfm counts ideal gas at 15.5556 degC, 1.01325 bar (given), wet: with the water vapour of the gas")]
    public void The_answer_tells_the_reference_state_and_dry_from_wet(string flow, string state, string line) =>
        Assert.Contains(line, OneLine(CommandRun.RunLine(Flue + flow + state).Output), StringComparison.Ordinal);

    [Fact]
    public void A_dry_gas_has_nothing_to_tell_apart()
    {
        string line = Flue.Replace("N2=0.72,CO2=0.13,H2O=0.15", "N2=0.85,CO2=0.15", StringComparison.Ordinal);
        string output = OneLine(CommandRun.RunLine(line + "\"900 Nm3/h\"").Output);
        Assert.Contains("(DIN 1343) - shape", output, StringComparison.Ordinal);
        Assert.DoesNotContain("wet", output, StringComparison.Ordinal);
    }

    [Fact]
    public void Json_parts_what_was_given_from_what_the_unit_says()
    {
        JsonElement by = Json(Flue + "\"300 scfm dry\"" + At60F).GetProperty("case"), of = Json(Flue + "\"3600 Nm3/h\"").GetProperty("case");
        Assert.Equal(288.70555555555555, by.GetProperty("given").GetProperty("reference_state.T").GetDouble(), 1e-9);
        Assert.Equal("dry", by.GetProperty("given").GetProperty("flow_basis").GetString());
        Assert.False(by.GetProperty("assumed").TryGetProperty("reference_state.T", out _));
        Assert.Equal(1, of.GetProperty("given").GetProperty("normal_volume_flow").GetDouble());
        Assert.Equal(273.15, of.GetProperty("assumed").GetProperty("reference_state.T").GetDouble());
        Assert.Equal("wet", of.GetProperty("assumed").GetProperty("flow_basis").GetString());
    }

    [Theory]
    [InlineData("\"300 scfm\"", "--flow: 300 scfm names no reference state (conventions differ by up to 8.7 %)\n  add --reference-state, for example --reference-state \"T=60 degF, p=14.696 psi\", or give Nm3/h (0 degC) or Sm3/h (15 degC)")]
    [InlineData("\"300 SCFM\"", "--flow: 300 SCFM: SCFM names no reference state (conventions differ by up to 8.7 %); write scfm, NL/min or the like with --reference-state, or Nm3/h (0 degC) or Sm3/h (15 degC)")]
    [InlineData("\"1 kg/s dry\"", "--flow: 1 kg/s dry: a mass flow and an actual volume flow are of the whole gas\n  leave dry or wet out, or give the flow in Nm3/h, Sm3/h or the like")]
    [InlineData("\"300 scfm\" --reference-state \"T=60 degF\"", "--reference-state: p is missing: a reference state has both\n  write for example --reference-state \"T=60 degF, p=14.696 psi\"")]
    [InlineData("\"300 scfm\" --reference-state \"p=14.7 psi\"", "--reference-state: T is missing: a reference state has both\n  write for example --reference-state \"T=60 degF, p=14.696 psi\"")]
    [InlineData("\"300 scfm\" --reference-state \"p=0 psig, T=60 degF\"", "--reference-state: p=0 psig: a reference state does not move with the weather\n  give it absolute, in psi(a)")]
    [InlineData("\"300 scfm\" --reference-state \"p=1 bar, h=3 kJ/kg\"", "--reference-state: h (specific enthalpy) is not taken here\n  --reference-state takes p, T")]
    [InlineData("\"300 kg/h\" --reference-state \"p=1 bar, T=20 degC\"", "--reference-state: nothing is counted at it: no --flow is in scfm, NL/min or the like\n  leave it out, or give for example --flow \"300 scfm\"")]
    public void A_slip_is_status_2(string flow, string message)
    {
        CommandRun run = CommandRun.RunLine(Flue + flow);
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(2, run.Status);
    }

    private static JsonElement Json(string line)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(line + " --format json").Output);
        return json.RootElement.Clone();
    }

    private static string OneLine(string output) => string.Join(' ', output.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));
}
