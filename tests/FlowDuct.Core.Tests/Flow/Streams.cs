using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Flow;

/// <summary>Supersonic streams of air, superheated steam and wet steam, drawn at random but the same on every run.</summary>
internal static class Streams
{
    /// <summary>The fluid of NACA Report 1135.</summary>
    internal static readonly PerfectGas Perfect = new(1.4, 287.05);

    // Weak shocks are as likely as strong ones: M - 1 is drawn by its logarithm.
    internal static readonly Gen<Stream> Air = Draw(
        GasCatalogue.Air, 10, Gen.Select(Logarithmic(1e3, 1e6), Gen.Double[100, 300]).Select(At(GasCatalogue.Air)));

    internal static readonly Gen<Stream> Steam = Draw(
        WaterFluid.Instance, 2.5, Gen.Select(Logarithmic(1e3, 1e6), Gen.Double[460, 900]).Select(At(WaterFluid.Instance)));

    internal static readonly Gen<Stream> WetSteam = Draw(
        WaterFluid.Instance, 4, Gen.Select(Gen.Double[290, 450], Gen.Double[0.5, 0.99]).Select(Wet));

    internal static readonly Gen<Stream> All = Gen.OneOf(Air, Steam, WetSteam);

    internal static double Number(IReadOnlyDictionary<string, string> row, string column) =>
        double.Parse(row[column], System.Globalization.CultureInfo.InvariantCulture);

    internal static double Degrees(double radians) => radians * (180 / Math.PI);

    internal static double Radians(double degrees) => degrees * (Math.PI / 180);

    /// <summary>A stream of the perfect gas at 1 bar and 300 K.</summary>
    internal static Stream OfPerfectGas(double M)
    {
        Assert.Equal(Outcome.Ok, Perfect.FromPT(1e5, 300, out FluidState state));
        return new Stream(Perfect, state, M);
    }

    private static Gen<Stream> Draw(Fluid fluid, double most, Gen<FluidState> states) =>
        Gen.Select(states, Logarithmic(1e-4, most - 1)).Select((state, above) => new Stream(fluid, state, 1 + above));

    private static Gen<double> Logarithmic(double low, double high) => Gen.Double[Math.Log(low), Math.Log(high)].Select(Math.Exp);

    private static Func<double, double, FluidState> At(Fluid fluid) => (p, T) =>
    {
        Assert.Equal(Outcome.Ok, fluid.FromPT(p, T, out FluidState state));
        return state;
    };

    private static FluidState Wet(double T, double x)
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromTX(T, x, out FluidState state));
        return state;
    }
}

/// <summary>A stream before a shock.</summary>
internal readonly record struct Stream(Fluid Fluid, FluidState State, double M)
{
    internal double V => M * State.w;

    internal double h0 => State.h + (V * V / 2);

    public override string ToString() => FormattableString.Invariant($"{Fluid.Name} p={State.p:R} h={State.h:R} M={M:R}");
}
