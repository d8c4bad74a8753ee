using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Flow;

/// <summary>Normal shocks: NACA Report 1135, 1953, for constant heat capacity; the balances and the weak limit for real fluids.</summary>
public class NormalShockTests
{
    // Of the flux of momentum, of total enthalpy and of s; 1e-10 is the promise, s may round.
    private const double Balance = 1e-10;
    private const double EntropyRounding = 1e-11;

    // The computed columns hold twelve digits; each ratio must return them to 1e-9.
    [Fact]
    public void A_shock_follows_the_table()
    {
        int printed = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/normal_shock_g14.csv").Skip(1))
        {
            (Stream at, FluidState behind, double M2, double ptRatio, double pitot) = Behind(Streams.Number(row, "M1"));
            Near(row, "M2", M2);
            Near(row, "p2_p1", behind.p / at.State.p);
            Near(row, "rho2_rho1", behind.rho / at.State.rho);
            Near(row, "T2_T1", behind.T / at.State.T);
            Near(row, "pt2_pt1", ptRatio);
            Near(row, "p1_pt2", pitot);
            if (row["printed_M2"].Length == 0) continue;
            Rounds(row, "printed_M2", M2);
            Rounds(row, "printed_p2_p1", behind.p / at.State.p);
            Rounds(row, "printed_T2_T1", behind.T / at.State.T);
            Rounds(row, "printed_pt2_pt1", ptRatio);
            printed++;
        }

        Assert.Equal(16, printed);
    }

    [Fact]
    public void The_table_is_missed_by_a_nudged_stream()
    {
        IReadOnlyDictionary<string, string> row = ReferenceTable.Read("flow/normal_shock_g14.csv").First(r => r["M1"] == "2");
        (_, _, double M2, _, _) = Behind(2 * (1 + 1e-8));
        Assert.NotInRange(M2 / Streams.Number(row, "M2"), 1 - 1e-9, 1 + 1e-9);
    }

    [Theory]
    [InlineData(0.5)]
    [InlineData(1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void No_shock_without_a_supersonic_stream(double M) =>
        Assert.False(NormalShock.TryFind(Streams.Perfect, Streams.OfPerfectGas(1).State, M * Streams.OfPerfectGas(1).State.w, out _, out _));

    // 300 K and M = 20 leads past the 6000 K of the fit; 900 bar cannot be doubled inside the 1000 bar of the release.
    [Fact]
    public void No_shock_where_the_state_behind_lies_outside_the_range()
    {
        GasCatalogue.Air.FromPT(1e4, 300, out FluidState air);
        Assert.False(NormalShock.TryFind(GasCatalogue.Air, air, 20 * air.w, out _, out _));
        Assert.True(NormalShock.TryFind(GasCatalogue.Air, air, 10 * air.w, out _, out _));
        WaterFluid.Instance.FromPT(90e6, 900, out FluidState steam);
        Assert.False(NormalShock.TryFind(WaterFluid.Instance, steam, 1.5 * steam.w, out _, out _));
    }

    [Fact]
    public void Balances_close_in_air() => Streams.Air.Each(CheckLaws, 5000);

    [Fact]
    public void Balances_close_in_steam() => Streams.Steam.Each(CheckLaws, 3000);

    [Fact]
    public void Balances_close_in_wet_steam() => Streams.WetSteam.Each(CheckLaws, 3000);

    // Wet steam dries in a strong shock and stays wet in a weak one: both must be among the cases.
    [Fact]
    public void A_shock_in_wet_steam_dries_it_or_not()
    {
        int dry = 0, wet = 0;
        Streams.WetSteam.Each(
            at =>
            {
                Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out _));
                if (behind.Phase == Phase.Wet) wet++;
                else dry++;
            },
            500);
        Assert.True(dry > 50 && wet > 50, $"{dry} {wet}");
    }

    // T ds = (d2v/dp2)_s (p2 - p1)^3/12: L. D. Landau and E. M. Lifshitz, Fluid Mechanics, 1987, section 86 (from memory). What is
    // left out is one power of M - 1 more, with a factor of a few; a power of two in place of three would give 4 instead of 8.
    [Fact]
    public void Entropy_of_a_weak_shock_is_cubic_in_its_strength() => Streams.All.Each(
        at =>
        {
            if (Slope(at.Fluid, at.State, 0.01) is not double curvature) return;
            double rise = Rise(at, 1.01, out double strength), cubic = curvature * Math.Pow(strength, 3) / (12 * at.State.T);
            Assert.InRange(rise / cubic, 0.9, 1.1);
            Assert.InRange(Rise(at, 1.02, out _) / rise, 7.2, 8.8);
        },
        500);

