using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Laws that hold for every answer: energy closes, efficiency 1 keeps the entropy, less efficiency makes more of it.</summary>
public class LawsTests
{
    private static readonly Gen<(double p, double T, double V, double ratio, double eta)> s_air =
        Gen.Select(Gen.Double[0.5e5, 60e5], Gen.Double[260, 1600], Gen.Double[0, 150], Gen.Double[0.08, 0.97], Gen.Double[0.5, 1]);

    private static DeviceAnswer Solve(Fluid fluid, double p, double T, double V, double p2, double eta) => DeviceSolver.Solve(Cases.Exact(
        DeviceKind.Nozzle,
        fluid,
        [(StationSymbol.Pressure, p), (StationSymbol.Temperature, T), (StationSymbol.Velocity, V)],
        [(StationSymbol.Pressure, p2)],
        (CaseOption.Efficiency, eta), (CaseOption.Flow, 1.7)));

    [Fact]
    public void Energy_and_mass_close_on_air() => s_air.Each(
        c =>
        {
            DeviceAnswer a = Solve(GasCatalogue.Air, c.p, c.T, c.V, c.ratio * c.p, c.eta);
            Assert.InRange(Math.Abs(a.Ledger!.Closure) / Math.Abs(a.Ledger.In), 0, 1e-12);
            if (a.Exit.Area is double A) Assert.Equal(1.7, A * a.Exit.Flux!.Value, 1.7e-12);
            Assert.Equal(Verdict.Holds, a.Audit.Entropy);
            Assert.Equal(c.eta, a.Performance.IsentropicEfficiency!.Value, 1e-9);
        },
        2000);

    [Fact]
    public void Efficiency_one_keeps_the_entropy_and_less_makes_more() => s_air.Each(
        c =>
        {
            DeviceAnswer ideal = Solve(GasCatalogue.Air, c.p, c.T, c.V, c.ratio * c.p, 1);
            DeviceAnswer real = Solve(GasCatalogue.Air, c.p, c.T, c.V, c.ratio * c.p, c.eta);
            DeviceAnswer worse = Solve(GasCatalogue.Air, c.p, c.T, c.V, c.ratio * c.p, 0.9 * c.eta);
            Assert.Equal(0, ideal.Performance.EntropyRise!.Value / ideal.Inlet.State.s, 1e-9);
            Assert.True(real.Performance.EntropyRise >= ideal.Performance.EntropyRise - 1e-9);
            Assert.True(worse.Performance.EntropyRise > real.Performance.EntropyRise);
            Assert.True(worse.Exit.Velocity < real.Exit.Velocity);
        },
        1000);

    // Every way to ask for the same exit gives the same exit.
    [Fact]
    public void Exit_figures_of_an_answer_lead_back_to_it() => s_air.Each(
        c =>
        {
            DeviceAnswer a = Solve(GasCatalogue.Air, c.p, c.T, c.V, c.ratio * c.p, c.eta);
            (StationSymbol, double)[] inlet =
                [(StationSymbol.Pressure, c.p), (StationSymbol.Temperature, c.T), (StationSymbol.Velocity, c.V)];
            (StationSymbol, double)[] ways =
            [
                (StationSymbol.Velocity, a.Exit.Velocity!.Value), (StationSymbol.Temperature, a.Exit.State.T),
                (StationSymbol.Enthalpy, a.Exit.State.h), (StationSymbol.Density, a.Exit.State.rho), (StationSymbol.Mach, a.Exit.Mach!.Value),
                (StationSymbol.StagnationPressure, a.Exit.Stagnation!.Value.p),
            ];
            foreach ((StationSymbol, double) way in ways)
            {
                DeviceAnswer measured = DeviceSolver.Solve(Cases.Exact(
                    DeviceKind.Nozzle, GasCatalogue.Air, inlet, [(StationSymbol.Pressure, c.ratio * c.p), way]));
                Assert.Equal(c.eta, measured.Performance.IsentropicEfficiency!.Value, 1e-6);
                if (way.Item1 == StationSymbol.StagnationPressure) continue;
                DeviceAnswer found = DeviceSolver.Solve(Cases.Exact(
                    DeviceKind.Nozzle, GasCatalogue.Air, inlet, [way], (CaseOption.Efficiency, c.eta)));
                Assert.Equal(c.ratio * c.p, found.Exit.State.p, c.p * 1e-7);
            }
        },
        300);

    // Every way to give the same inlet gives the same inlet.
    [Fact]
    public void Inlet_readings_of_an_answer_lead_back_to_it() => s_air.Each(
        c =>
        {
            double V = c.V + 20;
            DeviceAnswer a = Solve(GasCatalogue.Air, c.p, c.T, V, c.ratio * c.p, 1);
            FluidState rest = a.Inlet.Stagnation!.Value;
            (StationSymbol, double)[][] ways =
            [
                [(StationSymbol.StagnationPressure, rest.p), (StationSymbol.StagnationTemperature, rest.T), (StationSymbol.Velocity, V)],
                [(StationSymbol.StagnationPressure, rest.p), (StationSymbol.StagnationTemperature, rest.T), (StationSymbol.Mach, a.Inlet.Mach!.Value)],
                [(StationSymbol.Pressure, c.p), (StationSymbol.StagnationTemperature, rest.T), (StationSymbol.Velocity, V)],
                [(StationSymbol.StagnationPressure, rest.p), (StationSymbol.Temperature, c.T), (StationSymbol.Velocity, V)],
                [(StationSymbol.Pressure, c.p), (StationSymbol.StagnationPressure, rest.p), (StationSymbol.Temperature, c.T)],
                [(StationSymbol.Pressure, c.p), (StationSymbol.StagnationPressure, rest.p), (StationSymbol.StagnationTemperature, rest.T)],
                [(StationSymbol.StagnationPressure, rest.p), (StationSymbol.StagnationTemperature, rest.T), (StationSymbol.Area, a.Inlet.Area!.Value)],
            ];
            foreach ((StationSymbol, double)[] way in ways)
            {
                DeviceAnswer b = DeviceSolver.Solve(Cases.Exact(
                    DeviceKind.Nozzle, GasCatalogue.Air, way, [(StationSymbol.Pressure, c.ratio * c.p)], (CaseOption.Flow, 1.7)));
                Assert.Equal(c.p, b.Inlet.State.p, c.p * 1e-7);
                Assert.Equal(c.T, b.Inlet.State.T, c.T * 1e-7);
                Assert.Equal(V, b.Inlet.Velocity!.Value, V * 1e-4);
            }
        },
        300);
}
