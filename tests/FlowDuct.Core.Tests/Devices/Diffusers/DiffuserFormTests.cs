using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Diffusers;

/// <summary>Diffusers by their form: sections, length, angle, estimated loss, stall, supersonic inlets, cavitation.</summary>
public class DiffuserFormTests
{
    private const string Slow = "p=1013 mbar, T=64 degC, V=30 m/s, d=300 mm";

    // Cone: AR = (1 + (N/R1) tan theta)^2; plane: AR = 1 + 2 (N/W1) tan theta. Geometry.
    [Theory]
    [InlineData(Slow, "d=450 mm", 8, 75 / 0.0699268119)]
    [InlineData("p=1013 mbar, T=64 degC, V=30 m/s, rect=200x400 mm", "rect=320x400 mm", 10, 60 / 0.0874886635)]
    public void An_angle_gives_the_length_and_a_length_the_angle(string inlet, string exit, double degrees, double millimetres)
    {
        DeviceAnswer byAngle = Solve(inlet, exit, (CaseOption.IncludedAngle, Text(degrees) + " deg"));
        Assert.Equal(millimetres, byAngle.Performance.Diffuser!.Length!.Value * 1000, 1e-4);
        DeviceAnswer byLength = Solve(inlet, exit, (CaseOption.Length, Text(millimetres) + " mm"));
        Assert.Equal(degrees * Math.PI / 180, byLength.Performance.Diffuser!.IncludedAngle!.Value, 1e-9);
        DeviceAnswer byBoth = Solve(inlet, string.Empty, (CaseOption.Length, Text(millimetres) + " mm"), (CaseOption.IncludedAngle, Text(degrees) + " deg"));
        Assert.Equal(byAngle.Exit.Area!.Value, byBoth.Exit.Area!.Value, 1e-9);
    }

    // pi/4 (0.9^2 - 0.5^2) = 0.4398230; 0.6 x 0.4 = 0.24.
    [Theory]
    [InlineData("annulus=900x500 mm", 0.4398229715)]
    [InlineData("rect=600x400 mm", 0.24)]
    [InlineData("d=300 mm", 0.0706858347)]
    public void Every_shape_has_its_area(string shape, double area)
    {
        DeviceAnswer a = Solve("p=1013 mbar, T=64 degC, V=30 m/s, " + shape, "V=12 m/s");
        Assert.Equal(area, a.Inlet.Area!.Value, 1e-9);
        Assert.Equal(area * 30 * a.Inlet.State.rho, a.Performance.MassFlow!.Value, 1e-6);
    }

