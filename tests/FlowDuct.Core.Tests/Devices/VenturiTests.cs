using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>A nozzle followed by a diffuser as one device.</summary>
public class VenturiTests
{
    private const string Pipe = "p=6 bar, T=40 degC, d=100 mm";

    // Bernoulli between pipe and throat, and back up less K rho Vt^2/2: cold water in a throat of half the bore.
    [Fact]
    public void Cold_water_follows_Bernoulli_and_loses_its_loss_coefficient()
    {
        DeviceAnswer a = Solve(WaterFluid.Instance, Pipe, "d=50 mm", "d=100 mm", string.Empty, (CaseOption.Flow, "25 kg/s"), (CaseOption.LossCoefficient, "0.15"));
        double rho = a.Inlet.State.rho, V1 = 25 / (rho * Math.PI * 0.0025), head = rho * V1 * V1 / 2;
        Assert.Equal(15 * head, a.Performance.Venturi!.ThroatDrop, 1e-3 * head);
        Assert.Equal(0.15 * 16 * head, a.Performance.Venturi.PermanentLoss, 1e-2 * head);
        Assert.Equal(0.15 * 16 / 15, a.Performance.Venturi.LossOverDrop!.Value, 1e-3);
        Assert.Equal(0.15, a.Performance.LossCoefficient!.Value, 1e-4);
    }

    // The same flow from each of the three readings.
    [Theory]
    [InlineData("d=60 mm, dp=25 kPa", "")]
    [InlineData("d=60 mm, p=5.75 bar", "")]
    public void Flow_throat_and_back_pressure_are_one_device(string throat, string back)
    {
        (CaseOption, string)[] loss = [(CaseOption.LossCoefficient, "0.1"), (CaseOption.DischargeCoefficient, "0.985")];
        DeviceAnswer read = Solve(GasCatalogue.Air, Pipe, throat, "d=100 mm", back, loss);
        DeviceAnswer byFlow = Set(Case(GasCatalogue.Air, Pipe, "d=60 mm", "d=100 mm", string.Empty, loss), c => c.Options.Set((int)CaseOption.Flow, read.Performance.MassFlow!.Value));
        DeviceAnswer byBack = Set(Case(GasCatalogue.Air, Pipe, "d=60 mm", "d=100 mm", string.Empty, loss), c => c.Back.Set((int)StationSymbol.Pressure, read.Exit.State.p));
        Assert.Equal(5.75e5, byFlow.Throat!.State.p, 0.5);
        Assert.Equal(5.75e5, byBack.Throat!.State.p, 0.5);
        Assert.Equal(1, byBack.Performance.MassFlow!.Value / read.Performance.MassFlow!.Value, 1e-7);
        Assert.Equal(0.985, read.Performance.DischargeCoefficient!.Value, 1e-9);
    }

    [Theory]
    [InlineData("d=60 mm, dp=25 kPa", "", "subsonic")]
    [InlineData("d=30 mm", "p=4 bar", "shock-in-divergence")]
    [InlineData("d=30 mm", "p=5.9 bar", "subsonic")]
    public void Mass_and_energy_are_conserved_and_entropy_rises(string throat, string back, string regime)
    {
        DeviceAnswer a = Solve(GasCatalogue.Air, Pipe, throat, "d=100 mm", back, (CaseOption.LossCoefficient, "0.1"));
        Assert.Equal(regime, a.Performance.Regime);
        foreach (StationAnswer at in (StationAnswer[])[a.Inlet, a.Throat!, a.Exit])
        {
            Assert.Equal(1, at.Flux!.Value * at.Area!.Value / a.Performance.MassFlow!.Value, 1e-8);
            Assert.Equal(a.Inlet.StagnationEnthalpy!.Value, at.StagnationEnthalpy!.Value, 1e-4);
        }

        Assert.True(a.Exit.State.s > a.Throat!.State.s);
        Assert.Equal(Verdict.Holds, a.Audit.Mass);
    }

