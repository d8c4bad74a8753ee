using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The command sweep: points, order, statuses.</summary>
public class SweepTests
{
    private const string Steam = "flowduct sweep nozzle --fluid steam ";

    [Fact]
    public void Points_are_answered_as_single_commands_in_order()
    {
        CommandRun sweep = CommandRun.RunLine(Steam + "--inlet \"p=1 bar, T=230 degC\" --vary \"inlet.p=6..9 bar by 3 bar\" --vary \"exit.p=2,3 bar\" --show \"exit.V, exit.p0 [bar]\" --digits 12");
        string[] lines = sweep.Output.TrimEnd('\n').Split('\n');
        Assert.Equal("inlet.p [bar(a)],exit.p [bar(a)],calc exit.V [m/s],calc exit.p0 [bar(a)],row,status,findings", lines[0]);
        Assert.Equal(["6,2", "6,3", "9,2", "9,3"], lines[1..].Select(line => string.Join(',', line.Split(',')[..2])));
        for (int i = 1; i <= 4; i++)
        {
            string[] cells = lines[i].Split(',');
            CommandRun single = CommandRun.RunLine($"flowduct nozzle --fluid steam --inlet \"p={cells[0]} bar, T=230 degC\" --exit \"p={cells[1]} bar\" --format json");
            double V = JsonDocument.Parse(single.Output).RootElement.GetProperty("stations").GetProperty("exit").GetProperty("V").GetDouble();
            Assert.Equal(Quantities.NumberFormatter.Shortest(V, 12), cells[2]);
            Assert.Equal(i.ToString(System.Globalization.CultureInfo.InvariantCulture), cells[4]);
        }
    }

    // A sheet of points can be run again: its headings say the basis and the units.
    [Fact]
    public void Its_columns_are_columns_of_a_sheet()
    {
        CommandRun sweep = CommandRun.RunLine(Steam + "--inlet \"T=230 degC\" --exit \"p=2 bar\" --vary \"inlet.p=6..9 bar by 1 bar\" --show exit.V");
        string sheet = string.Join('\n', sweep.Output.TrimEnd('\n').Split('\n').Select((line, i) => (i == 0 ? "device,fluid,inlet.T [degC],exit.p [bar(a)]," : "nozzle,steam,230,2,") + line.Split(',')[0])) + "\n";
        string[] again = CommandRun.RunOn(sheet, "run", "-", "--show", "exit.V").Output.Split('\n');
        Assert.Equal(sweep.Output.Split('\n')[1..^1].Select(line => line.Split(',')[1]), again[1..^1].Select(line => line.Split(',')[5]));
    }

    [Theory]
    [InlineData(0, "--inlet \"p=3 bar, T=230 degC\" --vary \"exit.p=1,5 bar\"")]
    [InlineData(3, "--inlet \"p=3 bar, T=230 degC\" --vary \"exit.p=4,5 bar\"")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --exit \"p=1 bar\" --vary \"efficiency=120,130 %\"")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --exit \"p=1 bar\"")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --vary --exit \"p=1 bar\"")]
    [InlineData(2, "--exit \"p=1 bar\" --vary \"efficiency=0.9,0.95\"")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --vary \"recovery=0.5,0.6\"")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --vary \"exit.p=1,2 bar\" --find back.p")]
    [InlineData(2, "--inlet \"p=3 bar, T=230 degC\" --vary \"exit.p=1,2 bar\" --vary \"exit.p=1,2 bar\"")]
    public void It_ends_well_where_one_point_was_answered(int status, string options) => Assert.Equal(status, CommandRun.RunLine(Steam + options).Status);

    [Fact]
    public void A_dry_run_counts()
    {
        CommandRun run = CommandRun.RunLine(Steam + "--inlet \"T=230 degC\" --vary \"inlet.p=4..12 bar by 0.5 bar\" --vary \"exit.p=1,2,3 bar\" --dry-run");
        Assert.Equal("51 points: inlet.p 17, exit.p 3\n", run.Output);
    }

    [Theory]
    [InlineData("flowduct sweep", "sweep: (nothing) is not one of state, nozzle, diffuser, venturi")]
    [InlineData("flowduct sweep --vary \"inlet.p=1,2 bar\"", "sweep: (nothing) is not one of state, nozzle, diffuser, venturi")]
    [InlineData("flowduct sweep nozle --fluid air", "sweep: nozle is not one of state, nozzle, diffuser, venturi\n  did you mean nozzle?")]
    [InlineData(Steam + "--vary \"inlet.p=1..2 bar\"", "--vary: inlet.p: the range does not say its points")]
    [InlineData(Steam + "--inlet \"p=3 bar, T=230 degC\" --vary \"exti=1,2\"", "--vary: exti is no input of this device")]
    public void A_slip_is_told(string line, string message)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal(2, run.Status);
        Assert.StartsWith("flowduct: " + message, run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void The_fluid_and_words_vary_too()
    {
        CommandRun run = CommandRun.RunLine("flowduct sweep nozzle --inlet \"p=9 bar, T=230 degC\" --exit \"p=5 bar\" --vary \"fluid=steam,air\" --vary \"shape=convergent,convergent-divergent\" --show regime");
        Assert.Equal(["fluid,shape", "steam,convergent", "steam,convergent-divergent", "air,convergent", "air,convergent-divergent"], run.Output.TrimEnd('\n').Split('\n').Select(line => string.Join(',', line.Split(',')[..2])));
    }
}