    [Fact]
    public void A_diameter_ratio_counts_on_the_inlet()
    {
        Assert.Equal(Solve(Slow, "d=450 mm").Exit.State.p, Solve(Slow, "beta=1.5").Exit.State.p, 1e-6);
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => Solve("p=1013 mbar, T=64 degC, V=30 m/s", "beta=1.5"));
        Assert.Contains("beta", refused.Refusal.Reason, StringComparison.Ordinal);
    }

    // In a slow stream: Cp = 1 - 1/AR^2 - K with the loss of the formula, and Borda and Carnot's 2/AR (1 - 1/AR) for a sudden expansion.
    [Theory]
    [InlineData("gibson")]
    [InlineData("crane")]
    [InlineData("idelchik")]
    public void A_slow_stream_recovers_what_the_equation_leaves(string word)
    {
        DeviceCase c = Cases.Diffuser(WaterFluid.Instance, "p=4 bar, T=20 degC, V=3 m/s, d=100 mm", "d=150 mm", (CaseOption.IncludedAngle, "10 deg")) with { LossWord = word };
        DeviceAnswer a = DeviceSolver.Solve(c);
        double phi = 10 * Math.PI / 180, f = a.Performance.Diffuser!.FrictionFactor!.Value;
        double K = word switch { "gibson" => ConeLosses.Gibson(phi, 2.25), "crane" => ConeLosses.Crane(phi, 2.25), _ => ConeLosses.Idelchik(phi, 2.25, f) };
        Assert.Equal(1 - (1 / (2.25 * 2.25)) - K, a.Performance.Recovery!.Value, 2e-5);
        Assert.Equal(K, a.Performance.LossCoefficient!.Value, 2e-5);
        Assert.True(a.Performance.Diffuser.RecoveryRange!.Value.Least < a.Performance.Recovery && a.Performance.Recovery < a.Performance.Diffuser.RecoveryRange.Value.Greatest);
    }

    [Fact]
    public void A_sudden_expansion_of_a_slow_stream_is_Borda_and_Carnots()
    {
        DeviceCase c = Cases.Diffuser(WaterFluid.Instance, "p=4 bar, T=20 degC, V=3 m/s, d=100 mm", "d=150 mm") with { LossWord = DiffuserLoss.Sudden };
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(2 / 2.25 * (1 - (1 / 2.25)), a.Performance.Recovery!.Value, 2e-5);
        Assert.Equal(a.Performance.Recovery.Value, a.Performance.Diffuser!.SuddenExpansion!.Value, 1e-9);
        Assert.Equal(ConeLosses.BordaCarnot(2.25), a.Performance.LossCoefficient!.Value, 2e-5);
    }

    // Mass, momentum on the whole face, energy; entropy rises; on a gas near sonic and on wet steam alike.
    [Theory]
    [InlineData("air", "p=1 bar, T=300 K, M=0.85, d=100 mm", 1.6)]
    [InlineData("water", "p=2 bar, x=0.95, V=200 m/s, d=100 mm", 3)]
    public void A_sudden_expansion_conserves_mass_momentum_and_energy(string fluid, string inlet, double ratio)
    {
        DeviceCase c = Cases.Diffuser(fluid == "air" ? GasCatalogue.Air : WaterFluid.Instance, inlet, $"beta={Text(Math.Sqrt(ratio))}") with { LossWord = DiffuserLoss.Sudden };
        DeviceAnswer a = DeviceSolver.Solve(c);
        double G1 = a.Inlet.Flux!.Value, G2 = a.Exit.Flux!.Value;
        Assert.Equal(1, G2 * ratio / G1, 1e-10);
        Assert.Equal(a.Inlet.State.p + (G1 * a.Inlet.Velocity!.Value / ratio), a.Exit.State.p + (G2 * a.Exit.Velocity!.Value), 1e-5);
        Assert.Equal(a.Inlet.StagnationEnthalpy!.Value, a.Exit.StagnationEnthalpy!.Value, 1e-5);
        Assert.True(a.Exit.State.s > a.Inlet.State.s);
    }

    // Where the exit velocity is given its section follows, and the estimate with it.
    [Fact]
    public void An_estimate_closes_on_the_section_that_it_gives()
    {
        DeviceCase c = Cases.Diffuser(GasCatalogue.Air, "p=1 bar, T=300 K, V=150 m/s, d=100 mm", "V=60 m/s", (CaseOption.IncludedAngle, "7 deg")) with { LossWord = "idelchik" };
        DeviceAnswer sized = DeviceSolver.Solve(c);
        DeviceCase again = Cases.Diffuser(
            GasCatalogue.Air, "p=1 bar, T=300 K, V=150 m/s, d=100 mm", $"A={Text(sized.Exit.Area!.Value)} m2", (CaseOption.IncludedAngle, "7 deg")) with
        { LossWord = "idelchik" };
        Assert.Equal(60, DeviceSolver.Solve(again).Exit.Velocity!.Value, 1e-6);
    }

    [Theory]
    [InlineData("d=450 mm", "8 deg", null)]
    [InlineData("d=450 mm", "11 deg", "stall-risk")]
    [InlineData("d=450 mm", "20 deg", "stalled")]
    public void An_opening_cone_is_held_against_the_limits_of_practice(string exit, string angle, string? code)
    {
        DeviceAnswer a = Solve(Slow, exit, (CaseOption.IncludedAngle, angle));
        Assert.Equal(code, a.Findings.FirstOrDefault(f => f.Code.StartsWith("stall", StringComparison.Ordinal))?.Code);
        Assert.Equal(Math.Sign(12 - double.Parse(angle[..^4], CultureInfo.InvariantCulture)), Math.Sign(a.Performance.Diffuser!.StallMargin!.Value));
    }

    // More of the kinetic energy at the inlet than its mean velocity says raises what could be recovered.
    [Fact]
    public void A_profile_at_the_inlet_explains_a_recovery_above_the_ideal_of_a_uniform_one()
    {
        DeviceCase c = Cases.Diffuser(GasCatalogue.Air, "p=1013 mbar, T=64 degC, V=47 m/s", "V=24 m/s", (CaseOption.Recovery, "0.76"));
        Assert.Equal(Verdict.Broken, DeviceSolver.Solve(c).Audit.Entropy);
        c.Options.Set((int)CaseOption.KineticEnergyCoefficient, 1.1);
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(Verdict.Holds, a.Audit.Entropy);
        Assert.Equal(1.1 * 47 * 47 / 2, a.Ledger!.InletKinetic, 1e-9);
        Assert.Equal(a.Inlet.State.h + (1.1 * 47 * 47 / 2), a.Exit.State.h + (24 * 24 / 2), 1e-6);
    }

    // In a gas of constant heat capacity: eta_p = (R/cp) ln(p02/p1)/ln(T02/T1).
    [Fact]
    public void The_polytropic_efficiency_is_that_of_the_closed_form()
    {
        var gas = new PerfectGas(1.4, 287);
        DeviceAnswer a = DeviceSolver.Solve(Cases.Diffuser(gas, "p=1 bar, T=300 K, M=0.7", "M=0.2", (CaseOption.Efficiency, "0.85")));
        FluidState first = a.Inlet.State, last = a.Exit.Stagnation!.Value;
        Assert.Equal(0.4 / 1.4 * Math.Log(last.p / first.p) / Math.Log(last.T / first.T), a.Performance.PolytropicEfficiency!.Value, 1e-9);
        Assert.InRange(a.Performance.PolytropicEfficiency.Value, 0.85, 0.87);
    }

    // NACA Report 1135 (1953) for the shock, Kantrowitz and Donaldson, NACA ACR L5D20 (1945), for the contraction; perfect gas, 1.4.
    [Fact]
    public void A_supersonic_inlet_has_the_limits_and_the_recovery_of_the_tables()
    {
        int rows = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/attachment_and_starting_g14.csv"))
        {
            double M = double.Parse(row["M"], CultureInfo.InvariantCulture);
            DeviceAnswer a = DeviceSolver.Solve(Cases.Diffuser(new PerfectGas(1.4, 287), $"p=1 bar, T=300 K, M={Text(M)}", "M=0.3"));
            Assert.Equal("supersonic-shock-at-inlet", a.Performance.Regime);
            DiffuserFigures figures = a.Performance.Diffuser!;
            Assert.True(Printed.Parse(row["self_starting_throat_to_capture_area"]).Agrees(figures.Starting!.Value.SelfStarting, 1e-10));
            Assert.True(Printed.Parse(row["isentropic_throat_to_capture_area"]).Agrees(figures.Starting.Value.Isentropic, 1e-10));
            Assert.True(Printed.Parse(row["normal_shock_recovery"]).Agrees(a.Performance.ShockStagnationPressureRatio!.Value, 1e-10));
            Assert.Equal(a.Performance.StagnationPressureRatio!.Value, a.Performance.ShockStagnationPressureRatio!.Value, 1e-9);
            Assert.Equal(a.Performance.ShockStagnationPressureRatio.Value * a.Inlet.Stagnation!.Value.p, figures.PitotPressure!.Value, 1e-3);
            rows++;
        }

        Assert.Equal(9, rows);
    }

    [Fact]
    public void A_started_throat_loses_less_than_the_inlet_plane_and_too_narrow_a_one_does_not_start()
    {
        DeviceAnswer atInlet = Supersonic(string.Empty), inThroat = Supersonic("d=280 mm");
        Assert.True(inThroat.Performance.StagnationPressureRatio > atInlet.Performance.StagnationPressureRatio);
        Assert.Equal(1, inThroat.Throat!.Flux!.Value * inThroat.Throat.Area!.Value / inThroat.Performance.MassFlow!.Value, 1e-9);
        Assert.Equal(1, inThroat.Exit.Flux!.Value * inThroat.Exit.Area!.Value / inThroat.Performance.MassFlow.Value, 1e-9);
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => Supersonic("d=260 mm"));
        Assert.Equal(RefusalKind.NoAnswer, refused.Refusal.Kind);
        Assert.Contains("Kantrowitz", refused.Refusal.Reason, StringComparison.Ordinal);
    }

    // Wet steam, faster than its equilibrium sound: the same balances.
    [Fact]
    public void A_shock_in_wet_steam_stands_at_the_inlet_too()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Diffuser(WaterFluid.Instance, "p=0.5 bar, x=0.93, V=800 m/s, d=100 mm", "V=80 m/s", (CaseOption.Efficiency, "0.8")));
        Assert.Equal("supersonic-shock-at-inlet", a.Performance.Regime);
        Assert.True(a.Exit.State.s > a.Inlet.State.s);
        Assert.InRange(a.Performance.ShockStagnationPressureRatio!.Value, 0.3, 0.95);
    }

    [Fact]
    public void A_liquid_has_its_margin_to_the_vapour_pressure()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Diffuser(WaterFluid.Instance, "p=0.30 bar, T=60 degC, V=6 m/s", "V=2 m/s", (CaseOption.LossCoefficient, "0.2")));
        Assert.True(WaterFluid.Instance.TrySaturationPressure(333.15, out double vapour));
        Assert.Equal(0.30e5 - vapour, a.Performance.Diffuser!.CavitationMargin!.Value, 1e-3);
        Assert.Equal((0.30e5 - vapour) / (a.Inlet.State.rho * 18), a.Performance.Diffuser.CavitationNumber!.Value, 1e-6);
    }

    // More loss never gives more recovery, and every definition given back gives the same exit.
    [Fact]
    public void Every_definition_reproduces_the_same_diffuser_and_more_loss_recovers_less()
    {
        double before = double.PositiveInfinity;
        foreach (string loss in (string[])["0", "0.05", "0.1", "0.2", "0.3"])
        {
            DeviceAnswer a = Solve(Slow, "d=450 mm", (CaseOption.LossCoefficient, loss));
            double recovery = a.Performance.Recovery!.Value;
            Assert.True(recovery < before);
            before = recovery;
            Assert.Equal(a.Exit.State.p, Solve(Slow, "d=450 mm", (CaseOption.Recovery, Text(recovery))).Exit.State.p, 1e-3);
            Assert.Equal(a.Exit.State.p, Solve(Slow, "d=450 mm", (CaseOption.Efficiency, Text(a.Performance.IsentropicEfficiency!.Value))).Exit.State.p, 1e-3);
        }
    }

    [Theory]
    [InlineData(Slow, "d=450 mm", "best-planar", "planar diffusers")]
    [InlineData("p=1013 mbar, T=64 degC, V=30 m/s, rect=200x400 mm", "rect=320x400 mm", "gibson", "estimate of cones")]
    [InlineData(Slow, "V=12 m/s", "sudden-expansion", "needs the form")]
    public void An_estimate_without_its_form_is_refused(string inlet, string exit, string word, string reason)
    {
        DeviceCase c = Cases.Diffuser(GasCatalogue.Air, inlet, exit, (CaseOption.IncludedAngle, "8 deg")) with { LossWord = word };
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => DeviceSolver.Solve(c));
        Assert.Contains(reason, refused.Refusal.Reason, StringComparison.Ordinal);
    }

    private static DeviceAnswer Supersonic(string throat)
    {
        DeviceCase c = Cases.Diffuser(GasCatalogue.Air, "p=0.3 bar, T=250 K, M=2, d=300 mm", "d=450 mm", (CaseOption.Efficiency, "0.9"));
        if (throat.Length > 0) c.Throat.Set((int)StationSymbol.Diameter, double.Parse(throat[2..^3], CultureInfo.InvariantCulture) / 1000);
        return DeviceSolver.Solve(c);
    }

    private static DeviceAnswer Solve(string inlet, string exit, params (CaseOption Option, string Value)[] options) =>
        DeviceSolver.Solve(Cases.Diffuser(GasCatalogue.Air, inlet, exit, options));

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
