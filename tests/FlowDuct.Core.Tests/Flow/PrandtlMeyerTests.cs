using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Flow;

/// <summary>Expansion fans: NACA Report 1135, 1953, for constant heat capacity; additivity and weak shocks for real fluids.</summary>
public class PrandtlMeyerTests
{
    // What is promised of every angle, rad.
    private const double Accuracy = 1e-9;

    private static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows => ReferenceTable.Read("flow/prandtl_meyer_g14.csv");

    // From the sonic point; the columns hold twelve digits.
    [Fact]
    public void Turning_from_the_sonic_point_follows_the_table()
    {
        int printed = 0;
        foreach (IReadOnlyDictionary<string, string> row in Rows)
        {
            (Stream sonic, double p) = Expanded(Streams.Number(row, "M"));
            Assert.True(PrandtlMeyer.TryTurning(sonic.Fluid, sonic.h0, sonic.State.s, sonic.State.p, p, out double nu));
            double expected = Streams.Radians(Streams.Number(row, "nu_deg"));
            Assert.Equal(expected, nu, (1e-9 * expected) + 1e-14);
            sonic.Fluid.FromPS(p, sonic.State.s, default, out FluidState at);
            double mu = Streams.Degrees(ObliqueWave.Mach(at, Energy.Velocity(sonic.h0, at.h)).Beta);
            if (p < sonic.State.p) Assert.Equal(Streams.Number(row, "mu_deg"), mu, 1e-9 * mu);
            if (row["printed_nu_deg"].Length == 0) continue;
            Assert.True(Printed.Parse(row["printed_nu_deg"]).Agrees(Streams.Degrees(nu)));
            Assert.True(Printed.Parse(row["printed_mu_deg"]).Agrees(mu));
            printed++;
        }

        Assert.Equal(11, printed);
    }

    [Fact]
    public void An_angle_of_the_table_gives_the_pressure()
    {
        foreach (IReadOnlyDictionary<string, string> row in Rows.Where(r => Streams.Number(r, "M") is > 1 and < 15))
        {
            (Stream sonic, double p) = Expanded(Streams.Number(row, "M"));
            double nu = Streams.Radians(Streams.Number(row, "nu_deg"));
            Assert.True(PrandtlMeyer.TryPressure(sonic.Fluid, sonic.h0, sonic.State.s, sonic.State.p, nu, out double p2));
            Assert.Equal(p, p2, 1e-9 * p);
        }
    }

    [Fact]
    public void A_nudged_pressure_misses_the_table()
    {
        (Stream sonic, double p) = Expanded(2);
        Assert.True(PrandtlMeyer.TryTurning(sonic.Fluid, sonic.h0, sonic.State.s, sonic.State.p, p * (1 + 1e-7), out double nu));
        Assert.NotInRange(Streams.Degrees(nu), 26.3797608134 * (1 - 1e-9), 26.3797608134 * (1 + 1e-9));
    }

    [Fact]
    public void Turning_adds_up_over_a_split_path() => Gen.Select(Streams.All, Gen.Double[0.1, 0.9], Gen.Double[0.1, 0.9]).Each(
        draw =>
        {
            (Stream at, double part1, double part2) = draw;
            double p = at.State.p, between = p * part1, end = between * part2;
            if (!TryTurning(at, p, end, out double whole)) return;
            Assert.True(TryTurning(at, p, between, out double first), at.ToString());
            Assert.True(TryTurning(at, between, end, out double second), at.ToString());
            Assert.InRange(whole - first - second, -Accuracy, Accuracy);
            Assert.True(TryTurning(at, end, p, out double back) && back == -whole && whole > 0, at.ToString());
        },
        400);

    [Fact]
    public void The_pressure_of_a_turning_turns_as_asked() => Gen.Select(Streams.All, Gen.Double[0.001, 0.6]).Each(
        (at, nu) =>
        {
            if (!PrandtlMeyer.TryPressure(at.Fluid, at.h0, at.State.s, at.State.p, nu, out double p2)) return;
            Assert.True(TryTurning(at, at.State.p, p2, out double turned), at.ToString());
            Assert.True(Math.Abs(turned - nu) <= Accuracy, $"{at} {nu} {turned - nu}");
        },
        300);

    // Most of the cases above must lie inside the range, or they check little.
    [Fact]
    public void Most_streams_can_turn_by_a_tenth()
    {
        (int turned, int drawn) = (0, 0);
        Streams.All.Each(
            at =>
            {
                drawn++;
                if (PrandtlMeyer.TryPressure(at.Fluid, at.h0, at.State.s, at.State.p, 0.1, out _)) turned++;
            },
            100);
        Assert.InRange((double)turned / drawn, 0.6, 1);
    }

    // Shock and fan turn alike to the second order in strength (NACA Report 1135, 1953, from memory): ten times weaker, a thousand
    // times closer. Below 1e-10 rad the equations of state round.
    [Fact]
    public void A_weak_shock_turns_as_the_fan_does() => Streams.All.Where(at => at.M is > 1.3 and < 4).Each(
        at =>
        {
            double strong = Gap(at, 0.1), weak = Gap(at, 0.01);
            Assert.InRange(weak, 0, (strong / 500) + 1e-8);
            Assert.InRange(strong, 0, 1e-3);
        },
        200);

