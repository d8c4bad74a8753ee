using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>The laws over random steam and water nozzles: superheated, wet, saturated, subcooled and supercritical inlets.</summary>
public class SteamLawsTests
{
    private static readonly Gen<(double p, double T, double ratio, double eta)> s_single =
        Gen.Select(Gen.Double[Math.Log(2e4), Math.Log(6e7)], Gen.Double[290, 1050], Gen.Double[0.05, 0.98], Gen.Double[0.5, 1])
            .Select((lnp, T, ratio, eta) => (p: Math.Exp(lnp), T, ratio, eta));

    private static readonly Gen<(double p, double x, double ratio, double eta)> s_wet =
        Gen.Select(Gen.Double[Math.Log(2e4), Math.Log(2.0e7)], Gen.Double[0.02, 1], Gen.Double[0.05, 0.98], Gen.Double[0.5, 1])
            .Select((lnp, x, ratio, eta) => (p: Math.Exp(lnp), x, ratio, eta));

    private static DeviceAnswer? Solve((StationSymbol, double) second, double p, double p2, double eta)
    {
        DeviceCase c = Cases.Exact(
            DeviceKind.Nozzle, WaterFluid.Instance,
            [(StationSymbol.Pressure, p), second, (StationSymbol.Velocity, 15)],
            [(StationSymbol.Pressure, p2)],
            (CaseOption.Efficiency, eta), (CaseOption.Flow, 0.9));
        try
        {
            return DeviceSolver.Solve(c);
        }
        catch (FlowDuctException refused) when (refused.Refusal.Kind == RefusalKind.NoAnswer)
        {
            // An inlet on the saturation line, or an exit colder than 273.15 K.
            return null;
        }
    }

    private static int Check((StationSymbol, double) second, double p, double ratio, double eta)
    {
        if (Solve(second, p, ratio * p, eta) is not DeviceAnswer a) return 0;
        Assert.InRange(Math.Abs(a.Ledger!.Closure) / Math.Max(Math.Abs(a.Ledger.In), 1e4), 0, 1e-12);
        Assert.Equal(0.9, a.Exit.Flux!.Value * a.Exit.Area!.Value, 1e-12);
        Assert.Equal(Verdict.Holds, a.Audit.Entropy);
        Assert.Equal(eta, a.Performance.IsentropicEfficiency!.Value, 1e-6);
        if (a.Throat is not null)
        {
            // No point of the isentrope carries more flux than the throat.
            foreach (double part in (double[])[0.9, 0.97, 0.999, 1.001, 1.03, 1.1])
            {
                if (part * a.Throat.State.p >= a.Inlet.Stagnation!.Value.p) continue;
                if (WaterFluid.Instance.FromPS(part * a.Throat.State.p, a.Inlet.State.s, default, out FluidState beside) != Outcome.Ok) continue;
                double flux = Math.Sqrt(2 * Math.Max(0, a.Inlet.StagnationEnthalpy!.Value - beside.h)) / beside.v;
                Assert.InRange(flux, 0, a.Throat.Flux!.Value * (1 + 1e-6));
            }
        }

        return 1;
    }

    private static void CheckLosses((StationSymbol, double) second, double p, double ratio, double eta)
    {
        DeviceAnswer? ideal = Solve(second, p, ratio * p, 1), real = Solve(second, p, ratio * p, eta), worse = Solve(second, p, ratio * p, 0.9 * eta);
        if (ideal is null || real is null || worse is null) return;
        Assert.Equal(0, (ideal.Exit.State.s - ideal.Inlet.State.s) / 1e3, 1e-9);
        Assert.True(worse.Performance.EntropyRise > real.Performance.EntropyRise);
        Assert.True(worse.Exit.Velocity < real.Exit.Velocity);
    }

    [Fact]
    public void Energy_mass_and_entropy_hold_from_single_phase_inlets()
    {
        int solved = 0;
        s_single.Each(c => solved += Check((StationSymbol.Temperature, c.T), c.p, c.ratio, c.eta), 3000);
        Assert.InRange(solved, 2000, 3_000_000);
    }

    [Fact]
    public void Energy_mass_and_entropy_hold_from_wet_inlets()
    {
        int solved = 0;
        s_wet.Each(c => solved += Check((StationSymbol.Quality, c.x), c.p, c.ratio, c.eta), 2000);
        Assert.InRange(solved, 1500, 2_000_000);
    }

    [Fact]
    public void Less_efficiency_makes_more_entropy_and_less_velocity()
    {
        s_single.Each(c => CheckLosses((StationSymbol.Temperature, c.T), c.p, c.ratio, c.eta), 1000);
        s_wet.Each(c => CheckLosses((StationSymbol.Quality, c.x), c.p, c.ratio, c.eta), 500);
    }

    // Every figure of an exit, beside its pressure or beside the efficiency, leads back to it.
    [Fact]
    public void Exit_figures_of_an_answer_lead_back_to_it() => s_single.Where(c => c.T > 400 && c.p < 2e7).Each(
        c =>
        {
            if (Solve((StationSymbol.Temperature, c.T), c.p, c.ratio * c.p, c.eta) is not DeviceAnswer a) return;
            (StationSymbol, double)[] inlet = [(StationSymbol.Pressure, c.p), (StationSymbol.Temperature, c.T), (StationSymbol.Velocity, 15)];
            (StationSymbol Symbol, double Value) quality = a.Exit.State.HasQuality
                ? (StationSymbol.Quality, a.Exit.State.x)
                : (StationSymbol.Temperature, a.Exit.State.T);
            foreach ((StationSymbol, double) way in ((StationSymbol, double)[])
                [(StationSymbol.Velocity, a.Exit.Velocity!.Value), (StationSymbol.Enthalpy, a.Exit.State.h), (StationSymbol.Density, a.Exit.State.rho), quality])
            {
                try
                {
                    DeviceAnswer b = DeviceSolver.Solve(Cases.Exact(
                        DeviceKind.Nozzle, WaterFluid.Instance, inlet, [(StationSymbol.Pressure, c.ratio * c.p), way]));
                    if (!b.SaturatedReading) Assert.Equal(a.Exit.State.h, b.Exit.State.h, 1e-5 * Math.Abs(a.Exit.State.h));
                }
                catch (FlowDuctException refused) when (refused.Refusal.Kind == RefusalKind.NoAnswer)
                {
                    Assert.Fail($"p={c.p:R} T={c.T:R} ratio={c.ratio:R} eta={c.eta:R} {way}: {refused.Message}");
                }
            }
        },
        300);
}
