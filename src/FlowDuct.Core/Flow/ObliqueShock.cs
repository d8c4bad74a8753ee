using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>Plane oblique shocks on any equation of state: a normal shock for the normal component, the tangential one conserved.</summary>
/// <remarks>
/// For constant heat capacity NACA Report 1135, 1953, section on oblique shock waves. Angles are in radians. Every member returns
/// false where the stream is not supersonic, where no attached shock of that kind exists, or where the state behind lies outside
/// the range of the fluid.
/// </remarks>
internal static class ObliqueShock
{
    // Of the angle asked for: what a step of the equation of state leaves open is no solution.
    private const double AngleClosure = 1e-9;

    /// <summary>The shock at an angle beta to the stream, from above the Mach angle to pi/2.</summary>
    internal static bool TryAtAngle(Fluid fluid, in FluidState upstream, double V, double beta, out ObliqueWave wave)
    {
        wave = default;
        if (!(beta > 0 && beta <= Math.PI / 2)) return false;
        (double sin, double cos) = Math.SinCos(beta);
        if (!NormalShock.TryFind(fluid, upstream, V * sin, out FluidState behind, out double Vn2)) return false;
        wave = ObliqueWave.Of(V * sin, Vn2, V * cos, behind);
        return true;
    }

    /// <summary>The shock that brings the stream to p2, Pa: the one at the lip of an overexpanded nozzle.</summary>
    /// <returns>False too where p2 is below the pressure of the stream, or above that behind a normal shock.</returns>
    internal static bool TryToPressure(Fluid fluid, in FluidState upstream, double V, double p2, out ObliqueWave wave)
    {
        wave = V > upstream.w ? ObliqueWave.Mach(upstream, V) : default;
        if (!(V > upstream.w) || !double.IsFinite(V) || !(p2 >= upstream.p)) return false;
        if (p2 == upstream.p) return true;
        if (!HugoniotExcess.TryVolume(fluid, upstream, p2, out FluidState behind)) return false;
        double Vn1 = upstream.v * Math.Sqrt((p2 - upstream.p) / (upstream.v - behind.v));
        double Vt2 = (V - Vn1) * (V + Vn1);
        if (!(Vt2 >= -1e-12 * V * V)) return false;
        wave = ObliqueWave.Of(Vn1, Vn1 * behind.v / upstream.v, Math.Sqrt(Math.Max(0, Vt2)), behind);
        return true;
    }

    /// <summary>The shock of the largest deflection: a body or a wall that turns more has a detached one.</summary>
    internal static bool TryLargestDeflection(Fluid fluid, in FluidState upstream, double V, out ObliqueWave wave)
    {
        wave = default;
        if (!(V > upstream.w) || !double.IsFinite(V)) return false;
        var slope = new DeflectionSlope(fluid, upstream, V);
        double low = Math.Asin(upstream.w / V), high = Math.PI / 2;
        double beta = RootFinder.Find(ref slope, low, high, slope.AtMachAngle, slope.At(high));
        return TryAtAngle(fluid, upstream, V, beta, out wave) && TryAtAngle(fluid, upstream, V, Math.Min(beta + 1e-8, high), out _);
    }

    /// <summary>The weaker of the two shocks that turn the stream by theta; the Mach wave where theta is zero.</summary>
    internal static bool TryWeak(Fluid fluid, in FluidState upstream, double V, double theta, out ObliqueWave wave)
    {
        if (!TryLargestDeflection(fluid, upstream, V, out wave) || !(theta >= 0 && theta <= wave.Theta)) return false;
        double least = Math.Asin(upstream.w / V);
        if (theta > 0) return TryTurning(fluid, upstream, V, theta, least, -theta, ref wave);
        wave = ObliqueWave.Mach(upstream, V);
        return true;
    }

    /// <summary>The stronger of the two shocks that turn the stream by theta; the normal shock where theta is zero.</summary>
    internal static bool TryStrong(Fluid fluid, in FluidState upstream, double V, double theta, out ObliqueWave wave)
    {
        if (!TryLargestDeflection(fluid, upstream, V, out wave) || !(theta >= 0 && theta <= wave.Theta)) return false;
        if (theta == 0) return TryAtAngle(fluid, upstream, V, Math.PI / 2, out wave);
        return TryTurning(fluid, upstream, V, theta, Math.PI / 2, -theta, ref wave);
    }

    // Between the shock of the largest deflection, which wave holds, and the far end of its branch.
    private static bool TryTurning(
        Fluid fluid, in FluidState upstream, double V, double theta, double end, double atEnd, ref ObliqueWave wave)
    {
        if (theta == wave.Theta) return true;
        var excess = new DeflectionExcess(fluid, upstream, V, theta);
        double beta = RootFinder.Find(ref excess, wave.Beta, end, wave.Theta - theta, atEnd);
        return TryAtAngle(fluid, upstream, V, beta, out wave) && Math.Abs(wave.Theta - theta) <= AngleClosure;
    }
}
