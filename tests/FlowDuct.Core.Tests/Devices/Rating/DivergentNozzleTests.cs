using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices.Rating;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Devices.Rating;

/// <summary>Nozzles with a throat before the exit, against NACA Report 1135 (1953) and against the laws, on every fluid.</summary>
public class DivergentNozzleTests
{
    private static readonly Gen<RatingInlet> s_inlets = Gen.OneOf(
        Gen.Select(Gen.Double[2e5, 60e5], Gen.Double[280, 900]).Select((p, T) => FromPT(GasCatalogue.Air, p, T)),
        Gen.Select(Gen.Double[2e5, 60e5], Gen.Double[1, 200]).Select((p, dT) => Superheated(p, dT)),
        Gen.Select(Gen.Double[2e5, 60e5], Gen.Double[0.3, 1]).Select((p, x) => FromPX(p, x)),
        Gen.Select(Gen.Double[225e5, 300e5], Gen.Double[690, 1000]).Select((p, T) => FromPT(WaterFluid.Instance, p, T)));

    // Table I and II of NACA Report 1135: M = 2.20 has A/A* = 2.005 (2.0050), p/pt = 0.09352, and p2/p1 = 5.480 across the shock; the subsonic
    // branch of A/A* = 2.0050 lies at p/pt = 0.9375 (M = 0.305).
    [Fact]
    public void The_limits_of_a_perfect_gas_are_those_of_the_tables()
    {
        var gas = new PerfectGas(1.4, 287);
        RatingInlet inlet = FromPT(gas, 1e6, 1000);
        Assert.Equal(RatingOutcome.Ok, DivergentLimits.Find(inlet, new NozzleGeometry(1e-4, 2.0050e-4, 1, null), out DivergentLimits limits));
        Assert.Equal(0.5283, limits.Throat.p / 1e6, 5e-5);
        Assert.Equal(0.09352, limits.Pressures.FullExpansion!.Value / 1e6, 1e-5);
        Assert.Equal(2.20, limits.ExitVelocity / limits.Exit.w, 5e-4);
        Assert.Equal(5.480, limits.Pressures.ShockAtExit!.Value / limits.Pressures.FullExpansion.Value, 5e-3);
        Assert.Equal(0.9375, limits.Pressures.Subsonic!.Value / 1e6, 2e-4);
    }

    // A shock at M = 1.80 (A/A* = 1.4390, pt2/pt1 = 0.8127): behind it the effective throat is 1/0.8127 as large.
    [Fact]
    public void A_shock_stands_where_the_tables_say()
    {
        var gas = new PerfectGas(1.4, 287);
        RatingInlet inlet = FromPT(gas, 1e6, 1000);
        var geometry = new NozzleGeometry(1e-4, 2e-4, 1, null);

        // A2/A2* = 2 x 0.8127 = 1.6254, subsonic: M = 0.3879, p/pt = 0.9014 (isentropic relations, gamma = 1.4).
        double M = 0.38790, back = 0.8127 * 1e6 / Math.Pow(1 + (0.2 * M * M), 3.5);
        Assert.Equal(RatingOutcome.Ok, DivergentNozzle.Rate(inlet, geometry, back, out NozzleRating rating));
        Assert.Equal(Regime.ShockInDivergence, rating.Regime);
        Assert.Equal(1.439, rating.Shock!.Value.AreaRatio, 2e-3);
        Assert.Equal(1.80, rating.Shock.Value.V1 / rating.Shock.Value.Upstream.w, 2e-3);
    }

    [Fact]
    public void Mass_momentum_and_energy_hold_and_entropy_rises_across_every_shock()
    {
        int shocks = 0;
        Cases().Each((inlet, geometry, u) =>
        {
            if (DivergentLimits.Find(inlet, geometry, out DivergentLimits limits) != RatingOutcome.Ok || limits.Pressures.ShockAtExit is not double low) return;
            double high = limits.Pressures.Subsonic!.Value, back = low + ((0.02 + (0.96 * u)) * (high - low));
            string where = FormattableString.Invariant($"{inlet.Fluid.Name} p0={inlet.p0:R} h0={inlet.h0:R} A2/At={geometry.ExitArea / geometry.ThroatArea:R} eta={geometry.Efficiency:R} back={back:R}");
            Assert.True(DivergentNozzle.Rate(inlet, geometry, back, out NozzleRating at) == RatingOutcome.Ok, where);
            Assert.Equal(Regime.ShockInDivergence, at.Regime);
            ShockAnswer shock = at.Shock!.Value;
            double G = shock.V1 / shock.Upstream.v;
            Assert.Equal(1, shock.V2 / shock.Downstream.v / G, 1e-10);
            Assert.Equal(1, (shock.Downstream.p + (G * shock.V2)) / (shock.Upstream.p + (G * shock.V1)), 1e-10);
            Assert.Equal(inlet.h0, shock.Downstream.h + (shock.V2 * shock.V2 / 2), 1e-10 * Math.Max(Math.Abs(inlet.h0), 1e5));
            Assert.True(shock.Downstream.s >= shock.Upstream.s - 2e-3 && at.Exit.s >= shock.Downstream.s - 2e-3, where);
            Assert.InRange(shock.AreaRatio, 1 - 1e-6, (geometry.ExitArea / geometry.ThroatArea) + 1e-6);
            Assert.Equal(1, at.ExitVelocity / at.Exit.v * geometry.ExitArea / at.MassFlow, 1e-9);
            shocks++;
        },
        1200);
        Assert.True(shocks > 800, $"only {shocks} shocks");
    }

