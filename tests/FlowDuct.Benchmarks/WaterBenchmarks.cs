using BenchmarkDotNet.Attributes;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;

namespace FlowDuct.Benchmarks;

/// <summary>The property calls of water, a state a call, over states that jump about their region.</summary>
[MemoryDiagnoser]
public class WaterBenchmarks
{
    private const int States = 1024;

    private static readonly WaterFluid s_water = WaterFluid.Instance;
    private readonly FluidState[] region1 = Grid((u, w) => (1e5 + (u * 80e6), 280 + (w * 170)));
    private readonly FluidState[] region2 = Grid((u, w) => (1e4 + (u * 3.5e6), 530 + (w * 500)));
    private readonly FluidState[] region3 = Grid((u, w) => (25e6 + (u * 60e6), 630 + (w * 30)));
    private readonly (double p, double s)[] wet = [.. Grid((u, w) => (1e4 + (u * 3e6), 530 + (w * 20))).Select((at, i) => (at.p, Wet(at.p, 0.5 + (0.45 * (i % 97) / 97))))];

    /// <summary>As many multiplications and additions as the sums of region 2 have, in six independent chains.</summary>
    [Benchmark(OperationsPerInvoke = States)]
    public double MultiplyAdd()
    {
        double sum = 0;
        foreach (ref readonly FluidState at in region2.AsSpan())
        {
            double x = at.p * 1e-9, a = x, b = 1, c = 2, d = 3, e = 4, f = 5;
            for (int i = 0; i < Region2Kernel.Operations / 12; i++)
            {
                a = (a * x) + 1.1;
                b = (b * x) + 1.2;
                c = (c * x) + 1.3;
                d = (d * x) + 1.4;
                e = (e * x) + 1.5;
                f = (f * x) + 1.6;
            }

            sum += a + b + c + d + e + f;
        }

        return sum;
    }

    [Benchmark(OperationsPerInvoke = States)]
    public double Region1Full() => Sum(region1, static (in FluidState at) => Region1.State(at.p, at.T).w);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2Full() => Sum(region2, static (in FluidState at) => Region2.State(at.p, at.T).w);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region3FullByDensity() => Sum(region3, static (in FluidState at) => Region3.State(at.rho, at.T).w);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region3Full() => Sum(region3, PT);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2FromPT() => Sum(region2, PT);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2FromPH() => Sum(region2, PH);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2FromPS() => Sum(region2, PS);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region1FromPH() => Sum(region1, PH);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region3FromPH() => Sum(region3, PH);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2FromHS() => Sum(region2, HS);

    [Benchmark(OperationsPerInvoke = States)]
    public double Region2FromPRho() => Sum(region2, PRho);

    [Benchmark(OperationsPerInvoke = States)]
    public double WetFromPS()
    {
        double sum = 0;
        foreach ((double p, double s) in wet)
        {
            s_water.FromPS(p, s, default, out FluidState got);
            sum += got.h;
        }

        return sum;
    }

    [Benchmark(OperationsPerInvoke = States)]
    public double SaturationTemperature() => Sum(region2, static (in FluidState at) => SaturationLine.Temperature(at.p));

    private delegate double Call(in FluidState at);

    private static double PT(in FluidState at)
    {
        s_water.FromPT(at.p, at.T, out FluidState got);
        return got.w;
    }

    private static double PH(in FluidState at)
    {
        s_water.FromPH(at.p, at.h, default, out FluidState got);
        return got.w;
    }

    private static double PS(in FluidState at)
    {
        s_water.FromPS(at.p, at.s, default, out FluidState got);
        return got.w;
    }

    private static double HS(in FluidState at)
    {
        s_water.FromHS(at.h, at.s, default, out FluidState got);
        return got.w;
    }

    private static double PRho(in FluidState at)
    {
        s_water.FromPRho(at.p, at.rho, out FluidState got);
        return got.w;
    }

    private static double Sum(FluidState[] states, Call call)
    {
        double sum = 0;
        foreach (ref readonly FluidState at in states.AsSpan()) sum += call(at);
        return sum;
    }

    private static double Wet(double p, double x)
    {
        s_water.FromPX(p, x, out FluidState at);
        return at.s;
    }

    private static FluidState[] Grid(Func<double, double, (double p, double T)> place)
    {
        var states = new FluidState[States];
        for (int i = 0; i < States; i++)
        {
            (double p, double T) = place(i * 0.6180339887498949 % 1, i * 0.7548776662466927 % 1);
            if (s_water.FromPT(p, T, out states[i]) != Outcome.Ok) throw new InvalidOperationException($"state {i} lies outside the range");
        }

        return states;
    }
}
