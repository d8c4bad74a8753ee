using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Every inverse closes in the pair that was given, everywhere, and its phase is the one that the pair says.</summary>
public class InverseTests
{
    private static readonly WaterFluid s_water = WaterFluid.Instance;

    // log-uniform in p over the range, uniform in T; region 5 where the pressure allows.
    private static readonly Gen<(double p, double T)> s_states =
        Gen.Select(Gen.Double[Math.Log(700), Math.Log(100e6)], Gen.Double[273.16, 2273.15])
            .Select((lnp, T) => (p: Math.Exp(lnp), T)).Where(at => at.T <= 1073.15 || at.p <= 50e6);

    // Dense around the critical point and along the edges of regions 1, 2 and 3.
    private static readonly Gen<(double p, double T)> s_hard = Gen.OneOf(
        Gen.Select(Gen.Double[16.4e6, 30e6], Gen.Double[620, 700]),
        Gen.Select(Gen.Double[21.9e6, 22.3e6], Gen.Double[645, 649]),
        Gen.Select(Gen.Double[17e6, 100e6], Gen.Double[623.14, 623.16]),
        Gen.Select(Gen.Double[625, 863], Gen.Double[-0.05, 0.05]).Select((T, d) => (Boundaries.pB23(T), T + d)),
        Gen.Select(Gen.Double[1e4, 50e6], Gen.Double[1073.1, 1073.2]),
        Gen.Select(Gen.Double[273.16, 647.0], Gen.Double[-1e-3, 1e-3]).Select((T, d) => (SaturationLine.Pressure(T) * (1 + d), T)));

    [Fact]
    public void Inverses_close_over_the_whole_range() => s_states.Each(at => RoundTrip.Check(at.p, at.T), 100_000);

    [Fact]
    public void Inverses_close_at_edges_and_near_the_critical_point() =>
        s_hard.Where(at => at.Item2 is > 273.15 and < 2273 && at.Item1 < 100e6)
            .Each(at => RoundTrip.Check(at.Item1, at.Item2), 100_000);

    [Fact]
    public void Wet_states_close_and_are_wet() => Gen.Select(Gen.Double[273.16, 647.09], Gen.Double[0.001, 0.999]).Each(
        (T, x) =>
        {
            Assert.Equal(Outcome.Ok, s_water.FromTX(T, x, out FluidState at));
            Assert.Equal(Phase.Wet, at.Phase);
            Assert.Equal(Outcome.Ok, s_water.FromPH(at.p, at.h, default, out FluidState ph));
            Assert.Equal(Outcome.Ok, s_water.FromPS(at.p, at.s, default, out FluidState ps));
            Assert.Equal(Outcome.Ok, s_water.FromHS(at.h, at.s, default, out FluidState hs));
            RoundTrip.Close(at.h, ph.h, 1e3);
            RoundTrip.Close(at.s, ps.s, 1);
            RoundTrip.Close(at.h, hs.h, 1e3);
            RoundTrip.Close(at.s, hs.s, 1);
            Assert.Equal(Phase.Wet, ph.Phase);
            Assert.Equal(Phase.Wet, ps.Phase);
        },
        100_000);

    // h against h' and h": a billionth outside the dome is single phase, a billionth inside is wet.
    [Fact]
    public void Phase_is_decided_by_the_given_enthalpy() => Gen.Double[274, 640].Each(
        T =>
        {
            s_water.FromTX(T, 0, out FluidState liquid);
            s_water.FromTX(T, 1, out FluidState vapour);
            double step = 1e-7 * (vapour.h - liquid.h);
            Assert.Equal(Phase.Liquid, PhaseAt(liquid.p, liquid.h - step));
            Assert.Equal(Phase.Wet, PhaseAt(liquid.p, liquid.h + step));
            Assert.Equal(Phase.Wet, PhaseAt(liquid.p, vapour.h - step));
            Assert.Equal(Phase.SuperheatedVapour, PhaseAt(liquid.p, vapour.h + step));
        },
        2000);

    private static Phase PhaseAt(double p, double h)
    {
        Assert.Equal(Outcome.Ok, s_water.FromPH(p, h, default, out FluidState at));
        return at.Phase;
    }

    // The speed of sound of every state, wet or not, is the slope of p(rho) at constant entropy: w^2 = -v^2 dp/dv.
    [Fact]
    public void Speed_of_sound_is_the_isentropic_derivative() => Gen.Select(Gen.Double[300, 620], Gen.Double[0.05, 0.95]).Each(
        (T, x) =>
        {
            s_water.FromTX(T, x, out FluidState at);
            double step = 1e-4 * at.p;
            s_water.FromPS(at.p + step, at.s, default, out FluidState up);
            s_water.FromPS(at.p - step, at.s, default, out FluidState down);
            double numeric = at.v * Math.Sqrt(-(2 * step) / (up.v - down.v));
            Assert.Equal(numeric, at.w, 1e-5 * numeric);
        },
        500);