    // At each limit both neighbours give the same exit pressure, flow and exit velocity.
    [Fact]
    public void Regimes_meet_without_a_step() => Cases().Each(
        (inlet, geometry, u) =>
        {
            // Beyond these ratios the width of the limits themselves, a millionth of p0, moves the exit velocity by more than is compared.
            if (geometry.ExitArea / geometry.ThroatArea is < 1.05 or > 6) return;
            if (DivergentLimits.Find(inlet, geometry, out DivergentLimits limits) != RatingOutcome.Ok || limits.Pressures.ShockAtExit is not double shocked) return;
            double band = 3e-6 * inlet.p0;
            foreach (double limit in (double[])[limits.Pressures.Subsonic!.Value, limits.Pressures.FullExpansion!.Value])
            {
                Assert.Equal(RatingOutcome.Ok, DivergentNozzle.Rate(inlet, geometry, limits, limit + band, out NozzleRating above));
                Assert.Equal(RatingOutcome.Ok, DivergentNozzle.Rate(inlet, geometry, limits, limit - band, out NozzleRating below));
                Assert.Equal(1, above.MassFlow / below.MassFlow, 1e-3);
                Assert.Equal(1, above.ExitVelocity / below.ExitVelocity, 1e-3);
            }

            // The exit plane changes from behind the shock to before it; the shock itself stands in the exit plane from both sides.
            if (shocked + band >= limits.Pressures.Subsonic) return;
            Assert.Equal(RatingOutcome.Ok, DivergentNozzle.Rate(inlet, geometry, limits, shocked + band, out NozzleRating inside));
            Assert.Equal(geometry.ExitArea / geometry.ThroatArea, inside.Shock!.Value.AreaRatio, 2e-3 * inside.Shock.Value.AreaRatio);
        },
        600);

    // Every pressure near the throat passes less.
    [Fact]
    public void The_throat_passes_the_greatest_flux() => s_inlets.Each(
        inlet =>
        {
            if (!Choking.TryFind(inlet.Fluid, inlet.h0, inlet.s, inlet.p0, out FluidState throat, out _)) return;
            double most = Energy.Velocity(inlet.h0, throat.h) / throat.v;
            foreach (double off in (double[])[0.98, 0.999, 1.001, 1.02])
            {
                if (inlet.Fluid.FromPS(throat.p * off, inlet.s, default, out FluidState near) != Outcome.Ok || near.h >= inlet.h0) continue;
                Assert.True(Energy.Velocity(inlet.h0, near.h) / near.v < most, FormattableString.Invariant($"{inlet.Fluid.Name} p0={inlet.p0:R}"));
            }
        },
        2000);

    // Any back pressure, any fluid: a rating whose numbers are finite, or a reason; with falling back pressure the flow never falls.
    [Fact]
    public void Every_back_pressure_is_answered() => Cases().Each(
        (inlet, geometry, u) =>
        {
            if (DivergentLimits.Find(inlet, geometry, out DivergentLimits limits) != RatingOutcome.Ok) return;
            double flow = 0;
            for (int i = 0; i <= 12; i++)
            {
                double back = inlet.p0 * Math.Pow(1 - ((i + u) / 13), 2);
                RatingOutcome outcome = DivergentNozzle.Rate(inlet, geometry, limits, back, out NozzleRating at);
                string where = FormattableString.Invariant($"{inlet.Fluid.Name} p0={inlet.p0:R} h0={inlet.h0:R} back={back:R} {outcome}");
                Assert.True(outcome == RatingOutcome.Ok || (outcome == limits.Hidden && limits.Hidden != RatingOutcome.NotConverged), where);
                if (outcome != RatingOutcome.Ok) continue;
                Assert.True(double.IsFinite(at.MassFlow) && double.IsFinite(at.ExitVelocity) && at.Exit.p > 0, where);
                Assert.True(at.MassFlow >= flow * (1 - 1e-9), where);
                flow = at.MassFlow;
            }
        },
        1200);

    private static Gen<(RatingInlet, NozzleGeometry, double)> Cases() =>
        Gen.Select(s_inlets, Gen.OneOf(Gen.Double[1.05, 6], Gen.Double[-3, 4].Select(x => 1 + Math.Pow(10, x))), Gen.OneOf(Gen.Const(1.0), Gen.Double[0.93, 0.999]), Gen.Double[0, 1])
            .Select((inlet, ratio, eta, u) => (inlet, new NozzleGeometry(1e-4, ratio * 1e-4, eta, null), u));

    private static RatingInlet FromPT(Fluid fluid, double p, double T)
    {
        Assert.Equal(Outcome.Ok, fluid.FromPT(p, T, out FluidState at));
        return new RatingInlet(fluid, at.h, at.s, p);
    }

    private static RatingInlet Superheated(double p, double dT)
    {
        WaterFluid.Instance.TrySaturationTemperature(p, out double T);
        return FromPT(WaterFluid.Instance, p, T + dT);
    }

    private static RatingInlet FromPX(double p, double x)
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPX(p, x, out FluidState at));
        return new RatingInlet(WaterFluid.Instance, at.h, at.s, p);
    }
}
