using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Rating;

/// <summary>The states along a nozzle obey the balances in every section and end in the exit of the answer.</summary>
public class NozzlePathTests
{
    [Theory]
    [InlineData("p=1 bar", "1")]
    [InlineData("p=5 bar", "1")]
    [InlineData("p=5 bar", "0.96")]
    [InlineData("p=8.8 bar", "0.96")]
    [InlineData("p=0.2 bar", "0.96")]
    public void Mass_and_energy_hold_in_every_section(string back, string efficiency)
    {
        foreach (Fluid fluid in (Fluid[])[WaterFluid.Instance, GasCatalogue.Air])
        {
            DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(
                fluid, "p0=9 bar, T0=230 degC, d=60 mm", "d=18 mm", "d=25 mm", back, (CaseOption.Efficiency, efficiency), (CaseOption.DivergentAngle, "10 deg"), (CaseOption.ConvergentAngle, "40 deg")));
            IReadOnlyList<PathPoint> points = NozzlePath.Solve(a, NozzlePath.Sections(a, 21));
            Assert.Equal(a.Performance.Shock is null ? 21 : 23, points.Count);
            double h0 = a.Inlet.StagnationEnthalpy!.Value, before = double.NegativeInfinity;
            foreach (PathPoint point in points)
            {
                double V = point.At.Velocity!.Value;
                Assert.Equal(1, V / point.At.State.v * point.Area / a.Performance.MassFlow!.Value, 1e-8);
                Assert.Equal(h0, point.At.State.h + (V * V / 2), 1e-8 * Math.Abs(h0));
                Assert.True(point.At.State.s >= a.Inlet.State.s - 1e-6, "the entropy falls");
                Assert.True(point.Position >= before);
                before = point.Position!.Value;
            }

            Assert.Equal(1, points[^1].At.State.p / a.Exit.State.p, 1e-6);
            Assert.Equal(a.Exit.Velocity!.Value, points[^1].At.Velocity!.Value, 1e-5 * a.Exit.Velocity.Value);
        }
    }

    // In a nozzle with a shock the flow is faster than sound between throat and shock only.
    [Fact]
    public void A_shock_is_two_points_of_one_section()
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(GasCatalogue.Air, "p0=8 bar, T0=313 K", "d=18 mm", "d=25 mm", "p=5 bar"));
        IReadOnlyList<PathPoint> points = NozzlePath.Solve(a, NozzlePath.Sections(a, 31));
        int at = Enumerable.Range(1, points.Count - 1).Single(i => points[i].Area == points[i - 1].Area);
        Assert.True(points[at - 1].At.Mach > 1 && points[at].At.Mach < 1);
        Assert.Equal(a.Performance.Shock!.Value.AreaRatio, points[at].Area / (Math.PI * 0.018 * 0.018 / 4), 1e-9);
        Assert.All(points.Skip(at), point => Assert.True(point.At.Mach < 1));
    }
}
