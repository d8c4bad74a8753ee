using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>One oblique shock and the stream behind it; a Mach wave where the angle of turning is zero and nothing changes.</summary>
/// <param name="beta">Angle between the wave and the stream before it, rad.</param>
/// <param name="theta">Angle through which the stream turns, towards the wave, rad.</param>
/// <param name="state">The state behind.</param>
/// <param name="V">The velocity behind, m/s.</param>
internal readonly struct ObliqueWave(double beta, double theta, in FluidState state, double V)
{
    /// <summary>Angle between the wave and the stream before it, rad; pi/2 for a normal shock.</summary>
    internal readonly double Beta = beta;

    /// <summary>Angle through which the stream turns, towards the wave, rad.</summary>
    internal readonly double Theta = theta;

    /// <summary>The state behind.</summary>
    internal readonly FluidState State = state;

    /// <summary>The velocity behind, m/s; it may be supersonic.</summary>
    internal readonly double V = V;

    /// <summary>Mach number of the stream behind.</summary>
    internal double M => V / State.w;

    /// <summary>The wave too weak to change anything, at the Mach angle of a supersonic stream.</summary>
    internal static ObliqueWave Mach(in FluidState upstream, double V) => new(Math.Asin(upstream.w / V), 0, upstream, V);

    /// <summary>From both normal velocities and the tangential one, m/s, which a shock conserves.</summary>
    internal static ObliqueWave Of(double Vn1, double Vn2, double Vt, in FluidState behind) => new(
        Math.Atan2(Vn1, Vt), Math.Atan2(Vt * (Vn1 - Vn2), (Vt * Vt) + (Vn1 * Vn2)), behind, Math.Sqrt((Vt * Vt) + (Vn2 * Vn2)));
}
