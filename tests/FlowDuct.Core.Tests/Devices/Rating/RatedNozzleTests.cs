using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Rating;

/// <summary>Whole answers of nozzles that are given by sections and back pressure.</summary>
public class RatedNozzleTests
{
    private static readonly Fluid s_water = WaterFluid.Instance;
    private static readonly IdealGas s_air = GasCatalogue.Air;
    private static readonly PerfectGas s_gas = new(1.4, 287);

    // NACA Report 1135 (1953): at M = 1 the flux of a gas of gamma 1.4 is 0.6847 p0 / sqrt(R T0).
    [Fact]
    public void A_choked_convergent_nozzle_passes_the_flow_of_the_tables()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(s_gas, "p0=10 bar, T0=300 K", "A=100 mm2", "", "p=1 bar"));
        Assert.Equal("choked", a.Performance.Regime);
        Assert.Equal(0.6847 * 1e6 * 1e-4 / Math.Sqrt(287 * 300), a.Performance.MassFlow!.Value, 2e-5);
        Assert.Equal(0.5283, a.Exit.State.p / 1e6, 5e-5);
        Assert.Equal(1, a.Performance.DischargeCoefficient!.Value, 1e-12);
    }

    // Dry saturated steam, homogeneous equilibrium, by an independent solver: flux and pressure ratio at choking.
    [Fact]
    public void Saturated_steam_chokes_as_an_independent_solver_finds()
    {
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/steam_saturated_choking.csv"))
        {
            string p0 = row["p0_psia"];
            DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(s_water, $"p0={p0} psi, x=1", "A=1 in2", "", "p=1 psi"));
            double flow = a.Performance.MassFlow!.Value / 0.45359237 * 3600;
            Assert.Equal(1, flow / double.Parse(row["W_equilibrium_lb_per_h_in2"], CultureInfo.InvariantCulture), 2e-5);
            Assert.Equal(double.Parse(row["p_star_over_p0"], CultureInfo.InvariantCulture), a.Performance.CriticalPressureRatio!.Value, 6e-5);
        }
    }

    // Common practice: dry saturated steam passes 2 to 5 % more than at equilibrium, because condensation is late.
    [Theory]
    [InlineData("p0=3 bar, x=1")]
    [InlineData("p0=9 bar, x=1")]
    [InlineData("p0=20 bar, x=1")]
    public void Supersaturated_steam_passes_two_to_five_per_cent_more(string inlet)
    {
        DeviceCase c = Cases.Rated(s_water, inlet, "d=30 mm", "", "p=1 bar");
        double wet = DeviceSolver.Solve(c).Performance.MassFlow!.Value;
        DeviceAnswer dry = DeviceSolver.Solve(c with { Expansion = ExpansionModel.Supersaturated });
        Assert.InRange(dry.Performance.MassFlow!.Value / wet, 1.02, 1.055);
        Assert.Equal(wet, dry.Performance.Metastable!.Value.EquilibriumFlow!.Value, 1e-12);
        Assert.InRange(dry.Performance.Metastable.Value.Undercooling, 10, 50);
        Assert.InRange(dry.Performance.Metastable.Value.RevertedMoisture!.Value, 0.01, 0.05);
        Assert.Contains(dry.Findings, f => f.Code == "model-doubtful");
    }

    // A liquid that does not flash obeys Bernoulli's equation; water at 170 degC is compressible by less than a thousandth.
    [Fact]
    public void Unflashed_water_leaves_by_bernoulli()
    {
        DeviceCase c = Cases.Rated(s_water, "p=10 bar, T=170 degC", "d=10 mm", "", "p=2 bar") with { Expansion = ExpansionModel.SinglePhase };
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(1, a.Exit.Velocity!.Value / Math.Sqrt(2 * 8e5 / a.Inlet.State.rho), 1e-3);
        Assert.True(a.Performance.MassFlow > 1.9 * a.Performance.Metastable!.Value.EquilibriumFlow);
        Assert.InRange(a.Performance.Metastable.Value.Undercooling, -60, -40);
    }

    [Fact]
    public void A_flow_above_equilibrium_is_explained_up_to_the_frozen_bound()
    {
        DeviceAnswer some = DeviceSolver.Solve(Cases.Rated(s_water, "p=9.000 bar, x=1", "d=30.00 mm", "", "p=1 bar", (CaseOption.Flow, "0.9500 kg/s")));
        Assert.Contains(some.Findings, f => f.Code == "above-equilibrium-flow");
        Assert.Equal(Verdict.Holds, some.Audit.Mass);
        DeviceAnswer much = DeviceSolver.Solve(Cases.Rated(s_water, "p=9.000 bar, x=1", "d=30.00 mm", "", "p=1 bar", (CaseOption.Flow, "1.1000 kg/s")));
        Assert.Equal(Verdict.Broken, much.Audit.Mass);
        Assert.Contains(much.Findings, f => f is { Code: "mass-mismatch", Severity: Severity.Error });
    }

    [Fact]
    public void A_flow_implies_the_discharge_coefficient()
    {
        double whole = DeviceSolver.Solve(Cases.Rated(s_air, "p0=8 bar, T0=313 K", "d=18 mm", "", "p=1 bar")).Performance.MassFlow!.Value;
        DeviceCase c = Cases.Rated(s_air, "p0=8 bar, T0=313 K", "d=18 mm", "", "p=1 bar");
        c.Options.Set((int)CaseOption.Flow, 0.97 * whole);
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(0.97, a.Performance.DischargeCoefficient!.Value, 1e-9);
        Assert.Equal(0.97 * whole, a.Performance.MassFlow!.Value, 1e-9);
    }

    // Rate what was sized: sections from a duty give the duty back.
    [Theory]
    [InlineData("p=9 bar, T=230 degC", "p=3.2 bar")]
    [InlineData("p=9 bar, T=230 degC", "p=6 bar")]
    [InlineData("p0=12 bar, x=0.97", "p=2 bar")]
    public void What_was_sized_is_rated_the_same(string inlet, string exit)
    {
        DeviceAnswer sized = DeviceSolver.Solve(Cases.Nozzle(s_water, inlet, exit, (CaseOption.Flow, "1.4 kg/s")));
        DeviceCase c = Cases.Rated(s_water, inlet, "", "", exit);
        if (sized.Throat is StationAnswer throat) c.Throat.Set((int)StationSymbol.Area, throat.Area!.Value);
        c.Exit.Set((int)StationSymbol.Area, sized.Exit.Area!.Value);
        DeviceAnswer rated = DeviceSolver.Solve(c);
        Assert.Equal(1, rated.Performance.MassFlow!.Value / 1.4, 1e-9);
        Assert.Equal(1, rated.Exit.Velocity!.Value / sized.Exit.Velocity!.Value, 1e-6);
        Assert.Equal(sized.Performance.Regime, rated.Performance.Regime);
    }

    // Mass through the inlet section is the mass through the throat, whichever pair of readings fixes the inlet.
    [Theory]
    [InlineData("p=9 bar, T=230 degC, d=50 mm")]
    [InlineData("p0=9 bar, T0=230 degC, d=50 mm")]
    [InlineData("p=9 bar, T0=230 degC, d=50 mm")]
    [InlineData("p=9 bar, x=0.98, d=50 mm")]
    public void An_inlet_section_finds_its_velocity_with_the_throat(string inlet)
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(s_water, inlet, "d=30 mm", "", "p=2 bar"));
        StationAnswer at = a.Inlet;
        Assert.Equal(1, at.Velocity!.Value / at.State.v * at.Area!.Value / a.Performance.MassFlow!.Value, 1e-9);
        Assert.InRange(at.Velocity.Value, 50, 200);
    }

    // Length of a cone: half the growth of the bore over the tangent of half the included angle.
    [Fact]
    public void Angles_give_lengths()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(
            s_air, "p0=8 bar, T0=313 K, d=60 mm", "d=18 mm", "d=25 mm", "p=1 bar", (CaseOption.ConvergentAngle, "40 deg"), (CaseOption.DivergentAngle, "10 deg")));
        Assert.Equal(0.0035 / Math.Tan(Math.PI / 36), a.Performance.DivergentLength!.Value, 1e-12);
        Assert.Equal(0.021 / Math.Tan(Math.PI / 9), a.Performance.ConvergentLength!.Value, 1e-12);
    }

    [Theory]
    [InlineData("p=1 bar", "overexpanded", "overexpanded-separation")]
    [InlineData("p=0.2 bar", "underexpanded", "underexpanded")]
    [InlineData("p=5 bar", "shock-in-divergence", "shock")]
    [InlineData("p=7.9 bar", "subsonic", null)]
    [InlineData("p=7.4 bar", "shock-in-divergence", "choked")]
    public void A_back_pressure_names_its_regime_and_its_finding(string back, string regime, string? code)
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(s_air, "p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm", back));
        Assert.Equal(regime, a.Performance.Regime);
        if (code is not null) Assert.Contains(a.Findings, f => f.Code == code);
        else Assert.DoesNotContain(a.Findings, f => f.Code is "choked" or "shock");
    }

    // Thrust is momentum plus pressure on the exit, against the space beyond.
    [Fact]
    public void Thrust_is_held_against_the_back_pressure()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(s_air, "p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm", "p=0.3 bar"));
        double expected = (a.Performance.MassFlow!.Value * a.Exit.Velocity!.Value) + ((a.Exit.State.p - 0.3e5) * a.Exit.Area!.Value);
        Assert.Equal(expected, a.Performance.Thrust!.Value, 1e-9);
    }

    [Theory]
    [InlineData("p0=8 bar, T0=313 K", "d=25 mm", "d=18 mm", "p=1 bar", "--exit")]
    [InlineData("p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm", "p=9 bar", "--back")]
    [InlineData("p0=8 bar, T0=313 K", "d=18 mm", "", "", "--back")]
    [InlineData("p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm, T=250 K", "p=1 bar", "--exit")]
    [InlineData("p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm, p=2 bar", "p=1 bar", "--exit")]
    [InlineData("p0=8 bar, T0=313 K, d=10 mm", "d=18 mm", "", "p=1 bar", "--inlet")]
    [InlineData("p=8 bar, T=313 K, V=600 m/s", "d=18 mm", "", "p=1 bar", "--inlet")]
    public void What_does_not_fit_is_refused_at_its_place(string inlet, string throat, string exit, string back, string place)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => DeviceSolver.Solve(Cases.Rated(s_air, inlet, throat, exit, back)));
        Assert.Equal(place, refused.Refusal.Place);
    }
}
