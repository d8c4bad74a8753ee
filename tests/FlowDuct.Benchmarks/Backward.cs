using System.Diagnostics;
using FlowDuct.Fluids.Water;

namespace FlowDuct.Benchmarks;

/// <summary>Nanoseconds per call of the supplementary backward equations of water, beside the iteration that v(p,T) can start.</summary>
internal static class Backward
{
    private const int States = 1024;
    private const int Sweeps = 64;

    private static readonly (string Name, Func<double, double, double> Call, (double, double)[] States)[] s_calls =
    [
        ("v(p,T) region 3", Region3Volume.Of, Points((u, w) => InRegion3(17e6 + (u * 83e6), w))),
        ("v(p,T) 22.0 to 23.5 MPa", Region3Volume.Of, Points((u, w) => InRegion3(22e6 + (u * 1.5e6), w))),
        ("rho(p,T) by iteration", Region3Density.Of, Points((u, w) => InRegion3(17e6 + (u * 83e6), w))),
        ("p(h,s) region 1", EnthalpyEntropyGuess.p1, Points((u, w) => Pair(Region1.State(20e6 + (u * 80e6), 280 + (w * 340))))),
        ("p(h,s) region 2", EnthalpyEntropyGuess.p2, Points((u, w) => Pair(Region2.State(1e5 + (u * 15e6), 640 + (w * 430))))),
        ("p(h,s) region 3", Region3EnthalpyEntropy.p3, Points((u, w) => Pair(Region3.State(200 + (u * 400), 650 + (w * 50))))),
        ("Tsat(h,s)", WetTemperature.Of, Points((u, w) => (2000e3 + (u * 400e3), 5500 + (w * 1000)))),
        ("T(p,s) region 2", Region2.TFromPS, Points((u, w) => PS(Region2.State(1e5 + (u * 3.4e6), 530 + (w * 500))))),
        ("T(p,h) region 2", Region2.TFromPH, Points((u, w) => PH(Region2.State(1e5 + (u * 3.4e6), 530 + (w * 500))))),
        ("h, s, cp region 2", Caloric, Points((u, w) => (1e5 + (u * 3.4e6), 530 + (w * 500)))),
        ("full region 2", (p, T) => Region2.State(p, T).w, Points((u, w) => (1e5 + (u * 3.4e6), 530 + (w * 500)))),
        ("Tsat(p)", (p, _) => SaturationLine.Temperature(p), Points((u, w) => (1e5 + (u * 3.4e6), 530 + (w * 500)))),
        ("T(p,h) region 1, straight-line code", Region1.TFromPH, Points((u, w) => (20e6 + (u * 80e6), 1e5 + (w * 1.4e6)))),
    ];

    private static (double, double) PS(RegionState at) => (at.p, at.s);

    private static (double, double) PH(RegionState at) => (at.p, at.h);

    private static double Caloric(double p, double T)
    {
        Region2.Caloric(p, T, out double h, out double s, out double cp);
        return h + s + cp;
    }

    internal static int Run(string[] args)
    {
        Arguments arguments = Arguments.Parse(args, defaultRuns: 41);
        List<double>[] times = [.. s_calls.Select(_ => new List<double>())];
        double sink = 0;
        for (int round = -5; round < arguments.Runs; round++) // the negative rounds let the compiler settle
        {
            for (int k = 0; k < s_calls.Length; k++)
            {
                double ns = Time(s_calls[k].Call, s_calls[k].States, ref sink);
                if (round >= 0) times[k].Add(ns);
            }
        }

        Write(times, arguments, sink);
        return 0;
    }

    private static double Time(Func<double, double, double> call, (double, double)[] states, ref double sink)
    {
        long start = Stopwatch.GetTimestamp();
        for (int i = 0; i < Sweeps; i++)
        {
            foreach ((double a, double b) in states) sink += call(a, b);
        }

        return Stopwatch.GetElapsedTime(start).TotalNanoseconds / (States * Sweeps);
    }

    private static void Write(List<double>[] times, Arguments arguments, double sink)
    {
        Report report = new();
        report.Note($"ns per call, {arguments.Runs} rounds of {States * Sweeps} calls, one thread; checksum {sink:E3}");
        report.Row("call", "median_ns", "p10_ns", "p90_ns");
        for (int k = 0; k < times.Length; k++)
            report.Row(s_calls[k].Name, Round(times[k], 0.5), Round(times[k], 0.1), Round(times[k], 0.9));
        report.Write(arguments.Output);
    }

    private static double Round(List<double> ns, double share) => Math.Round(Sample.Quantile(ns, share), 1);

    // Spread so that no branch is predicted from its neighbour.
    private static (double, double)[] Points(Func<double, double, (double, double)> at) =>
        [.. Enumerable.Range(1, States).Select(i => at(i * 0.7548776662466927 % 1, i * 0.5698402909980532 % 1))];

    private static (double, double) InRegion3(double p, double w) =>
        (p, WaterConstants.T13 + (w * (Boundaries.TB23(p) - WaterConstants.T13)));

    private static (double, double) Pair(RegionState at) => (at.h, at.s);
}
