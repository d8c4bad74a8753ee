using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>The state behind a shock that stands square to the stream, on any equation of state.</summary>
/// <remarks>
/// Mass, momentum and energy are conserved (Rankine-Hugoniot relations; for constant heat capacity NACA Report 1135, 1953, eqs.
/// (91) to (100), numbers from memory). Momentum gives v2 and energy h2 from the one unknown, the rise of pressure; the equation
/// of state must agree. The rise of zero, where nothing happens, is divided out. A wet stream is one at equilibrium before and
/// behind the shock, and supersonic against the speed of sound of equilibrium.
/// </remarks>
internal static class NormalShock
{
    // Of the momentum flux: what a step of the equation of state (edges of regions) leaves open is no solution.
    private const double Balance = 1e-11;

    // Of v: what is left of a volume after two property calls.
    private const double VolumeRounding = 2e-14;

    // Of s: the closure of the inverses. A shock weaker than this keeps its entropy to rounding.
    private const double EntropyRounding = 1e-11;

    // Between the saturation lines of IAPWS-IF97 dh = T ds + v dp holds only to this part of v dp, because the saturation pressure is
    // an equation of its own: measured 5.2e-5 at most for qualities 0.1 to 0.9, 275 K to 635 K. It matters where M < 1.01 only.
    private const double WetGibbs = 1e-4;

    /// <summary>Finds the state and the velocity, m/s, behind a normal shock in a stream of velocity V, m/s.</summary>
    /// <returns>False where the stream is not supersonic, or the state behind lies outside the range of the fluid.</returns>
    internal static bool TryFind(Fluid fluid, in FluidState upstream, double V, out FluidState downstream, out double V2)
    {
        (downstream, V2) = (default, 0);
        if (!(V > upstream.w) || !double.IsFinite(V)) return false;
        var excess = new RayleighExcess(fluid, upstream, V / upstream.v);
        double top = Math.Min(excess.MostRise, fluid.GreatestPressure - upstream.p);
        if (!(top > 0)) return false;
        double atTop = excess.At(top);
        if (!(atTop > 0)) return false;
        double rise = Rise(ref excess, top, atTop, VolumeRounding * upstream.v);
        if (!excess.TryState(rise, out downstream, out double error) || !(Math.Abs(error) <= Balance)) return false;
        V2 = V / upstream.v * downstream.v;
        return downstream.s >= upstream.s - EntropySlack(upstream, rise);
    }

    private static double EntropySlack(in FluidState at, double rise)
    {
        double rounding = EntropyRounding * Math.Abs(at.s);
        return at.HasQuality ? rounding + (WetGibbs * at.v * rise / at.T) : rounding;
    }

    // The excess of a gas of constant heat capacity is a straight line, so the chord of the whole bracket comes close already.
    private static double Rise(ref RayleighExcess excess, double top, double atTop, double enough)
    {
        double atZero = excess.AtZero;
        if (!double.IsFinite(atTop)) return RootFinder.Find(ref excess, 0, top, atZero, atTop, enough);
        double chord = top * atZero / (atZero - atTop), atChord = excess.At(chord);
        if (atChord == 0) return chord;
        (double a, double fa) = atChord > 0 ? (0, atZero) : (top, atTop);
        double second = chord - (atChord * (chord - a) / (atChord - fa)), beyond = second + (second - chord);
        if (!(beyond > 0 && beyond < top)) return RootFinder.Find(ref excess, a, chord, fa, atChord, enough);
        double atBeyond = excess.At(beyond);
        return Math.Sign(atBeyond) != Math.Sign(atChord)
            ? RootFinder.Find(ref excess, beyond, chord, atBeyond, atChord, enough)
            : RootFinder.Find(ref excess, a, beyond, fa, atBeyond, enough);
    }
}
