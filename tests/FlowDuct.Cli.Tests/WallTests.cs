using System.Globalization;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The wall of a nozzle from a file.</summary>
public sealed class WallTests : IDisposable
{
    private readonly string _file = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName() + ".csv");

    public void Dispose() => File.Delete(_file);

    // Perfect gas of k = 1.4, NACA Report 1135 (1953), Table II: A/A* of M = 0.50 is 1.340, of M = 2.00 is 1.688; air at 313 K is near it.
    [Fact]
    public void Sections_have_the_Mach_numbers_of_their_area_ratios()
    {
        double slow = 20 * Math.Sqrt(1.340), fast = 20 * Math.Sqrt(1.688);
        CommandRun run = Run(string.Create(CultureInfo.InvariantCulture, $"position [mm],diameter [mm]\n0,{slow:R}\n15,20\n\n60,{fast:R}\n"), fast);
        Assert.Equal(string.Empty, run.Error);
        string[][] rows = [.. run.Output.Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(1).Select(line => line.Split(','))];
        Assert.Equal(["0.000000", "15.00000", "60.00000"], rows.Select(row => row[0]));
        Assert.Equal(0.50, Mach(rows[0]), 2e-3);
        Assert.Equal(1.00, Mach(rows[1]), 1e-6);
        Assert.Equal(2.00, Mach(rows[2]), 5e-3);
    }

    [Theory]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,20\n60,0\n", "row 3: the diameter is not above zero\n  write the bore of the nozzle there")]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,20\n15,25\n", "row 3: the position does not rise\n  list the sections from inlet to exit")]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,20\n60\n", "row 3: cells: 1 instead of 2\n  write position, diameter")]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,20,5\n60,25\n", "row 2: cells: 3 instead of 2\n  write position, diameter")]
    [InlineData("position,diameter\n0,30\n15,20\n60,25\n", "the heading is not position [unit], diameter [unit]\n  write for example position [mm],diameter [mm]")]
    [InlineData("position [mm],diameter [mm]\n0,30\n60,25\n", "has fewer than three sections\n  give a heading and at least three rows")]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,18\n60,25\n", "its throat is 18 mm wide, that of the case 20 mm\n  give the bores of the wall as --throat and --exit")]
    [InlineData("position [mm],diameter [mm]\n0,30\n15,20\n60,28\n", "its exit is 28 mm wide, that of the case 25 mm\n  give the bores of the wall as --throat and --exit")]
    public void A_wall_that_is_none_is_met_by_its_message(string wall, string message)
    {
        CommandRun run = Run(wall, 25);
        Assert.Equal(2, run.Status);
        Assert.Equal(string.Empty, run.Output);
        Assert.StartsWith($"flowduct: --wall: {_file}", run.Error, StringComparison.Ordinal);
        Assert.EndsWith(message + "\n", run.Error, StringComparison.Ordinal);
    }

    private CommandRun Run(string wall, double exit)
    {
        File.WriteAllText(_file, wall);
        return CommandRun.Run(
            "nozzle", "--fluid", "air", "--inlet", "p0=8 bar, T0=313 K", "--throat", "d=20 mm", "--exit", string.Create(CultureInfo.InvariantCulture, $"d={exit:R} mm"),
            "--back", "p=0.5 bar", "--wall", _file, "--format", "csv");
    }

    private static double Mach(string[] row) => double.Parse(row[5], CultureInfo.InvariantCulture);
}
