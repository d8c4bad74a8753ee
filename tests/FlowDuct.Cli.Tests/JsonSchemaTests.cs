using System.Text.Json;
using Json.Schema;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The JSON answers keep the published schema, docs/schema/answer-1.json.</summary>
public class JsonSchemaTests
{
    private const string Steam = "flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar\" --flow \"1.4 kg/s\"";

    private static readonly JsonSchema s_schema = JsonSchema.FromFile(Path.Combine(AppContext.BaseDirectory, "schema", "answer-1.json"));

    [Theory]
    [InlineData(Steam)]
    [InlineData("flowduct state --fluid water --at \"p=7 bar, superheat=20 K\"")]
    [InlineData("flowduct state --fluid air --at \"p=2 bar, T=300 K\"")]
    [InlineData("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --exit \"p=3 bar\"")]
    [InlineData("flowduct state --fluid air --at \"T=200..400 K by 50 K\"")]
    [InlineData("flowduct state --fluid water --at \"p=1..9 bar by 2 bar, x=1\"")]
    [InlineData("flowduct state --fluid humid-air --at \"p=1 bar, T=300 K, humidity=0\"")]
    [InlineData("flowduct nozzle --fluid humid-air --inlet \"p0=3 bar, T0=40 degC, dew-point=12 degC\" --exit \"p=2 bar\" --flow \"300 scfm dry\" --reference-state \"T=60 degF, p=14.696 psi\"")]
    [InlineData("flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC\" --exit \"p=3.2 bar, T=135.7 degC\"")]
    [InlineData("flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar, V=900 m/s\"")]
    [InlineData("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --throat \"d=18 mm\" --exit \"d=25 mm\" --back \"p=5 bar\" --path 9 --show \"rho, p/p0\"")]
    [InlineData("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --throat \"d=18 mm\" --exit \"d=25 mm\" --back \"p=1 bar\"")]
    [InlineData("flowduct nozzle --fluid steam --inlet \"p0=9 bar, x=1\" --throat \"d=18 mm\" --back \"p=1 bar\" --expansion supersaturated")]
    [InlineData("flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, M=2, d=100 mm\" --exit \"d=150 mm\" --included-angle \"8 deg\" --inlet-blockage 4%")]
    [InlineData("flowduct diffuser --fluid water --inlet \"p=2 bar, T=300 K, V=8 m/s, d=100 mm\" --exit \"d=150 mm\" --included-angle \"8 deg\" --loss-coefficient idelchik")]
    [InlineData("flowduct venturi --fluid air --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm, dp=25 kPa\" --exit \"d=100 mm\" --loss-coefficient 0.1")]
    [InlineData("flowduct nozzle --fluid air --inlet \"p0=7 barg, T0=40 degC\" --throat \"d=18 mm\" --find back.p --target \"exit.V=200 m/s\"")]
    [InlineData("flowduct diffuser --fluid air --inlet \"p=14.2 psi, T=70 degF, V=540 ft/s\" --exit \"V=120 ft/s\" --recovery 0.72")]
    public void An_answer_keeps_the_schema(string line)
    {
        using JsonDocument answer = Answer(line);
        Assert.True(s_schema.Evaluate(answer.RootElement).IsValid, answer.RootElement.ToString());
    }

    [Theory]
    [InlineData("\"schema\": 1", "\"schema\": 2")]
    [InlineData("\"phase\"", "\"phases\"")]
    [InlineData("\"mass_flow\": 1.4,\n    \"volume", "\"volume")]
    [InlineData("\"severity\": \"note\"", "\"severity\": \"grave\"")]
    public void A_changed_answer_does_not(string of, string to)
    {
        string text = CommandRun.RunLine(Steam + " --format json").Output;
        Assert.Contains(of, text, StringComparison.Ordinal);
        using JsonDocument answer = JsonDocument.Parse(text.Replace(of, to, StringComparison.Ordinal));
        Assert.False(s_schema.Evaluate(answer.RootElement).IsValid);
    }

    [Fact]
    public void Rows_of_a_sheet_keep_it_too()
    {
        var unsolved = JsonSchema.FromFile(Path.Combine(AppContext.BaseDirectory, "schema", "unsolved-1.json"));
        CommandRun run = CommandRun.RunOn(
            "tag,device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)],at.p [bar(a)],at.T [degC]\n"
            + "N-1,nozzle,steam,9,230,3.2,,\nN-2,state,air,,,,1,20\nN-3,nozzle,steam,9,230,12,,\nN-4,nozzle,steam,9,x,3,,\n",
            "run", "-", "--format", "jsonl", "--quiet");
        JsonElement[] rows = [.. run.Output.TrimEnd('\n').Split('\n').Select(line => JsonDocument.Parse(line).RootElement)];
        Assert.Equal([true, true, false, false], rows.Select(row => s_schema.Evaluate(row).IsValid));
        Assert.Equal([false, false, true, true], rows.Select(row => unsolved.Evaluate(row).IsValid));
    }

    private static JsonDocument Answer(string line)
    {
        CommandRun run = CommandRun.RunLine(line + " --format json");
        Assert.Empty(run.Error);
        return JsonDocument.Parse(run.Output);
    }
}
