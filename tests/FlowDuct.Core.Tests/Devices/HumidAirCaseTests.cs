using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Humid air through devices: the humidity holds at the static state of the inlet, whatever leads to that.</summary>
public class HumidAirCaseTests
{
    private static readonly Fluid HumidAir = FluidCatalogue.Find("humid-air")!;

    [Theory]
    [InlineData("p=3 bar, T=60 degC, humidity=40%", "p=2.5 bar")]
    [InlineData("p0=3 bar, T0=60 degC, V=220 m/s, humidity=40%", "p=2 bar")]
    [InlineData("p0=1.2 bar, T0=95 degC, M=0.6, humidity=40%", "p=0.8 bar")]
    [InlineData("p=3 bar, T0=60 degC, V=150 m/s, humidity=40%", "p=2 bar")]
    [InlineData("p=1 bar, p0=1.2 bar, T0=330 K, humidity=40%", "p=0.9 bar")]
    [InlineData("p=1 bar, h=360 kJ/kg, V=90 m/s, humidity=40%", "p=0.9 bar")]
    public void The_humidity_is_that_of_the_static_state(string inlet, string exit)
    {
        DeviceAnswer answer = DeviceSolver.Solve(Cases.Nozzle(HumidAir, inlet, exit));
        Assert.Equal(0.4, Humid(answer, answer.Inlet), 1e-10);
        StationAnswer atRest = answer.Inlet with { State = answer.Inlet.Stagnation!.Value };
        Assert.Equal(answer.Inlet.Velocity < 1, Math.Abs(Humid(answer, atRest) - 0.4) < 1e-4);
    }

    [Fact]
    public void A_section_finds_velocity_throat_flow_and_composition_together()
    {
        DeviceAnswer answer = DeviceSolver.Solve(Cases.Rated(HumidAir, "p0=3 bar, T0=70 degC, d=24 mm, humidity=40%", "d=18 mm", "", "p=1 bar"));
        Assert.Equal(0.4, Humid(answer, answer.Inlet), 1e-9);
        Assert.True(answer.Inlet.Velocity > 100);
        Assert.Equal(answer.Performance.MassFlow!.Value, answer.Inlet.Flux!.Value * answer.Inlet.Area!.Value, 1e-9);
    }

    [Fact]
    public void A_reference_volume_stays_an_amount_of_gas_while_the_composition_is_found()
    {
        var flow = new FlowReference("3600 Nm3/h dry", Dimension.NormalVolumeFlow, 1, 101325, 273.15, GasMoisture.Dry);
        DeviceCase c = Cases.Nozzle(HumidAir, "p0=1.2 bar, T0=95 degC, M=0.6, humidity=40%", "p=0.8 bar") with { FlowReference = flow };
        c.Options.Set((int)CaseOption.Flow, flow.MassPerVolume(HumidAir)!.Value);
        DeviceAnswer answer = DeviceSolver.Solve(c);
        double x = FlowReference.WaterVapour(answer.Fluid);
        Assert.True(x > 0.1);
        Assert.Equal(1 / (1 - x), answer.Performance.NormalVolumeFlow!.Value, 1e-10);
    }

    [Theory]
    [InlineData("p=1 bar, T=20 degC, dew-point=20 degC", null)]
    [InlineData("p=1 bar, T=20 degC, dew-point=20.01 degC", "is saturation: the rest is liquid")]
    [InlineData("p=1 bar, T=-20 degC, humidity-ratio=0.01", "is saturation: the rest is ice")]
    [InlineData("p=1 bar, T=120 degC, humidity=60%", "leaves no room for air")]
    [InlineData("p=1 bar, T=120 degC, dew-point=105 degC", "leaves no room for air")]
    [InlineData("p=10 bar, T=400 degC, humidity=5%", "its critical temperature is 373.946 degC")]
    [InlineData("p=10 bar, T=400 degC, dew-point=105 degC", null)]
    public void More_vapour_than_saturation_is_no_inlet(string inlet, string? reason)
    {
        DeviceCase c = Cases.Nozzle(HumidAir, inlet, "p/p1=0.9");
        Refusal? refusal = (Record.Exception(() => DeviceSolver.Solve(c)) as FlowDuctException)?.Refusal;
        Assert.Equal(reason is null, refusal is null);
        if (refusal is null) return;
        Assert.Equal(RefusalKind.NoAnswer, refusal.Kind);
        Assert.Contains(reason!, refusal.Reason, StringComparison.Ordinal);
    }

