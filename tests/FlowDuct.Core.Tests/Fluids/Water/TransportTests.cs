using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Transport over the range and at its ends; the printed values stand in <see cref="CheckRowTests"/>.</summary>
public class TransportTests
{
    [Fact]
    public void Transport_is_finite_and_positive_over_the_range() => Gen.Select(Gen.Double[Math.Log(1e3), Math.Log(100e6)], Gen.Double[273.16, 1173.15])
        .Where(at => at.Item1 <= Math.Log(50e6) || at.Item2 <= 1073.15).Each(
        (lnp, T) =>
        {
            Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(Math.Exp(lnp), T, out FluidState at));
            Assert.True(WaterFluid.Instance.TryTransport(at, out Transport transport));
            Assert.InRange(transport.mu, 5e-6, 3e-3);
            Assert.InRange(transport.lambda, 0.01, 20);
        },
        5000);

    // Heat capacity and conductivity grow without bound towards the critical point: large beside it, no number at it.
    [Fact]
    public void At_the_critical_point_there_is_no_heat_capacity_and_no_conductivity()
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPX(WaterConstants.pc, 1, out FluidState at));
        Assert.False(at.HasIsobaricHeatCapacity);
        Assert.False(WaterFluid.Instance.TryTransport(at, out _));
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(WaterConstants.pc, WaterConstants.Tc + 0.01, out FluidState beside));
        Assert.True(WaterFluid.Instance.TryTransport(beside, out Transport transport));
        Assert.InRange(transport.lambda, 1, 20);
    }

    [Fact]
    public void Beyond_its_range_there_is_no_transport()
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(1e5, 1173.2, out FluidState hot));
        Assert.False(WaterFluid.Instance.TryTransport(hot, out _));
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPX(1e5, 0.5, out FluidState wet));
        Assert.False(WaterFluid.Instance.TryTransport(wet, out _));
    }
}
