using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Diffusers: definitions, limits, and what is derived from what.</summary>
public class DiffuserTests
{
    private const string Inlet = "p=14.2 psi, T=70 degF, V=540 ft/s";

    // Incompressible limit: ideal recovery 1 - 1/AR^2 (continuity and Bernoulli). At M = 0.03 compressibility adds M^2/4.
    [Fact]
    public void Slow_air_recovers_one_minus_the_square_of_the_inverse_area_ratio()
    {
        DeviceAnswer a = Diffuser("p=1 bar, T=20 degC, V=10 m/s", "V=5 m/s", (CaseOption.Efficiency, "100%"));
        double ratio = a.Performance.AreaRatio!.Value;
        Assert.Equal(2, ratio, 1e-3);
        Assert.Equal(1 - (1 / (ratio * ratio)), a.Performance.Recovery!.Value, 5e-4);
        Assert.Equal(a.Performance.Recovery!.Value, a.Performance.IdealRecovery!.Value, 1e-6);
        Assert.Equal(a.Performance.Recovery!.Value, a.Performance.RecoveryDynamic!.Value, 1e-3);
    }

    // Borda-Carnot: a sudden expansion loses (V1 - V2)^2/2, so the recovery on the dynamic head is 2 (1/AR)(1 - 1/AR).
    [Fact]
    public void A_sudden_expansion_loses_what_Borda_and_Carnot_say()
    {
        const double Ratio = 2;
        double loss = (1 - (1 / Ratio)) * (1 - (1 / Ratio));
        DeviceAnswer a = DeviceSolver.Solve(Cases.Exact(
            DeviceKind.Diffuser,
            GasCatalogue.Air,
            [(StationSymbol.Pressure, 1e5), (StationSymbol.Temperature, 293.15), (StationSymbol.Velocity, 10)],
            [(StationSymbol.Velocity, 5)],
            (CaseOption.LossCoefficient, loss)));
        Assert.Equal(2 / Ratio * (1 - (1 / Ratio)), a.Performance.Recovery!.Value, 5e-4);
    }

    [Fact]
    public void Recovery_and_exit_velocity_give_efficiency_and_loss_and_each_leads_back()
    {
        DeviceAnswer a = Diffuser(Inlet, "V=120 ft/s", (CaseOption.Recovery, "0.72"));
        Assert.Equal(0.72, a.Performance.Recovery!.Value, 1e-12);
        foreach ((CaseOption option, double value) in ((CaseOption, double)[])
            [(CaseOption.Efficiency, a.Performance.IsentropicEfficiency!.Value), (CaseOption.LossCoefficient, a.Performance.LossCoefficient!.Value)])
        {
            DeviceCase c = Cases.Diffuser(GasCatalogue.Air, Inlet, "V=120 ft/s");
            c.Options.Set((int)option, value);
            Assert.Equal(a.Exit.State.p, DeviceSolver.Solve(c).Exit.State.p, 1e-5);
        }
    }

    [Fact]
    public void More_loss_never_recovers_more()
    {
        double last = double.PositiveInfinity;
        for (int i = 0; i <= 20; i++)
        {
            DeviceCase c = Cases.Diffuser(GasCatalogue.Air, Inlet, "V=120 ft/s");
            c.Options.Set((int)CaseOption.LossCoefficient, i * 0.05);
            DeviceAnswer a = DeviceSolver.Solve(c);
            Assert.True(a.Performance.Recovery < last);
            Assert.True(a.Performance.EntropyRise >= -1e-9);
            last = a.Performance.Recovery!.Value;
        }
    }

    [Fact]
    public void A_recovery_above_the_ideal_is_impossible_and_says_the_limit()
    {
        DeviceAnswer a = Diffuser(Inlet, "V=120 ft/s", (CaseOption.Recovery, "0.99"));
        Assert.Contains(a.Findings, f => f.Code == "second-law");
        Assert.Contains(a.Findings, f => f.Code == "recovery-above-ideal");
        DeviceAnswer ideal = Diffuser(Inlet, "V=120 ft/s", (CaseOption.Efficiency, "1"));
        Assert.Equal(ideal.Exit.State.p, a.Audit.HighestExitPressure!.Value, 1e-4);
        Assert.False(a.Passes(strict: false));
    }

    [Fact]
    public void A_measured_exit_pressure_and_velocity_imply_the_coefficients()
    {
        DeviceAnswer a = Diffuser(Inlet, "p=14.90 psi, V=120 ft/s");
        Assert.True(a.EfficiencyImplied);
        double rise = a.Exit.State.p - a.Inlet.State.p;
        Assert.Equal(rise / (a.Inlet.Stagnation!.Value.p - a.Inlet.State.p), a.Performance.Recovery!.Value, 1e-12);
    }

    [Fact]
    public void A_diffuser_without_a_loss_is_a_caution()
    {
        DeviceAnswer a = Diffuser(Inlet, "V=120 ft/s");
        Assert.Contains(a.Findings, f => f is { Code: "ideal-assumed", Severity: FlowDuct.Findings.Severity.Caution });
    }

    [Fact]
    public void A_diffuser_inlet_at_rest_is_refused()
    {
        var refusal = Assert.Throws<Errors.FlowDuctException>(() => Diffuser("p=1 bar, T=20 degC", "V=5 m/s"));
        Assert.Equal(Errors.RefusalKind.NotUnderstood, refusal.Refusal.Kind);
    }

    [Fact]
    public void A_section_with_the_flow_picks_the_subsonic_exit()
    {
        DeviceAnswer a = Diffuser("p=1 bar, T=20 degC, V=120 m/s, d=200 mm", "d=300 mm", (CaseOption.Recovery, "0.6"));
        Assert.True(a.Exit.Mach < 1);
        Assert.Equal(2.25, a.Performance.AreaRatio!.Value, 1e-9);
        Assert.Equal(a.Performance.MassFlow!.Value, a.Exit.Flux!.Value * a.Exit.Area!.Value, 1e-9);
    }

    private static DeviceAnswer Diffuser(string inlet, string exit, params (CaseOption, string)[] options) =>
        DeviceSolver.Solve(Cases.Diffuser(GasCatalogue.Air, inlet, exit, options));
}
