using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Along every fence of the formulation, a last digit, a millikelvin and a millionth to each side: a state or a limit, never less.</summary>
public class FenceWalkTests
{
    private const int Posts = 200;

    private static readonly WaterFluid s_water = WaterFluid.Instance;

    private static readonly Dictionary<string, Func<double, (double p, double T)>> s_fences = new()
    {
        ["least temperature"] = u => (Log(u, 700, 100e6), WaterConstants.TLeast),
        ["edge of regions 1 and 3"] = u => (Log(u, 16.53e6, 100e6), WaterConstants.T13),
        ["edge of regions 2 and 3"] = u => (Boundaries.pB23(Line(u, 623.15, 863.15)), Line(u, 623.15, 863.15)),
        ["edge of regions 2 and 5"] = u => (Log(u, 1, 50e6), WaterConstants.T25),
        ["greatest temperature"] = u => (Log(u, 1, 50e6), WaterConstants.TMost),
        ["greatest pressure"] = u => (WaterConstants.pMost, Line(u, 273.15, 1073.15)),
        ["greatest pressure of region 5"] = u => (WaterConstants.pMost5, Line(u, 1073.15, 2273.15)),
        ["least pressure"] = u => (WaterConstants.pLeast, Line(u, 273.15, 2273.15)),
        ["saturation line"] = u => (SaturationLine.Pressure(Line(u, 273.15, 647.096)), Line(u, 273.15, 647.096)),
        ["critical isotherm"] = u => (Log(u, 16.6e6, 100e6), WaterConstants.Tc),
        ["critical isobar"] = u => (WaterConstants.pc, Line(u, 273.15, 2273.15)),
        ["end of B23"] = u => (Log(u, 1e6, 100e6), WaterConstants.TB23Most),
    };

    public static TheoryData<string> Fences { get; } = [.. s_fences.Keys];

    [Theory]
    [MemberData(nameof(Fences))]
    public void Both_sides_of_a_fence_hold(string fence)
    {
        int inside = 0;
        for (int i = 0; i <= Posts; i++)
        {
            (double p, double T) = s_fences[fence]((double)i / Posts);
            foreach ((double pNear, double TNear) in Around(p, T)) inside += Step(pNear, TNear);
        }

        Assert.True(inside > Posts, "most of the walk lies outside the range, so that it checked little");
    }

    // h', h", s', s" to the last digit, 1e-6 and 1e-3 to each side: the pair decides the phase, and it closes.
    [Fact]
    public void Saturated_properties_and_what_lies_beside_them_hold()
    {
        for (int i = 0; i <= Posts; i++)
        {
            double T = Line((double)i / Posts, 273.16, 647.09);
            foreach (int x in (int[])[0, 1])
            {
                Assert.Equal(Outcome.Ok, s_water.FromTX(T, x, out FluidState edge));
                foreach (double shift in (double[])[0, 1e-15, -1e-15, 1e-6, -1e-6, 1e-3, -1e-3])
                {
                    double h = edge.h + (shift * Math.Max(Math.Abs(edge.h), 1e3)), s = edge.s + (shift * Math.Max(Math.Abs(edge.s), 1));
                    AnswersOrNamesALimit(s_water.FromPH(edge.p, h, default, out FluidState ph), StatePair.PH, edge.p, h, ph.h, 1e3);
                    AnswersOrNamesALimit(s_water.FromPS(edge.p, s, default, out FluidState ps), StatePair.PS, edge.p, s, ps.s, 1);
                }
            }
        }
    }

    [Fact]
    public void The_saturation_line_holds_in_ten_thousand_steps()
    {
        const int Steps = 10_000;
        double before = 0;
        for (int i = 0; i <= Steps; i++)
        {
            double T = Math.Min(Line((double)i / Steps, WaterConstants.Tt, WaterConstants.Tc), WaterConstants.Tc);
            string where = FormattableString.Invariant($"T={T:R}");
            Assert.True(s_water.FromTX(T, 0, out FluidState liquid) == Outcome.Ok, where);
            Assert.True(s_water.FromTX(T, 1, out FluidState vapour) == Outcome.Ok, where);
            Assert.True(liquid.p > before, where);
            before = liquid.p;
            Assert.True(liquid.h <= vapour.h && liquid.s <= vapour.s && liquid.v <= vapour.v, where);
            RoundTrip.Check(liquid, where, null);
            RoundTrip.Check(vapour, where, null);
            if (i == Steps || WaterConstants.Tc - T < 2e-4) continue;
            Assert.True(s_water.FromTX(T, 0.5, out FluidState middle) == Outcome.Ok, where);
            RoundTrip.Check(middle, where, null);
        }
    }

