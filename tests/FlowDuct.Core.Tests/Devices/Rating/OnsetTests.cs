using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Rating;

/// <summary>Held phases that give way at an onset and return to equilibrium.</summary>
public class OnsetTests
{
    private static readonly WaterFluid s_water = WaterFluid.Instance;

    // The return is at constant pressure and enthalpy, so at constant velocity, and makes entropy.
    [Theory]
    [InlineData(0.02, double.PositiveInfinity)]
    [InlineData(0.035, double.PositiveInfinity)]
    [InlineData(double.PositiveInfinity, 12)]
    public void Behind_the_onset_an_isentrope_goes_on_in_equilibrium(double fraction, double difference)
    {
        var held = new SupersaturatedWater(new Onset(fraction, difference));
        Assert.Equal(Outcome.Ok, s_water.FromPX(6e5, 1, out FluidState dry));
        Assert.True(held.TrySaturationOnIsentrope(dry.s, out FluidState edge));
        Assert.Equal(Notices.Metastable, edge.Notices & Notices.Metastable);
        Assert.Equal(dry.s, edge.s, 1e-9);
        Assert.Equal(Outcome.Ok, held.FromPS(edge.p * (1 - 1e-9), dry.s, default, out FluidState behind));
        Assert.Equal(Phase.Wet, behind.Phase);
        Assert.Equal(edge.h, behind.h, 1e-2);
        Assert.True(behind.s > edge.s);
        Assert.Equal(Outcome.Ok, held.FromPS(edge.p * 0.5, dry.s, default, out FluidState far));
        Assert.Equal(behind.s, far.s, 1e-6);
        if (double.IsFinite(fraction)) Assert.Equal(fraction, 1 - behind.x, 1e-7);
        else Assert.True(s_water.TrySaturationTemperature(edge.p, out double T) && Math.Abs(T - edge.T - difference) < 1e-6);
    }

    // Wilson points of nozzles at low pressure, 3 to 4 % equilibrium moisture at 30 to 45 K of undercooling: Yellott and Holland (1937),
    // Gyarmathy (1962), from memory. The metastable equation has to join the two figures.
    [Theory]
    [InlineData("p0=0.5 bar, x=1")]
    [InlineData("p0=1 bar, superheat=10 K")]
    [InlineData("p0=2.5 bar, superheat=40 K")]
    public void Three_and_a_half_per_cent_are_thirty_to_forty_five_kelvins(string inlet)
    {
        DeviceAnswer a = Supersaturated(inlet, "A=100 mm2", "A=400 mm2", "p=0.01 bar", (CaseOption.Onset, "3.5%"));
        Assert.Equal(0.035, a.Performance.Metastable!.Value.RevertedMoisture!.Value, 1e-6);
        Assert.InRange(a.Performance.Metastable.Value.Undercooling, 30, 45);
        Assert.InRange(a.Performance.Metastable.Value.SupersaturationRatio!.Value, 2.5, 8);
    }

    [Fact]
    public void The_same_onset_may_be_named_by_its_undercooling()
    {
        DeviceAnswer byMoisture = Supersaturated("p0=9 bar, superheat=10 K", "d=18 mm", "d=30 mm", "p=0.4 bar", (CaseOption.Onset, "3.5%"));
        double difference = byMoisture.Performance.Metastable!.Value.Undercooling;
        DeviceCase c = Cases.Rated(s_water, "p0=9 bar, superheat=10 K", "d=18 mm", "d=30 mm", "p=0.4 bar") with { Expansion = ExpansionModel.Supersaturated, OnsetIsDifference = true };
        c.Options.Set((int)CaseOption.Onset, difference);
        DeviceAnswer byDifference = DeviceSolver.Solve(c);
        Assert.Equal(byMoisture.Performance.Metastable.Value.OnsetPressure!.Value, byDifference.Performance.Metastable!.Value.OnsetPressure!.Value, 1);
        Assert.Equal(byMoisture.Exit.State.p, byDifference.Exit.State.p, 1);
    }

    // An onset at once is equilibrium.
    [Theory]
    [InlineData("supersaturated", "p0=9 bar, x=1")]
    [InlineData("single-phase", "p=8.5 bar, T=138 degC")]
    public void Giving_way_at_once_is_equilibrium(string model, string inlet)
    {
        DeviceCase c = Cases.Rated(s_water, inlet, "d=18 mm", "", "p=1 bar");
        double equilibrium = DeviceSolver.Solve(c).Performance.MassFlow!.Value;
        c.Options.Set((int)CaseOption.Onset, 1e-6);
        DeviceAnswer a = DeviceSolver.Solve(c with { Expansion = Model(model) });
        Assert.Equal(1, a.Performance.MassFlow!.Value / equilibrium, 1e-5);
    }

