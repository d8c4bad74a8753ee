using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Support;

/// <summary>A state of water through every pair of inputs and back.</summary>
internal static class RoundTrip
{
    private static readonly WaterFluid s_water = WaterFluid.Instance;

    /// <summary>Closure in the pair that was given, 1e-11, relative or to a scale below which values pass through zero.</summary>
    internal static void Close(double expected, double actual, double scale) =>
        Assert.InRange(Math.Abs(actual - expected) / Math.Max(Math.Abs(expected), scale), 0, 1e-11);

    internal static void Check(double p, double T)
    {
        string where = FormattableString.Invariant($"p={p:R} T={T:R}");
        Assert.True(s_water.FromPT(p, T, out FluidState at) == Outcome.Ok, where);
        Check(at, where, T);
    }

    /// <summary>The same from a state; T null where the state is wet or saturated and p fixes the temperature.</summary>
    internal static void Check(in FluidState at, string where, double? T)
    {
        Closes(s_water.FromPH(at.p, at.h, default, out FluidState ph), "p, h", where);
        Close(at.h, ph.h, 1e3);
        Closes(s_water.FromPS(at.p, at.s, default, out FluidState ps), "p, s", where);
        Close(at.s, ps.s, 1);
        Closes(s_water.FromHS(at.h, at.s, default, out FluidState hs), "h, s", where);
        Close(at.h, hs.h, 1e3);
        Close(at.s, hs.s, 1);
        Closes(s_water.FromPRho(at.p, at.rho, out FluidState pv), "p, rho", where);
        Close(at.rho, pv.rho, 1);

        // Where regions overlap the cooler one answers: 0.142 J/(kg.K) at the edge of 2 and 5 (R7-97, Table 43) times T/cp is 0.07 K.
        if (T is double given) Assert.True(Math.Abs(ph.T - given) < 0.07 && Math.Abs(ps.T - given) < 0.07, $"{where}: from p, h {ph.T:R} K, from p, s {ps.T:R} K");
        foreach (FluidState back in (FluidState[])[ph, ps, hs, pv])
            Assert.True(double.IsFinite(back.w) && back.w > 0 && double.IsFinite(back.T) && double.IsFinite(back.v), $"{where}: w={back.w} T={back.T}");
    }

    private static void Closes(Outcome outcome, string pair, string where) => Assert.True(outcome == Outcome.Ok, $"{where}: ({pair}) {outcome}");
}
