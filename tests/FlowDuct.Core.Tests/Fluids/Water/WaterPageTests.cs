using System.Globalization;
using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>The figures of docs/water.md are the ones that these tests measure and that the recorded benchmark holds.</summary>
public class WaterPageTests
{
    private static readonly WaterFluid s_water = WaterFluid.Instance;
    private static readonly string[] s_page = File.ReadAllLines(SourceTree.File("docs/water.md"));

    // A bound that the measurement stays far below would be as wrong as one that it passes.
    private const double Room = 50;

    public static TheoryData<string> Pairs { get; } = ["p, h", "p, s", "h, s", "p, rho"];

    [Theory]
    [MemberData(nameof(Pairs))]
    public void Closure_is_what_the_page_says(string pair)
    {
        double worst = 0;
        Gen.Select(Gen.Double[Math.Log(700), Math.Log(100e6)], Gen.Double[273.16, 2273.15]).Each(
            (lnp, T) =>
            {
                double p = Math.Exp(lnp);
                if (T > 1073.15 && p > 50e6) return;
                Assert.Equal(Outcome.Ok, s_water.FromPT(p, T, out FluidState at));
                worst = Math.Max(worst, Closure(pair, at));
            },
            20_000);
        double bound = Number(Cells($"| {pair} |")[1]);
        Assert.InRange(worst, bound / Room, bound);
    }

    [Fact]
    public void Speeds_are_those_of_the_recorded_run()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceTable.Read(SourceTree.File("tests/FlowDuct.Benchmarks/results/water.csv"));
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            string[] cells = Cells($"| `{row["call"]}` |");
            Assert.Equal(Math.Round(Number(row["median_ns"])), Number(cells[1]));
            Assert.Equal(row["times_faster_than_python"], cells[2]);
            Assert.Equal(row["allocated_bytes"], cells[3]);
        }
    }

    private static double Closure(string pair, in FluidState at)
    {
        FluidState back;
        switch (pair)
        {
            case "p, h":
                Assert.Equal(Outcome.Ok, s_water.FromPH(at.p, at.h, default, out back));
                return Off(at.h, back.h, 1e3);
            case "p, s":
                Assert.Equal(Outcome.Ok, s_water.FromPS(at.p, at.s, default, out back));
                return Off(at.s, back.s, 1);
            case "h, s":
                Assert.Equal(Outcome.Ok, s_water.FromHS(at.h, at.s, default, out back));
                return Math.Max(Off(at.h, back.h, 1e3), Off(at.s, back.s, 1));
            default:
                Assert.Equal(Outcome.Ok, s_water.FromPRho(at.p, at.rho, out back));
                return Off(at.rho, back.rho, 1);
        }
    }

    private static double Off(double expected, double actual, double scale) => Math.Abs(actual - expected) / Math.Max(Math.Abs(expected), scale);

    private static string[] Cells(string start) =>
        [.. Array.Find(s_page, line => line.StartsWith(start, StringComparison.Ordinal))!.Split('|', StringSplitOptions.TrimEntries).Skip(1)];

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
