using System.Diagnostics;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;

namespace FlowDuct.Benchmarks;

/// <summary>Nanoseconds per property call, the calls interleaved round by round.</summary>
internal static class Kernels
{
    private const int States = 1024;
    private const int Sweeps = 64;
    private const int Slow = 16;

    /// <summary>Calls one property function over prepared states and returns a sum, so that nothing is optimised away.</summary>
    private delegate double Kernel(Fluid fluid, FluidState[] states);

    private static readonly (string Name, Kernel Kernel)[] Calls =
    [
        ("FromPT", PT),
        ("FromPH", PH),
        ("FromPS", PS),
        ("FromHS", HS),
        ("FromPRho", PRho),
        ("NormalShock", Shock),
        ("ObliqueToPressure", Oblique),
        ("LargestDeflection", Deflection),
        ("PrandtlMeyer", Fan),
    ];

    internal static int Run(string[] args)
    {
        Arguments arguments = Arguments.Parse(args, defaultRuns: 41);
        (Fluid Fluid, FluidState[] States)[] fluids =
        [
            (GasCatalogue.Air, Grid(GasCatalogue.Air, 150, 1500)),
            (WaterFluid.Instance, Grid(WaterFluid.Instance, 300, 1000)),
            (ReferenceEquations.Nitrogen, Grid(ReferenceEquations.Nitrogen, 150, 600)),
        ];
        Dictionary<(string, string), List<double>> times = [];
        double sink = 0;
        for (int round = -5; round < arguments.Runs; round++) // the negative rounds let the compiler settle
        {
            foreach ((Fluid fluid, FluidState[] states) in fluids)
            {
                foreach ((string name, Kernel kernel) in Calls)
                {
                    double ns = Time(kernel, fluid, states, ref sink) * (name is "LargestDeflection" or "PrandtlMeyer" ? Slow : 1);
                    if (round >= 0)
                        Of(times, (fluid.Name, name)).Add(ns);
                }
            }
        }

        Write(times, arguments, sink);
        return 0;
    }

    private static double Time(Kernel kernel, Fluid fluid, FluidState[] states, ref double sink)
    {
        long start = Stopwatch.GetTimestamp();
        for (int i = 0; i < Sweeps; i++)
            sink += kernel(fluid, states);
        return Stopwatch.GetElapsedTime(start).TotalNanoseconds / (States * Sweeps);
    }

    private static void Write(Dictionary<(string Fluid, string Call), List<double>> times, Arguments arguments, double sink)
    {
        Report report = new();
        report.Note($"ns per call, {arguments.Runs} rounds of {States * Sweeps} calls, one thread; checksum {sink:E3}");
        report.Row("fluid", "call", "median_ns", "p10_ns", "p90_ns", "ratio_to_first");
        double first = Sample.Median(times.First().Value);
        foreach (((string fluid, string call), List<double> ns) in times)
        {
            double median = Sample.Median(ns);
            report.Row(
                fluid, call, Round(median), Round(Sample.Quantile(ns, 0.1)), Round(Sample.Quantile(ns, 0.9)), Math.Round(median / first, 2));
        }

        report.Write(arguments.Output);
    }

    private static double Round(double ns) => Math.Round(ns, 1);

    private static List<double> Of(Dictionary<(string, string), List<double>> times, (string, string) key) =>
        times.TryGetValue(key, out List<double>? list) ? list : times[key] = [];

    // Pressures and temperatures jump from state to state, so that no branch is predicted from its neighbour.
    private static FluidState[] Grid(Fluid fluid, double Tlow, double Thigh)
    {
        FluidState[] states = new FluidState[States];
        for (int i = 0; i < States; i++)
        {
            double spread = i * 0.6180339887498949 % 1;
            double p = 1e5 * (1 + (i % 37));
            if (fluid.FromPT(p, Tlow + (spread * (Thigh - Tlow)), out states[i]) != Outcome.Ok)
                throw new InvalidOperationException($"state {i} of {fluid.Name} lies outside its range");
        }

        return states;
    }

    private static double PT(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            fluid.FromPT(at.p, at.T, out FluidState got);
            sum += got.w;
        }

        return sum;
    }

    private static double PH(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            fluid.FromPH(at.p, at.h, default, out FluidState got);
            sum += got.w;
        }

        return sum;
    }

    private static double PS(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            fluid.FromPS(at.p, at.s, default, out FluidState got);
            sum += got.w;
        }

        return sum;
    }

    private static double HS(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            fluid.FromHS(at.h, at.s, default, out FluidState got);
            sum += got.w;
        }

        return sum;
    }

    private static double PRho(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            fluid.FromPRho(at.p, at.rho, out FluidState got);
            sum += got.w;
        }

        return sum;
    }

    private static double Shock(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            NormalShock.TryFind(fluid, at, 1.5 * at.w, out FluidState got, out double V2);
            sum += got.w + V2;
        }

        return sum;
    }

    private static double Oblique(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan())
        {
            ObliqueShock.TryToPressure(fluid, at, 2 * at.w, 1.5 * at.p, out ObliqueWave wave);
            sum += wave.Theta;
        }

        return sum;
    }

    // Slow members: every sixteenth state, counted as such.
    private static double Deflection(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        for (int i = 0; i < states.Length; i += Slow)
        {
            ObliqueShock.TryLargestDeflection(fluid, states[i], 1.5 * states[i].w, out ObliqueWave wave);
            sum += wave.Theta;
        }

        return sum;
    }

    private static double Fan(Fluid fluid, FluidState[] states)
    {
        double sum = 0;
        for (int i = 0; i < states.Length; i += Slow)
        {
            ref readonly FluidState at = ref states[i];
            PrandtlMeyer.TryTurning(fluid, at.h + (1.2 * at.w * at.w), at.s, at.p, 0.5 * at.p, out double nu);
            sum += nu;
        }

        return sum;
    }
}
