using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>The derivatives that solvers use, against differences of the properties themselves.</summary>
public class DerivativeTests
{
    private static readonly WaterFluid s_water = WaterFluid.Instance;

    // In one phase, each region clear of its edges.
    private static readonly Gen<(double p, double T)> s_states = Gen.OneOf(
        Gen.Select(Gen.Double[1e6, 90e6], Gen.Double[280, 440]),
        Gen.Select(Gen.Double[1e4, 1e6], Gen.Double[500, 1000]),
        Gen.Select(Gen.Double[30e6, 90e6], Gen.Double[640, 690]),
        Gen.Select(Gen.Double[1e5, 40e6], Gen.Double[1100, 2200]));

    // A central difference of the fourth order; its own error is 1e-7 at this step.
    [Fact]
    public void Volume_by_pressure_at_constant_entropy_is_the_slope_of_the_isentrope() => s_states.Each(
        at =>
        {
            Assert.Equal(Outcome.Ok, s_water.FromPT(at.p, at.T, out FluidState state));
            double step = 2e-3 * at.p;
            double slope = ((8 * (V(at.p + step, state.s) - V(at.p - step, state.s))) - (V(at.p + (2 * step), state.s) - V(at.p - (2 * step), state.s))) / (12 * step);
            Assert.Equal(1, state.vpAtS / slope, 1e-6);
            Assert.Equal(-state.v / at.p / slope, state.kappa, 1e-6 * state.kappa);
        },
        2000);

    [Fact]
    public void On_the_saturation_line_the_wet_side_is_the_limit_of_the_mixture() => Gen.Double[274, 640].Each(
        T =>
        {
            foreach (int x in (int[])[0, 1])
            {
                Assert.Equal(Outcome.Ok, s_water.FromTX(T, x, out FluidState edge));
                Assert.Equal(Outcome.Ok, s_water.FromTX(T, Math.Abs(x - 1e-12), out FluidState inside));
                Assert.True(s_water.TryWetSideSpeedOfSound(edge, out double w));
                Assert.Equal(1, w / inside.w, 1e-4);
                Assert.True(w < edge.w, "the wet side is the softer one");
            }
        },
        500);

    [Fact]
    public void Elsewhere_there_is_no_wet_side()
    {
        s_water.FromPT(1e5, 400, out FluidState vapour);
        Assert.False(s_water.TryWetSideSpeedOfSound(vapour, out _));
        s_water.FromPX(WaterConstants.pc, 1, out FluidState critical);
        Assert.False(s_water.TryWetSideSpeedOfSound(critical, out _));
    }

    // For an ideal gas, and only there, the exponent is the ratio of heat capacities.
    [Fact]
    public void The_isentropic_exponent_of_air_is_the_ratio_of_heat_capacities() => Gen.Double[100, 2000].Each(
        T =>
        {
            GasCatalogue.Air.FromPT(1e5, T, out FluidState at);
            Assert.Equal(at.cp / at.cv, at.kappa, 1e-12);
        },
        200);

    private static double V(double p, double s)
    {
        Assert.Equal(Outcome.Ok, s_water.FromPS(p, s, default, out FluidState at));
        return at.v;
    }
}
