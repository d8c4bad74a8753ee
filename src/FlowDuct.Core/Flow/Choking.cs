using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>Where the mass flux density on an isentrope is greatest: the state of a choked throat.</summary>
/// <remarks>
/// At constant total enthalpy d(V/v)/dp = 0 where V = w. At the saturation line w falls by a step, so the flux may peak there at
/// a kink, with V between the two speeds of sound.
/// </remarks>
internal static class Choking
{
    // Just inside the wet region: far above the closure of the inverses, far below any printed digit.
    private const double WetSide = 1 - 1e-9;

    /// <summary>Finds the throat of an isentrope that starts from rest at p0, Pa; false where none lies inside the range.</summary>
    internal static bool TryFind(Fluid fluid, double h0, double s, double p0, out FluidState throat, out bool atKink)
    {
        atKink = false;
        double Excess(double p) => fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok ? SonicExcess(at, h0) : double.NegativeInfinity;
        double top = p0;
        if (fluid.TrySaturationOnIsentrope(s, out FluidState edge) && edge.p < p0)
        {
            if (SonicExcess(edge, h0) <= 0) return Solve(fluid, s, Excess, edge.p, p0, out throat);
            throat = edge;
            atKink = true;
            top = edge.p * WetSide;
            if (!(Excess(top) > 0)) return fluid.FromPS(top, s, default, out _) == Outcome.Ok;
            atKink = false;
        }

        double low = top;
        while (Excess(low) > 0) low *= 0.85;
        return fluid.FromPS(low, s, default, out throat) == Outcome.Ok && Solve(fluid, s, Excess, low, top, out throat);
    }

    /// <summary>The subsonic pressure, Pa, at which the isentrope carries the flux G, kg/(m2.s), between p* and p0.</summary>
    internal static double SubsonicPressure(Fluid fluid, double h0, double s, double G, double pThroat, double p0)
    {
        double Excess(double p) => fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok ? (Energy.Velocity(h0, at.h) / at.v) - G : -G;
        return RootFinder.Find(Excess, pThroat, p0, Excess(pThroat), -G);
    }

    private static double SonicExcess(in FluidState at, double h0) => (at.w * at.w) - (2 * (h0 - at.h));

    private static bool Solve(Fluid fluid, double s, Func<double, double> excess, double low, double high, out FluidState throat)
    {
        double p = RootFinder.Find(excess, low, high, excess(low), excess(high));
        return fluid.FromPS(p, s, default, out throat) == Outcome.Ok;
    }
}
