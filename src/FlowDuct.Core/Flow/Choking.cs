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

    // (V/w)^2 - 1 keeps no more digits; the flux, being greatest there, changes by its square.
    private const double SonicClosure = 4e-14;
    private const int MostQuickSteps = 12;

    /// <summary>Finds the throat of an isentrope that starts from rest at p0, Pa; false where none lies inside the range.</summary>
    internal static bool TryFind(Fluid fluid, double h0, double s, double p0, out FluidState throat, out bool atKink)
    {
        atKink = false;
        return TryQuick(fluid, h0, s, p0, out throat) || TryThorough(fluid, h0, s, p0, out throat, out atKink);
    }

    /// <summary>The same from the state at rest, which saves asking for it.</summary>
    internal static bool TryFind(Fluid fluid, in FluidState rest, out FluidState throat, out bool atKink)
    {
        atKink = false;
        throat = rest;
        return Secant(fluid, rest.h, rest.s, rest.p, ref throat) || TryThorough(fluid, rest.h, rest.s, rest.p, out throat, out atKink);
    }

    /// <summary>The subsonic pressure, Pa, at which the isentrope carries the flux G, kg/(m2.s), between p* and p0.</summary>
    internal static double SubsonicPressure(Fluid fluid, double h0, double s, double G, double pThroat, double p0)
    {
        var excess = new FluxExcess(fluid, h0, s, G);
        return RootFinder.Find(ref excess, pThroat, p0, excess.At(pThroat), -G);
    }

    // One phase from rest to throat: secant in ln p from the throat of a gas of constant isentropic exponent.
    private static bool TryQuick(Fluid fluid, double h0, double s, double p0, out FluidState throat)
    {
        return fluid.FromPS(p0, s, default, out throat) == Outcome.Ok && Secant(fluid, h0, s, p0, ref throat);
    }

    // Starts with the exponent of a state of the phase in which the throat is looked for.
    private static bool Secant(Fluid fluid, double h0, double s, double p0, ref FluidState throat)
    {
        bool wet = throat.Phase == Phase.Wet, vapour = throat.Phase is Phase.Gas or Phase.SuperheatedVapour or Phase.Supercritical;
        double kappa = throat.kappa;
        if (!(wet || vapour) || !(kappa is > 1.01 and < 3)) return false;
        double x = Math.Log(p0) + (kappa / (kappa - 1) * Math.Log(2 / (kappa + 1))), before = 0, step = 0;
        for (int i = 0; i < MostQuickSteps; i++)
        {
            if (fluid.FromPS(Math.Exp(x), s, throat, out throat) != Outcome.Ok) return false;
            if (wet ? throat.Phase != Phase.Wet : throat.Phase is not (Phase.Gas or Phase.SuperheatedVapour or Phase.Supercritical)) return false;
            double w2 = throat.w * throat.w, excess = SonicExcess(throat, h0) / w2;
            if (Math.Abs(excess) <= SonicClosure) return true;

            // w^2 of such a gas changes by (kappa - 1)/kappa of itself, the kinetic energy by v dp.
            double slope = i == 0 || step == 0 ? ((kappa - 1) / kappa) + (2 / kappa) : (excess - before) / step;
            double next = -excess / slope;
            if (!(Math.Abs(next) < 0.3)) return false;
            if (Math.Abs(next) <= 2e-15) return Math.Abs(excess) <= 20 * SonicClosure;
            (before, step) = (excess, next);
            x += next;
        }

        return false;
    }

    private static bool TryThorough(Fluid fluid, double h0, double s, double p0, out FluidState throat, out bool atKink)
    {
        atKink = false;
        var excess = new Excess(fluid, h0, s);
        if (!fluid.TrySaturationOnIsentrope(s, out FluidState edge) || !(edge.p < p0)) return Below(fluid, h0, s, p0, p0, excess, out throat);
        if (SonicExcess(edge, h0) <= 0) return Solve(fluid, s, excess, edge.p, p0, out throat);
        throat = edge;
        atKink = true;
        double top = edge.p * WetSide;
        if (!(excess.At(top) > 0)) return fluid.FromPS(top, s, default, out _) == Outcome.Ok;

        // Still slower than sound behind the line: the flux grows on, but where it fell by a step there it may not make up for that.
        if (!Below(fluid, h0, s, p0, top, excess, out FluidState wet)) return false;
        atKink = Flux(wet, h0) < Flux(edge, h0);
        if (!atKink) throat = wet;
        return true;
    }

    // A throat below a pressure at which the flow is slower than sound.
    private static bool Below(Fluid fluid, double h0, double s, double p0, double top, Excess excess, out FluidState throat)
    {
        if (top < p0 && fluid.FromPS(top, s, default, out throat) == Outcome.Ok && Secant(fluid, h0, s, p0, ref throat)) return true;
        double low = top;
        while (excess.At(low) > 0) low *= 0.85;
        if (fluid.FromPS(low, s, default, out throat) != Outcome.Ok) low = LastInRange(fluid, s, Math.Min(top, low / 0.85), low);
        return excess.At(low) <= 0 && Solve(fluid, s, excess, low, top, out throat);
    }

    // Apart from its caller: what it captures is allocated only where the range ends.
    private static double LastInRange(Fluid fluid, double s, double inside, double outside) =>
        RangeEdge.Find(p => fluid.FromPS(p, s, default, out _) == Outcome.Ok, inside, outside);

    private static double Flux(in FluidState at, double h0) => Energy.Velocity(h0, at.h) / at.v;

    private static double SonicExcess(in FluidState at, double h0) => (at.w * at.w) - (2 * (h0 - at.h));

    private static bool Solve(Fluid fluid, double s, Excess excess, double low, double high, out FluidState throat)
    {
        double p = RootFinder.Find(ref excess, low, high, excess.At(low), excess.At(high));
        return fluid.FromPS(p, s, default, out throat) == Outcome.Ok;
    }

    private readonly struct Excess(Fluid fluid, double h0, double s) : IScalarFunction
    {
        public double At(double p) => fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok ? SonicExcess(at, h0) : double.NegativeInfinity;
    }

    private readonly struct FluxExcess(Fluid fluid, double h0, double s, double G) : IScalarFunction
    {
        public double At(double p) => fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok ? Flux(at, h0) - G : -G;
    }
}