    // At the pressure ratio of choking the throat has just its greatest flow, which no lower one raises; without loss that ratio is the subsonic
    // root of A/A* = (100/30)^2 of NACA Report 1135 (1953), p/p0 = 0.9981 at k = 1.4 (M = 0.05: A/A* 11.5914, p/p0 0.9983).
    [Fact]
    public void Recovery_lets_a_throat_choke_at_a_small_pressure_drop()
    {
        DeviceAnswer ideal = Solve(new PerfectGas(1.4, 287), Pipe, "d=30 mm", "d=100 mm", "p=5.99 bar", (CaseOption.LossCoefficient, "0"));
        Assert.Equal(0.9981, ideal.Performance.Venturi!.ChokingRatio!.Value, 1e-4);
        DeviceAnswer lossy = Solve(GasCatalogue.Air, Pipe, "d=30 mm", "d=100 mm", "p=4 bar", (CaseOption.LossCoefficient, "0.1"));
        double ratio = lossy.Performance.Venturi!.ChokingRatio!.Value, p0 = lossy.Inlet.Stagnation!.Value.p;
        Assert.InRange(ratio, 0.9, 0.97);
        DeviceAnswer above = Set(Case(GasCatalogue.Air, Pipe, "d=30 mm", "d=100 mm", string.Empty, (CaseOption.LossCoefficient, "0.1")), c => c.Back.Set((int)StationSymbol.Pressure, ratio * p0 * 1.003));
        Assert.True(above.Performance.MassFlow < lossy.Performance.MassFlow);
        Assert.False(above.Performance.Choked);
        Assert.True(lossy.Performance.Choked);
    }

    [Fact]
    public void A_named_coefficient_and_an_estimated_recovery_work_together()
    {
        DeviceCase c = Case(GasCatalogue.Air, Pipe, "d=60 mm, dp=25 kPa", "d=100 mm", string.Empty, (CaseOption.IncludedAngle, "8 deg")) with
        {
            DischargeCorrelation = DischargeCorrelation.Find("iso5167-venturi-cast"),
            LossWord = "idelchik",
        };
        DeviceAnswer a = DeviceSolver.Solve(c);
        Assert.Equal(0.984, a.Performance.DischargeCoefficient!.Value, 1e-9);
        Assert.InRange(a.Performance.Recovery!.Value, 0.75, 0.85);
        Assert.InRange(a.Performance.Venturi!.LossOverDrop!.Value, 0.03, 0.2);
        Assert.Equal(0.02 / Math.Tan(4 * Math.PI / 180), a.Performance.Diffuser!.Length!.Value, 1e-9);
    }

    [Theory]
    [InlineData("p=6 bar, T=40 degC", "d=60 mm, dp=25 kPa", "d=100 mm", "", "has a section at its inlet")]
    [InlineData(Pipe, "d=60 mm", "d=100 mm", "", "nothing says how much flows")]
    [InlineData(Pipe, "d=60 mm, dp=25 kPa", "d=100 mm", "p=5 bar", "more than once")]
    [InlineData(Pipe, "d=30 mm", "d=100 mm", "p=6.5 bar", "leaves no flow")]
    [InlineData(Pipe, "d=60 mm, dp=25 kPa", "d=100 mm, V=20 m/s", "", "V behind the inlet follows")]
    [InlineData(Pipe, "d=60 mm, T=30 degC", "d=100 mm", "p=5 bar", "T behind the inlet follows")]
    public void What_does_not_say_one_flow_is_refused(string inlet, string throat, string exit, string back, string reason)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => Solve(GasCatalogue.Air, inlet, throat, exit, back, (CaseOption.LossCoefficient, "0.1")));
        Assert.Contains(reason, refused.Refusal.Reason, StringComparison.Ordinal);
    }

    private static DeviceCase Case(Fluid fluid, string inlet, string throat, string exit, string back, params (CaseOption Option, string Value)[] options) =>
        Cases.Rated(fluid, inlet, throat, exit, back, options) with { Device = DeviceKind.Venturi };

    private static DeviceAnswer Solve(Fluid fluid, string inlet, string throat, string exit, string back, params (CaseOption Option, string Value)[] options) =>
        DeviceSolver.Solve(Case(fluid, inlet, throat, exit, back, options));

    private static DeviceAnswer Set(DeviceCase c, Action<DeviceCase> set)
    {
        set(c);
        return DeviceSolver.Solve(c);
    }
}