    // To 0.1 mK from the critical point: beyond it Eq. (28) has no two roots at the pressure of Eq. (30).
    [Fact]
    public void The_last_kelvin_to_the_critical_point_holds()
    {
        for (int i = 0; i <= 400; i++)
        {
            double T = WaterConstants.Tc - Math.Pow(10, -4 + (4 * i / 400.0));
            string where = FormattableString.Invariant($"T={T:R}");
            foreach (double x in (double[])[0, 0.2, 0.5, 0.8, 1])
            {
                Assert.True(s_water.FromTX(T, x, out FluidState at) == Outcome.Ok, where);
                RoundTrip.Check(at, where, null);
            }

            foreach (double off in (double[])[-1e-4, -1e-6, 1e-6, 1e-4])
                Assert.True(Step(SaturationLine.Pressure(T) * (1 + off), T) == 1, where);
        }
    }

    // The constants that people type: each pair of them inside the range is a state that goes round.
    [Fact]
    public void Exact_constants_are_inputs_like_any_other()
    {
        double[] pressures = [611.657, 611.213, 611.2127, 101325, 1e5, 4e6, 6.5467e6, 10e6, 16.5292e6, 16.5291643e6, 22.064e6, 50e6, 100e6];
        double[] temperatures = [273.15, 273.16, 300, 373.15, 500, 554.485, 623.15, 647.096, 650, 863.15, 1073.15, 1500, 2273.15];
        int inside = 0;
        foreach (double p in pressures)
        {
            foreach (double T in temperatures) inside += Step(p, T);
        }

        Assert.Equal((pressures.Length * temperatures.Length) - 2, inside); // 100 MPa ends at 1073.15 K
    }

    // R7-97(2012), Table 43: the stated greatest differences of h along the edges 1/3, 2/3 and 2/5, kJ/kg.
    [Theory]
    [InlineData(623.15, 16.6e6, 100e6, 31)]
    [InlineData(1073.15, 1e4, 50e6, 96)]
    public void Enthalpy_steps_at_an_edge_by_no_more_than_the_release_states(double edge, double pLow, double pHigh, double most)
    {
        for (int i = 0; i <= Posts; i++)
        {
            double p = Log((double)i / Posts, pLow, pHigh);
            Assert.InRange(Math.Abs(H(p, edge * (1 + 1e-12)) - H(p, edge)), 0, most);
        }
    }

    [Fact]
    public void Enthalpy_steps_at_B23_by_no_more_than_the_release_states()
    {
        for (int i = 1; i < Posts; i++)
        {
            double T = Line((double)i / Posts, 623.15, 863.15), p = Boundaries.pB23(T);
            Assert.InRange(Math.Abs(H(p, T * (1 + 1e-9)) - H(p, T * (1 - 1e-9))), 0, 134 + 1);
        }
    }

    [Fact]
    public void Enthalpy_and_entropy_rise_together_at_constant_pressure_inside_each_region()
    {
        for (int i = 0; i <= 60; i++)
        {
            double p = Log(i / 60.0, 1e3, 100e6);
            FluidState before = default;
            for (double T = 273.15; T <= (p <= 50e6 ? 2273.15 : 1073.15); T += 0.9173)
            {
                Assert.Equal(Outcome.Ok, s_water.FromPT(p, T, out FluidState at));
                if (before.p > 0) Assert.True(at.h > before.h && at.s > before.s, FormattableString.Invariant($"p={p:R} T={T:R}"));
                before = at;
            }
        }
    }

    private static double H(double p, double T)
    {
        Assert.Equal(Outcome.Ok, s_water.FromPT(p, T, out FluidState at));
        return at.h;
    }

    // One where the point lies inside and went round, zero where it lies outside and the limit is named.
    private static int Step(double p, double T)
    {
        Outcome outcome = s_water.FromPT(p, T, out _);
        if (outcome == Outcome.Ok)
        {
            RoundTrip.Check(p, T);
            return 1;
        }

        NamesALimit(outcome, StatePair.PT, p, T);
        return 0;
    }

    private static void AnswersOrNamesALimit(Outcome outcome, StatePair pair, double p, double given, double got, double scale)
    {
        if (outcome == Outcome.Ok) RoundTrip.Close(given, got, scale);
        else NamesALimit(outcome, pair, p, given);
    }

    private static void NamesALimit(Outcome outcome, StatePair pair, double first, double second)
    {
        Assert.NotEqual(Outcome.NotConverged, outcome);
        RangeViolation violation = s_water.Explain(outcome, pair, first, second);
        Assert.True(double.IsFinite(violation.Limit) && violation.Source.Length > 0);
    }

    private static IEnumerable<(double p, double T)> Around(double p, double T)
    {
        yield return (p, T);
        foreach (double near in (double[])[Math.BitIncrement(T), Math.BitDecrement(T), T + 1e-3, T - 1e-3, T * (1 + 1e-6), T * (1 - 1e-6)]) yield return (p, near);
        foreach (double near in (double[])[Math.BitIncrement(p), Math.BitDecrement(p), p * (1 + 1e-6), p * (1 - 1e-6)]) yield return (near, T);
    }

    private static double Line(double u, double low, double high) => low + (u * (high - low));

    private static double Log(double u, double low, double high) => Math.Min(low * Math.Pow(high / low, u), high);
}
