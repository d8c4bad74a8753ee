using System.Text.Json;
using FlowDuct.Cli.Rendering;
using FlowDuct.Fluids.Water.Verification;
using Json.Schema;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The check values on the user's machine.</summary>
public class SelfCheckTests
{
    [Fact]
    public void Every_value_is_met_and_listed()
    {
        CommandRun run = CommandRun.Run("selfcheck");
        int values = CheckRow.All().Count();
        Assert.Equal(0, run.Status);
        Assert.Contains($"\n{values} values, {values} met, 0 missed\n", run.Output, StringComparison.Ordinal);
        Assert.Contains("300, 3           v [m3/kg]               0.100215168E-02 1.0021516797e-3 -0.03\n", run.Output, StringComparison.Ordinal);
        Assert.All(run.Output.Split('\n'), line => Assert.True(line.Length <= 80, line));
        Assert.Equal(values, run.Output.Split('\n').Count(line => line.StartsWith("  ", StringComparison.Ordinal) && line.Contains('[', StringComparison.Ordinal) && !line.StartsWith("  at ", StringComparison.Ordinal)));
    }

    [Fact]
    public void Quiet_leaves_the_verdict() => Assert.DoesNotContain("Table", CommandRun.Run("selfcheck", "--quiet").Output, StringComparison.Ordinal);

    [Fact]
    public void A_miss_is_marked_and_counted()
    {
        CheckRow row = CheckRow.All().First();
        using var to = new StringWriter { NewLine = "\n" };
        SelfCheckText.Write(to, [new CheckResult(row, row.PrintedValue + row.LastDigit), new CheckResult(row, row.PrintedValue)], quiet: true);
        Assert.Contains("1.00 MISSED", to.ToString(), StringComparison.Ordinal);
        Assert.Contains("2 values, 1 met, 1 missed", to.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void The_json_keeps_its_schema()
    {
        JsonSchema schema = JsonSchema.FromFile(Path.Combine(AppContext.BaseDirectory, "schema", "selfcheck-1.json"));
        string text = CommandRun.Run("selfcheck", "--format", "json").Output;
        using var answer = JsonDocument.Parse(text);
        Assert.True(schema.Evaluate(answer.RootElement).IsValid);
        using var changed = JsonDocument.Parse(text.Replace("\"met\"", "\"reached\"", StringComparison.Ordinal));
        Assert.False(schema.Evaluate(changed.RootElement).IsValid);
    }
}