    [Fact]
    public void A_nudged_state_breaks_the_balances()
    {
        Stream at = Streams.OfPerfectGas(3);
        Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out double V2));
        Assert.True(Closes(at, behind, V2));
        Assert.False(Closes(at, behind, V2 * (1 + 1e-9)));
        at.Fluid.FromPT(behind.p * (1 + 1e-9), behind.T, out FluidState nudged);
        Assert.False(Closes(at, nudged, V2));
    }

    [Fact]
    public void A_shock_allocates_nothing()
    {
        GasCatalogue.Air.FromPT(1e5, 300, out FluidState air);
        NormalShock.TryFind(GasCatalogue.Air, air, 2 * air.w, out _, out _);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++) NormalShock.TryFind(GasCatalogue.Air, air, 2 * air.w, out _, out _);
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
    }

    private static void CheckLaws(Stream at)
    {
        Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out double V2), at.ToString());
        Assert.True(Closes(at, behind, V2), at.ToString());
        Assert.True(behind.s >= at.State.s - Slack(at, behind.p), at.ToString());
        Assert.True(at.M < 1.005 || behind.s > at.State.s, at.ToString());
        Assert.True(V2 < behind.w && behind.p > at.State.p, at.ToString());
    }

    // IAPWS-IF97 keeps dh = T ds + v dp between the saturation lines to 2e-5 of v dp for the qualities drawn here (measured), since its
    // saturation pressure is an equation of its own; a weak shock raises entropy by less than that.
    private static double Slack(Stream at, double p2)
    {
        double rounding = EntropyRounding * at.State.s;
        return at.State.HasQuality ? rounding + (2e-5 * at.State.v * (p2 - at.State.p) / at.State.T) : rounding;
    }

    private static bool Closes(Stream at, in FluidState behind, double V2)
    {
        double flux = at.V * at.State.rho, momentum = at.State.p + (flux * at.V), h0 = at.State.h + (at.V * at.V / 2);
        return Math.Abs((V2 * behind.rho / flux) - 1) < Balance
            && Math.Abs(((behind.p + (behind.rho * V2 * V2)) / momentum) - 1) < Balance
            && Math.Abs(((behind.h + (V2 * V2 / 2)) / h0) - 1) < Balance;
    }

    // (d2v/dp2)_s by differences; none where the three states are not of one phase.
    private static double? Slope(Fluid fluid, in FluidState at, double step)
    {
        double dp = step * at.p;
        bool found = fluid.FromPS(at.p - dp, at.s, at, out FluidState below) == Outcome.Ok;
        if (!found || fluid.FromPS(at.p + (6 * dp), at.s, at, out FluidState far) != Outcome.Ok) return null;
        if (below.Phase != at.Phase || far.Phase != at.Phase) return null;
        fluid.FromPS(at.p + dp, at.s, at, out FluidState above);
        return (above.v - (2 * at.v) + below.v) / (dp * dp);
    }

    private static double Rise(Stream at, double M, out double strength)
    {
        Assert.True(NormalShock.TryFind(at.Fluid, at.State, M * at.State.w, out FluidState behind, out _), at.ToString());
        strength = behind.p - at.State.p;
        return behind.s - at.State.s;
    }

    private static (Stream At, FluidState Behind, double M2, double PtRatio, double Pitot) Behind(double M)
    {
        Stream at = Streams.OfPerfectGas(M);
        Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out double V2));
        Stagnation.Of(at.Fluid, at.State, at.V, out FluidState total1);
        Stagnation.Of(at.Fluid, behind, V2, out FluidState total2);
        return (at, behind, V2 / behind.w, total2.p / total1.p, at.State.p / total2.p);
    }

    private static void Near(IReadOnlyDictionary<string, string> row, string column, double computed) =>
        Assert.Equal(Streams.Number(row, column), computed, 1e-9 * Streams.Number(row, column));

    private static void Rounds(IReadOnlyDictionary<string, string> row, string column, double computed) =>
        Assert.True(Printed.Parse(row[column]).Agrees(computed), $"{column} at {row["M1"]}: {computed}");
}