    [Theory]
    [InlineData("p=0.4 bar", "1")]
    [InlineData("p=0.4 bar", "0.95")]
    [InlineData("p=4 bar", "1")]
    [InlineData("p=7.5 bar", "0.9")]
    public void The_exit_behind_the_onset_carries_the_flow_of_the_throat(string back, string efficiency)
    {
        DeviceAnswer a = Supersaturated("p0=9 bar, superheat=10 K", "d=18 mm", "d=30 mm", back, (CaseOption.Onset, "3.5%"), (CaseOption.Efficiency, efficiency));
        MetastableAnswer held = a.Performance.Metastable!.Value;
        Assert.Equal(1, a.Exit.Flux!.Value * a.Exit.Area!.Value / a.Performance.MassFlow!.Value, 1e-10);
        Assert.Equal(a.Inlet.StagnationEnthalpy!.Value, a.Exit.StagnationEnthalpy!.Value, 1e-3);
        Assert.True(a.Exit.State.s > a.Inlet.State.s);
        Assert.InRange(held.OnsetAreaRatio!.Value, 1, a.Performance.ThroatAreaRatio!.Value);
        Assert.InRange(held.FluxChange!.Value, 0.85, 0.99);
    }

    // A phase that gives way before the throat chokes makes the throat its place: to either side of it the flux is smaller.
    [Theory]
    [InlineData("supersaturated", "p0=60 bar, superheat=1 K", "5%", "1")]
    [InlineData("single-phase", "p=8.5 bar, T=138 degC", "3%", "1")]
    [InlineData("single-phase", "p=8.5 bar, T=138 degC", "3%", "0.9")]
    public void A_throat_at_the_onset_passes_the_most_and_says_at_least(string model, string inlet, string onset, string efficiency)
    {
        DeviceCase c = Cases.Rated(s_water, inlet, "d=18 mm", "", "p=1 bar", (CaseOption.Onset, onset), (CaseOption.Efficiency, efficiency)) with { Expansion = Model(model) };
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal("choked", a.Performance.Regime);
        Assert.True(a.Performance.Metastable!.Value.FlowIsLeast);
        Assert.Contains(a.Findings, f => f.Code == "model-doubtful" && f.Message(DisplayText.Metric).Contains("at least", StringComparison.Ordinal));
        FluidState rest = a.Inlet.Stagnation!.Value;
        var path = new LossPath(a.ExpandingFluid, rest.h, rest.h, rest.s, double.Parse(efficiency, System.Globalization.CultureInfo.InvariantCulture));
        foreach (double p in (double[])[a.Exit.State.p * 1.001, a.Exit.State.p * 0.999, a.Exit.State.p * 0.9, a.Exit.State.p * 0.6])
        {
            Assert.Equal(Outcome.Ok, path.At(p, default, out FluidState near, out double V));
            Assert.True(V / near.v < a.Exit.Flux, $"at {p}");
        }
    }

    // Across the whole range of back pressures nothing jumps where regimes meet, and nothing fails.
    [Theory]
    [InlineData("3.5%")]
    [InlineData("5%")]
    public void Every_back_pressure_has_an_answer_and_the_flow_never_rises_with_it(string onset)
    {
        double before = double.PositiveInfinity;
        for (double back = 0.05e5; back < 9e5; back += 0.0931e5)
        {
            DeviceCase c = Cases.Rated(s_water, "p0=9 bar, superheat=10 K", "d=18 mm", "d=30 mm", "", (CaseOption.Onset, onset)) with { Expansion = ExpansionModel.Supersaturated };
            c.Back.Set((int)StationSymbol.Pressure, back);
            double flow = DeviceSolver.Solve(c).Performance.MassFlow!.Value;
            Assert.True(flow <= before * (1 + 1e-12), $"at {back}");
            before = flow;
        }
    }

    // An exit whose section fits neither side of the step has no state, and is refused rather than guessed.
    [Fact]
    public void An_exit_inside_the_return_is_refused()
    {
        DeviceAnswer wide = Supersaturated("p0=9 bar, superheat=10 K", "A=100 mm2", "A=300 mm2", "p=0.4 bar", (CaseOption.Onset, "3.5%"));
        MetastableAnswer held = wide.Performance.Metastable!.Value;
        double inside = 100 * held.OnsetAreaRatio!.Value * (1 + (0.5 * ((1 / held.FluxChange!.Value) - 1)));
        string exit = "A=" + inside.ToString("R", System.Globalization.CultureInfo.InvariantCulture) + " mm2";
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => Supersaturated("p0=9 bar, superheat=10 K", "A=100 mm2", exit, "p=0.4 bar", (CaseOption.Onset, "3.5%")));
        Assert.Equal(RefusalKind.NoAnswer, refused.Refusal.Kind);
    }

    private static ExpansionModel Model(string word) => word == "single-phase" ? ExpansionModel.SinglePhase : ExpansionModel.Supersaturated;

    private static DeviceAnswer Supersaturated(string inlet, string throat, string exit, string back, params (CaseOption Option, string Value)[] options) =>
        DeviceSolver.Solve(Cases.Rated(s_water, inlet, throat, exit, back, options) with { Expansion = ExpansionModel.Supersaturated });
}
