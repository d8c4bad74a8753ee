using System.Diagnostics;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;

namespace FlowDuct.Benchmarks;

/// <summary>Whole nozzle solves a second on one core, with the states each asks for and the bytes it allocates.</summary>
internal static class Nozzles
{
    private const int Cases = 256;

    private delegate RatingOutcome Solve(in RatingInlet inlet, double u, out NozzleRating rating);

    private static readonly NozzleGeometry s_convergent = new(1e-4, 1e-4, 1, null);
    private static readonly NozzleGeometry s_divergent = new(1e-4, 1.8e-4, 1, null);

    private static readonly (string Name, RatingInlet[] Inlets, Solve Solve)[] s_jobs =
    [
        ("superheated steam: exit and choked throat", Inlets(WaterFluid.Instance, (u, w) => Superheated(3e5 + (u * 20e5), 100 + (w * 150))), Convergent),
        ("steam: throat in the wet region", Inlets(WaterFluid.Instance, (u, w) => Wet(3e5 + (u * 20e5), 0.9 + (w * 0.09))), Convergent),
        ("dry saturated steam: across saturation", Inlets(WaterFluid.Instance, (u, _) => Wet(3e5 + (u * 20e5), 1)), Convergent),
        ("superheated steam: shock in the divergence", Inlets(WaterFluid.Instance, (u, w) => Superheated(3e5 + (u * 20e5), 150 + (w * 100))), Shock),
        ("air: exit and choked throat", Inlets(GasCatalogue.Air, (u, w) => At(GasCatalogue.Air, 3e5 + (u * 20e5), 300 + (w * 300))), Convergent),
        ("air: shock in the divergence", Inlets(GasCatalogue.Air, (u, w) => At(GasCatalogue.Air, 3e5 + (u * 20e5), 400 + (w * 300))), Shock),
        ("nitrogen by its reference equation: exit and choked throat", Inlets(ReferenceEquations.Nitrogen, (u, w) => At(ReferenceEquations.Nitrogen, 10e5 + (u * 190e5), 250 + (w * 250))), Convergent),
        ("nitrogen by its reference equation: shock in the divergence", Inlets(ReferenceEquations.Nitrogen, (u, w) => At(ReferenceEquations.Nitrogen, 10e5 + (u * 190e5), 300 + (w * 200))), Shock),
        ("wet carbon dioxide by its reference equation: exit and choked throat", Inlets(ReferenceEquations.CarbonDioxide, (u, w) => Moist(15e5 + (u * 40e5), 0.85 + (w * 0.14))), WetConvergent),
    ];

    internal static int Run(string[] args)
    {
        Arguments arguments = Arguments.Parse(args, defaultRuns: 21);
        Dictionary<string, List<double>> times = [];
        double sink = 0;
        for (int round = -5; round < arguments.Runs; round++) // the negative rounds let the compiler settle
        {
            foreach ((string name, RatingInlet[] inlets, Solve solve) in s_jobs)
            {
                long start = Stopwatch.GetTimestamp();
                sink += Sweep(inlets, solve);
                double seconds = Stopwatch.GetElapsedTime(start).TotalSeconds / Cases;
                if (round >= 0) (times.TryGetValue(name, out List<double>? list) ? list : times[name] = []).Add(seconds);
            }
        }

        Write(times, arguments, sink);
        return 0;
    }

    private static void Write(Dictionary<string, List<double>> times, Arguments arguments, double sink)
    {
        Report report = new();
        report.Note($"{arguments.Runs} rounds of {Cases} solves, one thread; states: property calls a solve; checksum {sink:E3}");
        report.Row("job", "solves_per_second", "median_us", "states_per_solve", "allocated_bytes");
        foreach ((string name, RatingInlet[] inlets, Solve solve) in s_jobs)
        {
            double seconds = Sample.Median(times[name]);
            report.Row(name, Math.Round(1 / seconds), Math.Round(seconds * 1e6, 2), Math.Round(States(inlets, solve), 1), Allocated(inlets, solve));
        }

        report.Write(arguments.Output);
    }

    private static double Sweep(RatingInlet[] inlets, Solve solve)
    {
        double sum = 0;
        for (int i = 0; i < inlets.Length; i++)
        {
            if (solve(inlets[i], (double)i / inlets.Length, out NozzleRating rating) != RatingOutcome.Ok) throw new InvalidOperationException($"case {i} is not solved");
            sum += rating.MassFlow;
        }

        return sum;
    }

    private static double States(RatingInlet[] inlets, Solve solve)
    {
        var counting = new CountingFluid(inlets[0].Fluid);
        Sweep([.. inlets.Select(inlet => inlet with { Fluid = counting })], solve);
        return (double)counting.States / inlets.Length;
    }

    private static long Allocated(RatingInlet[] inlets, Solve solve)
    {
        long before = GC.GetAllocatedBytesForCurrentThread();
        Sweep(inlets, solve);
        return (GC.GetAllocatedBytesForCurrentThread() - before) / inlets.Length;
    }

    private static RatingOutcome Convergent(in RatingInlet inlet, double u, out NozzleRating rating) =>
        ConvergentNozzle.Rate(inlet, s_convergent, (0.1 + (0.3 * u)) * inlet.p0, out rating);

    // Below 0.4 of p0 most of these would freeze.
    private static RatingOutcome WetConvergent(in RatingInlet inlet, double u, out NozzleRating rating) =>
        ConvergentNozzle.Rate(inlet, s_convergent, (0.4 + (0.1 * u)) * inlet.p0, out rating);

    // 1.8 times the throat area: a shock stands inside from about 0.54 to 0.92 of p0.
    private static RatingOutcome Shock(in RatingInlet inlet, double u, out NozzleRating rating)
    {
        RatingOutcome outcome = DivergentNozzle.Rate(inlet, s_divergent, (0.62 + (0.2 * u)) * inlet.p0, out rating);
        return outcome == RatingOutcome.Ok && rating.Regime != Regime.ShockInDivergence ? RatingOutcome.NotConverged : outcome;
    }

    private static RatingInlet[] Inlets(Fluid fluid, Func<double, double, FluidState> place)
    {
        var inlets = new RatingInlet[Cases];
        for (int i = 0; i < Cases; i++)
        {
            FluidState at = place(i * 0.6180339887498949 % 1, i * 0.7548776662466927 % 1);
            inlets[i] = new RatingInlet(fluid, at.h, at.s, at.p);
        }

        return inlets;
    }

    private static FluidState Superheated(double p, double dT)
    {
        WaterFluid.Instance.TrySaturationTemperature(p, out double T);
        return At(WaterFluid.Instance, p, T + dT);
    }

    private static FluidState Wet(double p, double x)
    {
        WaterFluid.Instance.FromPX(p, x, out FluidState at);
        return at;
    }

    private static FluidState Moist(double p, double x)
    {
        ReferenceEquations.CarbonDioxide.FromPX(p, x, out FluidState at);
        return at;
    }

    private static FluidState At(Fluid fluid, double p, double T)
    {
        fluid.FromPT(p, T, out FluidState at);
        return at;
    }
}