    // Superheated steam that reaches saturation inside the fan: the step of w turns nothing, each side integrates alone.
    [Fact]
    public void A_fan_across_the_saturation_line_is_the_sum_of_its_sides()
    {
        Stream at = Superheated();
        Assert.True(at.Fluid.TrySaturationOnIsentrope(at.State.s, out FluidState edge) && edge.p < at.State.p);
        Assert.True(TryTurning(at, at.State.p, 0.5 * edge.p, out double whole));
        Assert.True(TryTurning(at, at.State.p, edge.p * (1 + 1e-10), out double dry));
        Assert.True(TryTurning(at, edge.p * (1 - 1e-10), 0.5 * edge.p, out double wet));
        Assert.InRange(whole - dry - wet, -Accuracy, Accuracy);
        Assert.Equal(whole, BySteps(at, 0.5 * edge.p), 2e-6);
    }

    // Choked at the saturation line, the stream is supersonic on the wet side only: that is where the fan begins.
    [Fact]
    public void A_stream_choked_at_the_saturation_line_can_turn()
    {
        bool found = false;
        for (double p0 = 1e6; p0 < 2e6 && !found; p0 *= 1.01)
        {
            WaterFluid.Instance.FromPT(p0, 500, out FluidState rest);
            found = Choking.TryFind(WaterFluid.Instance, rest.h, rest.s, p0, out FluidState throat, out bool atKink) && atKink;
            if (!found) continue;
            Assert.True(PrandtlMeyer.TryTurning(WaterFluid.Instance, rest.h, rest.s, throat.p, 0.8 * throat.p, out double nu));
            Assert.InRange(nu, 0.001, 0.5);
        }

        Assert.True(found);
    }

    [Fact]
    public void A_subsonic_stream_does_not_turn()
    {
        Stream at = Streams.OfPerfectGas(0.99);
        Assert.False(TryTurning(at, at.State.p, 0.9 * at.State.p, out _));
        Stream fast = Streams.OfPerfectGas(1.2);
        Assert.False(TryTurning(fast, fast.State.p, 2 * fast.State.p, out _));
        Assert.False(TryTurning(fast, fast.State.p, 0, out _));
        Assert.False(TryTurning(fast, fast.State.p, double.NaN, out _));
        Assert.False(PrandtlMeyer.TryPressure(fast.Fluid, fast.h0, fast.State.s, fast.State.p, 2.3, out _));
        Assert.False(PrandtlMeyer.TryPressure(fast.Fluid, fast.h0, fast.State.s, fast.State.p, -0.1, out _));
    }

    // Table 25.4 of Abramowitz and Stegun, 1964, n = 16 (from memory).
    [Fact]
    public void Nodes_and_weights_are_those_of_the_handbook()
    {
        Assert.Equal(0.989400934991649932596, GaussLegendre.Nodes[0], 1e-15);
        Assert.Equal(0.027152459411754094852, GaussLegendre.Weights[0], 1e-15);
        Assert.Equal(0.095012509837637440185, GaussLegendre.Nodes[7], 1e-15);
        Assert.Equal(0.189450610455068496285, GaussLegendre.Weights[7], 1e-15);
    }

    private static bool TryTurning(Stream at, double p1, double p2, out double nu) =>
        PrandtlMeyer.TryTurning(at.Fluid, at.h0, at.State.s, p1, p2, out nu);

    private static Stream Superheated()
    {
        WaterFluid.Instance.FromPT(1e5, 390, out FluidState state);
        return new Stream(WaterFluid.Instance, state, 1.2);
    }

    // The same integral by the middle of many equal steps in ln p, without substitution and without a split.
    private static double BySteps(Stream at, double p2)
    {
        const int steps = 20_000;
        double sum = 0, step = Math.Log(at.State.p / p2) / steps;
        for (int i = 0; i < steps; i++)
        {
            at.Fluid.FromPS(at.State.p * Math.Exp(-step * (i + 0.5)), at.State.s, default, out FluidState here);
            double V2 = 2 * (at.h0 - here.h);
            sum += Math.Sqrt((V2 / (here.w * here.w)) - 1) * here.p * here.v / V2 * step;
        }

        return sum;
    }

    private static double Gap(Stream at, double strength)
    {
        double p2 = at.State.p * (1 + strength);
        bool found = ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, p2, out ObliqueWave wave);

        // Wet steam that dries on the way has a corner: no orders there.
        if (!found || wave.State.Phase != at.State.Phase || !TryTurning(at, at.State.p, p2, out double nu)) return 0;
        return Math.Abs(wave.Theta + nu);
    }

    // A sonic stream and the pressure at which it has reached M.
    private static (Stream Sonic, double p) Expanded(double M)
    {
        Stream sonic = Streams.OfPerfectGas(1);
        return (sonic, sonic.State.p * Math.Pow(1.2 / (1 + (0.2 * M * M)), 3.5));
    }
}