    // At the place the partial pressure is the saturation pressure, by the release over ice or liquid; dry air as the second witness of the line.
    [Theory]
    [InlineData("p0=3 bar, T0=60 degC, humidity=30%", "d=18 mm", "d=20 mm", "p=1 bar")]
    [InlineData("p0=3 bar, T0=60 degC, humidity=2%", "d=18 mm", "d=20 mm", "p=1 bar")]
    [InlineData("p0=3 bar, T0=60 degC, humidity=3%", "d=18 mm", "d=24 mm", "p=2.2 bar")] // the onset lies before a shock, which dries the gas again
    [InlineData("p0=3 bar, T0=60 degC, humidity=95%", "d=18 mm", "", "p=2.6 bar")]
    public void Where_condensation_starts_the_vapour_is_saturated(string inlet, string throat, string exit, string back)
    {
        DeviceAnswer answer = DeviceSolver.Solve(Cases.Rated(HumidAir, inlet, throat, exit, back));
        PathPlace place = Onset(answer);
        double x = FlowReference.WaterVapour(answer.Fluid);
        Assert.Equal(1, x * place.At.p / VapourSaturation.Pressure(place.At.T), 2e-9);
        Assert.Equal(answer.Inlet.State.s, place.At.s, 1e-7);
        Assert.Equal(place.Behind, place.At.p < answer.Throat?.State.p);
        Finding finding = answer.Findings.Single(found => found.Code == "condensation");
        Assert.Contains("it starts " + place.Words(DisplayText.Metric), finding.Message(DisplayText.Metric), StringComparison.Ordinal);
    }

    // The states along the nozzle are worked out on another way, from the flow through each area.
    [Theory]
    [InlineData("humidity=3%", true)]
    [InlineData("humidity=30%", false)]
    public void Its_area_and_position_are_those_of_the_path(string humidity, bool behind)
    {
        DeviceCase c = Cases.Rated(
            HumidAir, "p0=3 bar, T0=60 degC, d=40 mm, " + humidity, "d=18 mm", "d=24 mm", "p=2.2 bar",
            (CaseOption.DivergentAngle, "8 deg"), (CaseOption.ConvergentAngle, "40 deg"), (CaseOption.Efficiency, "95%"), (CaseOption.DischargeCoefficient, "0.98"));
        DeviceAnswer answer = DeviceSolver.Solve(c);
        PathPlace place = Onset(answer);
        Assert.Equal(behind, place.Behind);
        double area = place.AreaRatio!.Value * answer.Throat!.Area!.Value, bore = Math.Sqrt(4 * area / Math.PI);
        PathPoint point = NozzlePath.Solve(answer, [new PathSection(place.Position, area, behind)]).Single();
        Assert.Equal(1, point.At.State.p / place.At.p, 1e-8);
        Assert.Equal(1, point.At.State.T / place.At.T, 1e-8);
        double straight = behind
            ? answer.Performance.ConvergentLength!.Value + ((bore - 0.018) / (2 * Math.Tan(4 * Math.PI / 180)))
            : (0.040 - bore) / (2 * Math.Tan(20 * Math.PI / 180));
        Assert.Equal(straight, place.Position!.Value, 1e-9);
    }

    [Fact]
    public void A_mixture_that_is_wet_already_says_so_and_ice_has_a_finding_of_its_own()
    {
        Fluid gas = FluidCatalogue.Find("N2=0.9,H2O=0.1")!;
        string wet = Message(DeviceSolver.Solve(Cases.Nozzle(gas, "p=3 bar, T=320 K", "p=2 bar")), "condensation")!;
        Assert.EndsWith("; it is there at the inlet already", wet, StringComparison.Ordinal);
        DeviceAnswer cold = DeviceSolver.Solve(Cases.Nozzle(gas, "p0=5 bar, T0=400 K", "p=1 bar"));
        Assert.Contains("it starts at", Message(cold, "condensation")!, StringComparison.Ordinal);
        Assert.Contains(", 0.01 degC, where the area is", Message(cold, "icing")!, StringComparison.Ordinal);
        Assert.Null(Message(DeviceSolver.Solve(Cases.Nozzle(gas, "p0=5 bar, T0=400 K", "p=3 bar")), "icing"));
    }

    private static string? Message(DeviceAnswer answer, string code) => answer.Findings.SingleOrDefault(found => found.Code == code)?.Message(DisplayText.Metric);

    private static PathPlace Onset(DeviceAnswer answer) => PathPlace.FirstAbove(answer, at => VapourExcess.Above(FlowReference.WaterVapour(answer.Fluid), at))!.Value;

    private static double Humid(DeviceAnswer answer, StationAnswer at) => StationFigureTable.Read(answer.Fluid, at, "humidity")!.Value;
}