    // dh = v dp at constant entropy.
    [Fact]
    public void Enthalpy_follows_volume_along_an_isentrope() => s_states.Where(at => at.p is > 1e4 and < 90e6 && at.T < 1000).Each(
        at =>
        {
            s_water.FromPT(at.p, at.T, out FluidState here);
            double step = 1e-3 * at.p;
            if (s_water.FromPS(at.p + step, here.s, default, out FluidState up) != Outcome.Ok) return;
            if (s_water.FromPS(at.p - step, here.s, default, out FluidState down) != Outcome.Ok) return;
            if (up.Phase != here.Phase || down.Phase != here.Phase) return;
            double slope = (up.h - down.h) / (2 * step);

            // Steps at region edges, up to 134 J/kg (R7-97, Table 43), are part of the release.
            double edge = 134 / (2 * step);
            Assert.True(Math.Abs(slope - here.v) < (1e-4 * here.v) || Math.Abs(slope - here.v) < edge);
        },
        2000);

    [Fact]
    public void Saturation_pressure_and_temperature_undo_each_other() => Gen.Double[273.15, 647.096].Each(
        T => Assert.Equal(T, SaturationLine.Temperature(SaturationLine.Pressure(T)), 1e-7), 2000);

    [Theory]
    [InlineData(0.5, 300, "PressureTooLow")]
    [InlineData(100.1e6, 300, "PressureTooHigh")]
    [InlineData(60e6, 1100, "PressureTooHigh")]
    [InlineData(1e5, 273.1, "TemperatureTooLow")]
    [InlineData(1e5, 2274, "TemperatureTooHigh")]
    [InlineData(double.NaN, 300, "PressureTooLow")]
    [InlineData(1e5, double.NaN, "TemperatureTooLow")]
    public void Outside_the_range_is_an_outcome_with_its_limit(double p, double T, string outcome)
    {
        Outcome got = s_water.FromPT(p, T, out _);
        Assert.Equal(outcome, got.ToString());
        RangeViolation violation = s_water.Explain(got, StatePair.PT, p, T);
        Assert.True(double.IsFinite(violation.Limit));
        Assert.NotEqual(string.Empty, violation.Source);
    }

    [Theory]
    [InlineData(1e5, -1e5, "PairTooLow")]
    [InlineData(1e5, 8e6, "PairTooHigh")]
    [InlineData(60e6, 5e6, "PairTooHigh")]
    [InlineData(300, 2e6, "PairTooLow")]
    [InlineData(1e5, double.NaN, "PairTooLow")]
    public void An_enthalpy_outside_is_an_outcome_with_its_limit(double p, double h, string outcome)
    {
        Outcome got = s_water.FromPH(p, h, default, out _);
        Assert.Equal(outcome, got.ToString());
        RangeViolation violation = s_water.Explain(got, StatePair.PH, p, h);
        Assert.Equal("h", violation.Symbol);
        Assert.True(double.IsFinite(violation.Limit));
    }

    // Below the triple-point pressure only vapour lies in the range, and what condenses from it is ice. IAPWS R14-08(2011): at 273.15 K
    // ice stands between 611.15 Pa (sublimation) and about 1.3 bar (melting).
    [Theory]
    [InlineData(300, 273.155, Notices.BelowTriplePoint)]
    [InlineData(300, 300, Notices.BelowTriplePoint)]
    [InlineData(612, 274, Notices.None)]
    [InlineData(1e5, 273.15, Notices.Ice)]
    [InlineData(1.25e5, 273.15, Notices.Ice)]
    [InlineData(1.4e5, 273.15, Notices.None)]
    [InlineData(1e5, 273.1551, Notices.None)]
    [InlineData(611.3, 273.15, Notices.BelowTriplePoint | Notices.Ice)]
    public void Cold_water_says_where_ice_is_stable(double p, double T, Notices notices)
    {
        Assert.Equal(Outcome.Ok, s_water.FromPT(p, T, out FluidState state));
        Assert.Equal(notices, state.Notices);
    }

    // In cold water one density belongs to two temperatures: the warmer one is the documented answer.
    [Fact]
    public void Cold_water_of_one_density_is_the_warmer_one()
    {
        s_water.FromPT(1e5, 275.15, out FluidState cold);
        Assert.Equal(Outcome.Ok, s_water.FromPRho(1e5, cold.rho, out FluidState found));
        Assert.InRange(found.T, 279, 281);
        Assert.Equal(cold.rho, found.rho, 1e-8);
    }
}
