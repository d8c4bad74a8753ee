using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Rating;

/// <summary>A hundred thousand random nozzles: an answer that obeys the laws, or a refusal with its reason; nothing else.</summary>
public class CampaignTests
{
    private const int Count = 100_000;

    // Rounding of the inverses, beside which a kink or a weak wet shock may lose a trace of entropy, J/(kg.K).
    private const double EntropyTrace = 2e-3;

    // The share that may be refused: states outside a formulation, exits beyond the reach of a throat.
    private const double MostRefused = 0.12;

    private static readonly StationSymbol[] s_second = [StationSymbol.StagnationTemperature, StationSymbol.Superheat, StationSymbol.Subcooling, StationSymbol.Quality];

    private static readonly WaterFluid s_water = WaterFluid.Instance;

    private static readonly Gen<DeviceCase> s_inlets = Gen.OneOf(
        ByPair(s_water, Pressures(2e3, 9e7), StationSymbol.StagnationTemperature, Gen.Double[280, 1060]),
        ByPair(s_water, Pressures(2e3, 2.1e7), StationSymbol.Superheat, Gen.Double[0.3, 300]),
        ByPair(s_water, Pressures(2e3, 2.1e7), StationSymbol.Quality, Gen.OneOf(Gen.Const(0.0), Gen.Const(1.0), Gen.Double[0, 1])),
        ByPair(s_water, Pressures(2e4, 2.1e7), StationSymbol.Subcooling, Gen.Double[0.3, 100]),
        ByPair(GasCatalogue.Air, Pressures(1e3, 5e7), StationSymbol.StagnationTemperature, Gen.Double[230, 2500]),
        ByPair(GasCatalogue.Find("carbon-dioxide")!, Pressures(1e3, 1e7), StationSymbol.StagnationTemperature, Gen.Double[320, 2500]),
        ByPair(GasCatalogue.Find("hydrogen")!, Pressures(1e3, 1e7), StationSymbol.StagnationTemperature, Gen.Double[320, 2500]));

    private static readonly Gen<(DeviceCase Case, double Ratio, double Back, double Efficiency)> s_cases = Gen.Select(
        s_inlets,
        Gen.OneOf(Gen.Const(1.0), Gen.Double[1.02, 6], Gen.Double[-3, 2].Select(x => 1 + Math.Pow(10, x))),
        Gen.OneOf(Gen.Double[0.02, 0.999], Gen.Double[-3, 0].Select(x => Math.Pow(10, x))),
        Gen.OneOf(Gen.Const(1.0), Gen.Double[0.9, 0.999]));

    [Fact]
    public void Every_nozzle_is_answered_within_the_laws_or_refused_with_a_reason()
    {
        int answered = 0, refused = 0;
        Dictionary<string, int> regimes = [];
        List<string> failures = [];
        s_cases.Each(
            drawn =>
            {
                DeviceCase c = Complete(drawn.Case, drawn.Ratio, drawn.Back, drawn.Efficiency, answered + refused);
                try
                {
                    DeviceAnswer a = DeviceSolver.Stations(c);
                    if (Broken(a) is string broken) failures.Add($"{broken}: {a.Performance.Regime}, {Words(c, drawn.Ratio)}");
                    regimes[a.Performance.Regime!] = regimes.GetValueOrDefault(a.Performance.Regime!) + 1;
                    answered++;
                }
                catch (FlowDuctException)
                {
                    refused++;
                }
                catch (InvalidOperationException defect)
                {
                    failures.Add($"{defect.Message}: {Words(c, drawn.Ratio)}");
                }
            },
            Count);
        Assert.True(failures.Count == 0, $"{failures.Count} failures, such as\n{string.Join('\n', failures.Take(12))}");
        int all = answered + refused;
        Assert.True(all >= Count && refused < MostRefused * all, $"{refused} refused");
        Assert.All(["subsonic", "choked", "shock-in-divergence", "overexpanded", "underexpanded"], regime => Assert.True(regimes.GetValueOrDefault(regime) > all / 100, $"{regime}: {regimes.GetValueOrDefault(regime)}"));
    }

    private static DeviceCase Complete(DeviceCase c, double ratio, double back, double efficiency, int number)
    {
        const double throat = 1e-4;
        DeviceCase whole = c with { Expansion = number % 5 == 0 && ReferenceEquals(c.Fluid, s_water) ? Held(c) : ExpansionModel.Equilibrium };
        whole.Throat.Set((int)StationSymbol.Area, throat);
        if (ratio > 1) whole.Exit.Set((int)StationSymbol.Area, ratio * throat);
        whole.Back.Set((int)StationSymbol.Pressure, back * c.Inlet.Value((int)StationSymbol.StagnationPressure));
        whole.Options.Set((int)CaseOption.Efficiency, efficiency);
        return whole;
    }

    private static ExpansionModel Held(DeviceCase c) => c.Inlet.Has((int)StationSymbol.Subcooling) ? ExpansionModel.SinglePhase
        : c.Inlet.Has((int)StationSymbol.Superheat) ? ExpansionModel.Supersaturated : ExpansionModel.Equilibrium;

    private static string? Broken(DeviceAnswer a)
    {
        double V2 = a.Exit.Velocity!.Value, flow = a.Performance.MassFlow!.Value, h0 = a.Inlet.StagnationEnthalpy!.Value;
        if (!(double.IsFinite(V2) && double.IsFinite(flow) && V2 >= 0 && flow >= 0 && a.Exit.State.p > 0 && a.Exit.State.T > 0)) return "no number";
        if (Math.Abs(h0 - a.Exit.State.h - (V2 * V2 / 2)) > 1e-9 * Math.Max(Math.Abs(h0), 1e5)) return "energy";
        if (a.Exit.State.s < a.Inlet.State.s - EntropyTrace) return FormattableString.Invariant($"entropy falls by {a.Inlet.State.s - a.Exit.State.s:R}");
        return a.Throat is not null && V2 > 0 && Math.Abs((a.Exit.Flux!.Value * a.Exit.Area!.Value / flow) - 1) > 1e-8 ? FormattableString.Invariant($"mass {(a.Exit.Flux!.Value * a.Exit.Area!.Value / flow) - 1:R}") : null;
    }

    private static string Words(DeviceCase c, double ratio) => FormattableString.Invariant(
        $"{c.Fluid.Name} {c.Expansion} p0={c.Inlet.Value((int)StationSymbol.StagnationPressure):R} {string.Join(' ', s_second.Where(symbol => c.Inlet.Has((int)symbol)).Select(symbol => FormattableString.Invariant($"{symbol}={c.Inlet.Value((int)symbol):R}")))} A2/At={ratio:R} back={c.Back.Value((int)StationSymbol.Pressure):R} eta={c.Value(CaseOption.Efficiency):R}");

    private static Gen<double> Pressures(double least, double most) => Gen.Double[Math.Log(least), Math.Log(most)].Select(Math.Exp);

    private static Gen<DeviceCase> ByPair(Fluid fluid, Gen<double> pressure, StationSymbol symbol, Gen<double> value) => Gen.Select(pressure, value).Select((p, y) =>
    {
        var c = new DeviceCase { Device = DeviceKind.Nozzle, Fluid = fluid };
        c.Inlet.Set((int)StationSymbol.StagnationPressure, p);
        c.Inlet.Set((int)symbol, y);
        return c;
    });
}
