using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Answers as text and JSON, help, and the manners of the command.</summary>
public class AnswerTests
{
    private const string Nozzle = "flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar\" --efficiency 96%";
    private const string Diffuser = "flowduct diffuser --fluid air --inlet \"p=14.2 psi, T=70 degF, V=540 ft/s\" --exit \"V=120 ft/s\" --recovery 0.72";
    private const string State = "flowduct state --fluid water --at \"p=7 bar, superheat=20 K\"";

    [Theory]
    [InlineData(Nozzle)]
    [InlineData(Nozzle + " --units us")]
    [InlineData(Nozzle + " --flow \"1.4 kg/s\"")]
    [InlineData(Diffuser)]
    [InlineData(State)]
    [InlineData("flowduct")]
    [InlineData("flowduct nozzle --help")]
    [InlineData("flowduct diffuser -h")]
    [InlineData("flowduct state --help")]
    [InlineData("flowduct units --help")]
    [InlineData("flowduct fluids --help")]
    [InlineData("flowduct fluids")]
    [InlineData("flowduct units")]
    [InlineData("flowduct --version")]
    public void Text_is_ASCII_within_80_columns_and_ends_with_a_line(string line)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal(string.Empty, run.Error);
        Assert.Equal(0, run.Status);
        Assert.EndsWith("\n", run.Output, StringComparison.Ordinal);
        Assert.All(run.Output.Split('\n'), text => Assert.InRange(text.Length, 0, 80));
        Assert.All(run.Output, c => Assert.True(c is '\n' or (>= ' ' and <= '~'), $"U+{(int)c:X4}"));
        Assert.DoesNotContain("NaN", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("state")]
    [InlineData("nozzle")]
    [InlineData("diffuser")]
    [InlineData("fluids")]
    [InlineData("units")]
    public void Help_begins_with_an_example_that_runs(string command)
    {
        string[] lines = CommandRun.Run([.. command.Split(' ', StringSplitOptions.RemoveEmptyEntries), "--help"]).Output.Split('\n');
        Assert.Equal("example", lines[0]);
        string example = string.Join('\n', lines.Skip(1).TakeWhile(text => text.Length > 0));
        Assert.Equal(0, CommandRun.RunLine(example).Status);
    }

