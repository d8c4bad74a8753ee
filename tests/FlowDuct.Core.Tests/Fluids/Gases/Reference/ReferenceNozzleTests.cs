using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>Nozzles, diffusers and shocks of real gases hold mass, energy and entropy, across saturation and above the critical point too.</summary>
public class ReferenceNozzleTests
{
    [Theory]
    [InlineData("CO2", "p0=60 bar, T0=40 degC", "p=10 bar", Phase.Wet)]
    [InlineData("CO2", "p=30 bar, x=0.95, V=20 m/s", "p=8 bar", Phase.Wet)]
    [InlineData("CO2", "p=65 bar, T=20 degC, V=5 m/s", "p=30 bar", Phase.Wet)] // liquid that flashes
    [InlineData("CO2", "p0=150 bar, T0=100 degC", "p=90 bar", Phase.Supercritical)]
    [InlineData("N2", "p0=60 bar, T0=150 K", "p=6 bar", Phase.Wet)]
    [InlineData("Air", "p0=200 bar, T0=15 degC", "p=60 bar", Phase.Supercritical)]
    [InlineData("Air", "p=200 bar, T=15 degC, V=40 m/s", "p=2 bar", Phase.None)] // past the dew line: refused below
    public void A_nozzle_holds_the_laws(string gas, string inlet, string exit, Phase phase)
    {
        DeviceCase c = Cases.Nozzle(Equations.Of(gas), inlet, exit, (CaseOption.Efficiency, "0.93"), (CaseOption.Flow, "0.8 kg/s"));
        if (phase == Phase.None)
        {
            Errors.FlowDuctException refused = Assert.Throws<Errors.FlowDuctException>(() => DeviceSolver.Solve(c));
            Assert.Contains("dew line of air", refused.Message, StringComparison.Ordinal);
            return;
        }

        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(phase, a.Exit.State.Phase);
        Assert.InRange(Math.Abs(a.Ledger!.Closure) / Math.Max(Math.Abs(a.Ledger.In), 1e4), 0, 1e-12);
        Assert.Equal(0.8, a.Exit.Flux!.Value * a.Exit.Area!.Value, 1e-12);
        Assert.Equal(Verdict.Holds, a.Audit.Entropy);
        Assert.Equal(0.93, a.Performance.IsentropicEfficiency!.Value, 1e-6);
        Assert.DoesNotContain(a.Findings, finding => finding.Code == "real-gas");
        if (phase == Phase.Wet && a.Inlet.State.Phase != Phase.Wet)
            Assert.StartsWith(a.Fluid.Source, a.Findings.Single(finding => finding.Code is "wet-exit" or "flashing").Standing, StringComparison.Ordinal);
        if (a.Throat is not StationAnswer throat) return;
        foreach (double part in (double[])[0.9, 0.99, 0.999, 1.001, 1.01, 1.1])
        {
            if (part * throat.State.p >= a.Inlet.Stagnation!.Value.p || a.Fluid.FromPS(part * throat.State.p, a.Inlet.State.s, default, out FluidState beside) != Outcome.Ok) continue;
            Assert.InRange(Energy.Velocity(a.Inlet.StagnationEnthalpy!.Value, beside.h) / beside.v, 0, throat.Flux!.Value * (1 + 1e-6));
        }
    }

    [Theory]
    [InlineData("CO2", "p0=60 bar, T0=60 degC", "p=35 bar")]
    [InlineData("N2", "p0=200 bar, T0=300 K", "p=130 bar")]
    [InlineData("Air", "p0=200 bar, T0=60 degC", "p=130 bar")]
    public void A_rated_nozzle_with_a_shock_conserves(string gas, string inlet, string back)
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(Equations.Of(gas), inlet, "d=5 mm", "d=7 mm", back));
        Assert.Equal(Regime.ShockInDivergence, a.Rating!.Value.Regime);
        Assert.InRange(Math.Abs(a.Ledger!.Closure) / Math.Max(Math.Abs(a.Ledger.In), 1e4), 0, 1e-12);
        double flow = a.Rating.Value.MassFlow;
        Assert.Equal(1, a.Exit.State.rho * a.Exit.Velocity!.Value * a.Exit.Area!.Value / flow, 1e-9);
        Assert.Equal(1, a.Throat!.State.rho * a.Throat.Velocity!.Value * a.Throat.Area!.Value / flow, 1e-9);
    }

    [Fact]
    public void A_diffuser_of_dense_carbon_dioxide_recovers_by_the_real_gas()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Diffuser(
            ReferenceEquations.CarbonDioxide, "p=80 bar, T=50 degC, V=120 m/s", "V=30 m/s", (CaseOption.Recovery, "0.7"), (CaseOption.Flow, "2 kg/s")));
        Assert.InRange(Math.Abs(a.Ledger!.Closure) / Math.Abs(a.Ledger.In), 0, 1e-12);
        Assert.Equal(Verdict.Holds, a.Audit.Entropy);
        Assert.True(a.Exit.State.p > a.Inlet.State.p);
    }

    // Mass, momentum, energy to 1e-10 of each flux, by the promise of the solver; weak and strong shocks, dense and thin gas, wet streams.
    [Theory]
    [InlineData("N2", 1e5, 3e7, 180, 400)]
    [InlineData("CO2", 1e5, 2e7, 330, 600)]
    [InlineData("Air", 1e5, 3e7, 180, 400)]
    public void A_normal_shock_conserves(string gas, double low, double high, double cold, double hot)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Gen.Select(Gen.Double[Math.Log(low), Math.Log(high)], Gen.Double[cold, hot], Gen.Double[1.02, 2.5]).Each(
            (lnp, T, M) =>
            {
                Assert.Equal(Outcome.Ok, fluid.FromPT(Math.Exp(lnp), T, out FluidState at));
                Conserves(fluid, at, M);
            },
            400);
    }

    [Fact]
    public void A_shock_in_wet_carbon_dioxide_conserves() => Gen.Select(Gen.Double[225, 295], Gen.Double[0.5, 0.98], Gen.Double[1.05, 2]).Each(
        (T, x, M) =>
        {
            Assert.Equal(Outcome.Ok, ReferenceEquations.CarbonDioxide.FromTX(T, x, out FluidState at));
            Conserves(ReferenceEquations.CarbonDioxide, at, M);
        },
        200);

    private static void Conserves(HelmholtzFluid fluid, in FluidState at, double M)
    {
        double V = M * at.w;
        Assert.True(NormalShock.TryFind(fluid, at, V, out FluidState behind, out double V2), $"p={at.p:R} T={at.T:R} x={at.x:R} M={M:R}");
        double momentum = at.p + (at.rho * V * V), energy = at.h + (V * V / 2);
        Assert.Equal(1, behind.rho * V2 / (at.rho * V), 1e-10);
        Assert.Equal(1, (behind.p + (behind.rho * V2 * V2)) / momentum, 1e-10);
        Assert.Equal(energy, behind.h + (V2 * V2 / 2), 1e-10 * Math.Max(Math.Abs(energy), V * V));
        Assert.True(behind.s >= at.s - (1e-11 * Math.Abs(at.s)) && V2 < behind.w && behind.p > at.p, $"p={at.p:R} T={at.T:R} x={at.x:R} M={M:R}");
    }
}
