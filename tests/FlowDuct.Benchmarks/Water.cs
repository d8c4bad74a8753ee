using System.Diagnostics;
using System.Globalization;
using BenchmarkDotNet.Columns;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Loggers;
using BenchmarkDotNet.Reports;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;
using FlowDuct.Fluids.Water.Verification;

namespace FlowDuct.Benchmarks;

/// <summary>
/// Water's property calls beside a plain multiply-add loop and the general-purpose library python3-iapws, in one run, as ratios; in the same
/// row what the calls miss the printed check values by, so that no speed is bought with error.
/// </summary>
internal static class Water
{
    // Which equations of the check tables stand behind a call.
    private static readonly Dictionary<string, string> s_equations = new()
    {
        ["Region1Full"] = "region1 basic equation (7)",
        ["Region2Full"] = "region2 basic equation (15)",
        ["Region3FullByDensity"] = "region3 basic equation (28)",
        ["Region3Full"] = "region3 basic equation (28)",
        ["SaturationTemperature"] = "saturation-temperature equation (31)",
    };

    internal static int Run(string[] args)
    {
        Arguments arguments = Arguments.Parse(args, defaultRuns: 15);
        IConfig config = ManualConfig.CreateEmpty().AddColumnProvider(DefaultColumnProviders.Instance).AddLogger(ConsoleLogger.Default)
            .AddDiagnoser(BenchmarkDotNet.Diagnosers.MemoryDiagnoser.Default)
            .AddJob(Job.Default.WithToolchain(InProcessEmitToolchain.Instance).WithIterationCount(arguments.Runs).WithWarmupCount(5));
        Summary summary = BenchmarkRunner.Run<WaterBenchmarks>(config);
        Dictionary<string, double> rival = Rival();
        Report report = new();
        report.Note($"ns per state, one thread, BenchmarkDotNet, {arguments.Runs} iterations; python_ns: python3-iapws in the same run, best of five");
        report.Note("residual: greatest deviation from the printed check values of the equation, in units of their last digit");
        report.Row("call", "median_ns", "allocated_bytes", "ratio_to_multiply_add", "ratio_to_region_2", "python_ns", "times_faster_than_python", "residual");
        double loop = Median(summary, "MultiplyAdd"), plain = Median(summary, "Region2FromPT");
        foreach (BenchmarkReport one in summary.Reports)
        {
            string name = one.BenchmarkCase.Descriptor.WorkloadMethod.Name;
            double ns = Median(summary, name);
            bool known = rival.TryGetValue(name, out double python);
            report.Row(
                name, Math.Round(ns, 1), one.GcStats.GetBytesAllocatedPerOperation(one.BenchmarkCase) ?? 0, Math.Round(ns / loop, 2), Math.Round(ns / plain, 2),
                known ? python : "", known ? Math.Round(python / ns) : "", Residual(name));
        }

        report.Write(arguments.Output);
        return 0;
    }

    private static double Median(Summary summary, string name) =>
        summary.Reports.Single(one => one.BenchmarkCase.Descriptor.WorkloadMethod.Name == name).ResultStatistics!.Median;

    private static object Residual(string name) => s_equations.TryGetValue(name, out string? equation)
        ? Math.Round(CheckRow.All().Where(row => row.Equation == equation).Max(row => Math.Abs(new CheckResult(row, CheckedEquations.Of(row, 1)).Units)), 2)
        : "";

    private static Dictionary<string, double> Rival()
    {
        Dictionary<string, double> times = [];
        string script = Path.Combine(AppContext.BaseDirectory, "iapws_timing.py");
        using var python = Process.Start(new ProcessStartInfo("/usr/bin/python3", [script]) { RedirectStandardOutput = true })!;
        while (python.StandardOutput.ReadLine() is string line)
        {
            string[] cells = line.Split(',');
            times[cells[0]] = double.Parse(cells[1], CultureInfo.InvariantCulture);
        }

        python.WaitForExit();
        return times;
    }
}