    [Fact]
    public void Impossible_figures_end_with_status_1_and_say_the_limit()
    {
        CommandRun run = CommandRun.RunLine("flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar, V=700 m/s\"");
        Assert.Equal(1, run.Status);
        Assert.Contains("second-law", run.Output, StringComparison.Ordinal);
        Assert.Contains("entropy IS BROKEN", run.Output, StringComparison.Ordinal);
        Assert.Contains("at most 641.98 m/s", run.Output.Replace("\n           ", " ", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public void Strict_makes_a_caution_fail()
    {
        Assert.Equal(0, CommandRun.RunLine(Nozzle).Status);
        Assert.Equal(1, CommandRun.RunLine(Nozzle + " --strict").Status);
    }

    [Fact]
    public void Quiet_drops_notes_but_neither_cautions_nor_the_caution_line()
    {
        CommandRun run = CommandRun.RunLine(Nozzle + " --quiet");
        Assert.DoesNotContain("note ", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("assumed", run.Output, StringComparison.Ordinal);
        Assert.Contains("wet-exit", run.Output, StringComparison.Ordinal);
        Assert.Contains("certifies nothing", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Colour_is_asked_for_or_absent()
    {
        Assert.DoesNotContain('\u001b', CommandRun.RunLine(Nozzle).Output);
        Assert.DoesNotContain('\u001b', CommandRun.RunLine(Nozzle + " --color never").Output);
        Assert.Contains('\u001b', CommandRun.RunLine(Nozzle + " --color always").Output);
    }

    [Theory]
    [InlineData(Nozzle)]
    [InlineData(Nozzle + " --flow \"1.4 kg/s\" --units us")]
    [InlineData(Diffuser)]
    [InlineData(State)]
    [InlineData("flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar, T=135.7 degC\"")]
    public void Json_is_SI_and_no_two_keys_of_an_object_differ_in_case_alone(string line)
    {
        CommandRun run = CommandRun.RunLine(line + " --format json");
        using JsonDocument json = JsonDocument.Parse(run.Output);
        Keys(json.RootElement);
        Assert.Equal("pass", json.RootElement.GetProperty("verdict").GetString());
        Assert.Equal(1, json.RootElement.GetProperty("schema").GetInt32());
    }

    [Fact]
    public void Json_numbers_do_not_change_with_the_display_units()
    {
        string metric = CommandRun.RunLine(Diffuser + " --format json").Output, us = CommandRun.RunLine(Diffuser + " --format json --units us").Output;
        Assert.Equal(Stations(metric), Stations(us));
    }

    private static string Stations(string output)
    {
        using JsonDocument json = JsonDocument.Parse(output);
        return json.RootElement.GetProperty("stations").GetRawText();
    }

    // V2 = sqrt(2 (h01 - h2)): the answer's own numbers close the balance.
    [Fact]
    public void Json_answers_close_the_energy_balance()
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(Nozzle + " --format json").Output);
        JsonElement stations = json.RootElement.GetProperty("stations");
        double h0 = stations.GetProperty("inlet").GetProperty("h0").GetDouble();
        JsonElement exit = stations.GetProperty("exit");
        double V = exit.GetProperty("V").GetDouble();
        Assert.Equal(h0, exit.GetProperty("h").GetDouble() + (V * V / 2), 1e-12 * h0);
    }

    [Fact]
    public void Gauge_readings_say_which_ambient_pressure_was_added()
    {
        CommandRun assumed = CommandRun.RunLine("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --exit \"p=0 barg\"");
        Assert.Contains("assumed-ambient", assumed.Output, StringComparison.Ordinal);
        CommandRun given = CommandRun.RunLine("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --exit \"p=0 barg\" --ambient \"p=0.98 bar\"");
        Assert.DoesNotContain("assumed-ambient", given.Output, StringComparison.Ordinal);
        Assert.Contains("7.9800", given.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Own_units_are_shown_where_asked()
    {
        CommandRun run = CommandRun.RunLine(Diffuser + " --show-in \"T=degF, p=inH2O(g)\"");
        Assert.Contains("inH2O(g)", run.Output, StringComparison.Ordinal);
        Assert.Contains("70.000", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_is_written_whole_and_stdout_stays_empty()
    {
        string file = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName());
        CommandRun run = CommandRun.Run("state", "--fluid", "water", "--at", "p=7 bar, superheat=20 K", "--output", file);
        Assert.Equal(0, run.Status);
        Assert.Equal(string.Empty, run.Output);
        Assert.Equal(CommandRun.RunLine(State).Output, File.ReadAllText(file));
        Assert.False(File.Exists(file + ".part"));
        File.Delete(file);
    }

    [Fact]
    public void Flow_counts_by_mass_by_actual_and_by_normal_volume()
    {
        const string Line = "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K, V=20 m/s\" --exit \"p=4 bar\" --format json --flow ";
        double mass = Flow(Line + "\"2 kg/s\"");
        Assert.Equal(2, mass, 1e-12);

        // p = 5 bar, 300 K, R = 287.05 J/(kg.K) (R/M of NASA/TP-2002-211556): 5.8062 kg/m3; at 0 degC, 1 atm 1.2923 kg/m3.
        Assert.Equal(5e5 / (8.31446261815324 / 0.0289651159 * 300), Flow(Line + "\"3600 m3/h\""), 1e-9);
        Assert.Equal(101325 / (8.31446261815324 / 0.0289651159 * 273.15), Flow(Line + "\"3600 Nm3/h\""), 1e-9);
        Assert.Equal(101325 / (8.31446261815324 / 0.0289651159 * 288.15), Flow(Line + "\"3600 Sm3/h\""), 1e-9);
    }

    [Fact]
    public void Heat_per_mass_and_heat_rate_agree()
    {
        const string Line = "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K, V=20 m/s\" --exit \"p=4.5 bar, T=290 K\" --flow \"2 kg/s\" --format json ";
        Assert.Equal(ExitVelocity(Line + "--heat \"20 kJ/kg\""), ExitVelocity(Line + "--heat \"40 kW\""), 1e-9);
        Assert.Equal(ExitVelocity(Line + "--heat \"-5 kJ/kg\""), ExitVelocity(Line + "--heat-loss \"5 kJ/kg\""), 1e-9);
    }

    private static double Flow(string line)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(line).Output);
        return json.RootElement.GetProperty("performance").GetProperty("mass_flow").GetDouble();
    }

    private static double ExitVelocity(string line)
    {
        using JsonDocument json = JsonDocument.Parse(CommandRun.RunLine(line).Output);
        return json.RootElement.GetProperty("stations").GetProperty("exit").GetProperty("V").GetDouble();
    }

    private static void Keys(JsonElement element)
    {
        if (element.ValueKind == JsonValueKind.Array) Assert.All(element.EnumerateArray(), Keys);
        if (element.ValueKind != JsonValueKind.Object) return;
        List<string> keys = [.. element.EnumerateObject().Select(property => property.Name)];
        Assert.Equal(keys.Count, keys.Distinct(StringComparer.OrdinalIgnoreCase).Count());
        foreach (JsonProperty property in element.EnumerateObject()) Keys(property.Value);
    }

}
