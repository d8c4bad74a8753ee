using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Transport on fixed points: the whole range, and the neighbourhood of the critical point where random points seldom fall.</summary>
public class TransportGridTests
{
    [Fact]
    public void Transport_is_finite_and_positive_on_a_grid_of_the_range()
    {
        for (int i = 0; i <= 50; i++)
        {
            double p = 100 * Math.Pow(10, 6 * i / 50.0);
            for (double T = 273.16; T <= Viscosity.MostT; T += 5)
            {
                if (T > WaterConstants.T25 && p > 50e6) break;
                Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(p, T, out FluidState at));
                Check(at);
            }
        }
    }

    // Down to half a millikelvin. Within about 0.1 mK the saturation pressure of R7-97, Eq. (30) leaves the equation of region 3 no liquid and
    // no vapour root (evaluated), both are set to the critical density, and there is no transport.
    [Fact]
    public void Transport_is_finite_and_positive_around_the_critical_point()
    {
        double[] offsets = [5e-4, 1e-3, 1e-2, 0.1, 1];
        double[] pressures = [1 - 1e-2, 1 - 1e-4, 1 - 1e-6, 1 + 1e-6, 1 + 1e-4, 1 + 1e-2];
        foreach (double dT in offsets)
        {
            foreach (double x in new[] { 0.0, 1.0 })
            {
                Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromTX(WaterConstants.Tc - dT, x, out FluidState saturated));
                Check(saturated);
            }

            foreach (double T in new[] { WaterConstants.Tc - dT, WaterConstants.Tc + dT })
            {
                foreach (double ratio in pressures)
                {
                    Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(ratio * WaterConstants.pc, T, out FluidState at));
                    Check(at);
                }
            }
        }
    }

    // R15-11, Eqs. (18)-(22): far up, lambda2 goes as cp / xi and xi as zeta^(nu/gamma). An equation analytic at the critical point, as
    // that of region 3 is, has cp and zeta go as 1 / (T - Tc) on the critical isochore. So lambda goes as (T - Tc)^(nu/gamma - 1); the
    // hundredth allowed holds the background that is left (0.4 W/(m.K) beside 46 and more).
    [Fact]
    public void Conductivity_grows_towards_the_critical_point_by_the_exponents_of_the_release()
    {
        double far = OnTheCriticalIsochore(1e-4), near = OnTheCriticalIsochore(1e-6);
        Assert.Equal((0.630 / 1.239) - 1, Math.Log10(far / near) / 2, 0.01);
    }

    // R15-11, Table 6 and Eq. (26): five polynomials side by side. No printed check value falls between 400 and 600 kg/m3; this holds that
    // one to its neighbours. As printed they join to within 0.2 % (0.10, 0.005, 0.17 and 0.12 %, evaluated), not exactly.
    [Theory]
    [InlineData(0.310559006)]
    [InlineData(0.776397516)]
    [InlineData(1.242236025)]
    [InlineData(1.863354037)]
    public void The_reference_compressibility_joins_where_its_polynomials_meet(double delta)
    {
        double below = ThermalConductivity.ReferenceZeta(delta * (1 - 1e-9)), above = ThermalConductivity.ReferenceZeta(delta * (1 + 1e-9));
        Assert.InRange(above / below, 0.998, 1.002);
        Assert.NotEqual(below, above);
    }

    // The enhancement only adds: what is left without it is the least conductivity.
    private static void Check(in FluidState at)
    {
        Assert.True(WaterFluid.Instance.TryTransport(at, out Transport transport), $"none at {at.p:R} Pa, {at.T:R} K");
        double t = at.T / WaterConstants.Tc, background = ThermalConductivity.Dilute(t) * ThermalConductivity.Dense(t, at.rho / WaterConstants.rhoc) * 1e-3;
        Assert.True(double.IsFinite(transport.mu) && transport.mu > 0, $"mu {transport.mu:R} at {at.p:R} Pa, {at.T:R} K");
        Assert.True(double.IsFinite(transport.lambda) && background > 0, $"lambda {transport.lambda:R} at {at.p:R} Pa, {at.T:R} K");
        Assert.True(transport.lambda >= background * (1 - 1e-12), $"lambda {transport.lambda:R} below {background:R} at {at.p:R} Pa, {at.T:R} K");
    }

    private static double OnTheCriticalIsochore(double dT)
    {
        RegionState at = Region3.State(WaterConstants.rhoc, WaterConstants.Tc + dT);
        return ThermalConductivity.Of(at, Viscosity.Of(at.T, WaterConstants.rhoc));
    }
}
