using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>How an oblique shock may come back from a wall or a plane of symmetry.</summary>
internal enum ReflectionKind
{
    /// <summary>Only as a second oblique shock.</summary>
    Regular,

    /// <summary>As a second oblique shock or as a Mach stem, depending on how the flow came about.</summary>
    Either,

    /// <summary>Only with a Mach stem: a normal shock stands at the wall.</summary>
    Mach,
}

/// <summary>Whether an oblique shock can be reflected as one: the stream behind it must turn back by the same angle.</summary>
/// <remarks>
/// J. von Neumann, Oblique Reflection of Shocks, Explosives Research Report 12, Navy Department, 1943; G. Ben-Dor, Shock Wave
/// Reflection Phenomena, 2007, section 1.5 (both from memory). For plane flow; at the axis of a round nozzle the stem always
/// exists and may be small.
/// </remarks>
internal static class ShockReflection
{
    /// <summary>The criterion of detachment: theta is at most the largest deflection of the stream behind the incident shock.</summary>
    internal static bool RegularReflectionPossible(Fluid fluid, in ObliqueWave incident) =>
        ObliqueShock.TryLargestDeflection(fluid, incident.State, incident.V, out ObliqueWave most) && incident.Theta <= most.Theta;

    /// <summary>Both criteria: detachment, and that of von Neumann, where the reflected shock ends at the pressure behind the stem.</summary>
    /// <returns>False where the normal shock of the stream lies outside the range of the fluid.</returns>
    internal static bool TryKind(Fluid fluid, in FluidState upstream, double V, in ObliqueWave incident, out ReflectionKind kind)
    {
        kind = ReflectionKind.Mach;
        if (!NormalShock.TryFind(fluid, upstream, V, out FluidState stem, out _)) return false;
        if (!ObliqueShock.TryWeak(fluid, incident.State, incident.V, incident.Theta, out ObliqueWave reflected)) return true;
        kind = reflected.State.p < stem.p ? ReflectionKind.Regular : ReflectionKind.Either;
        return true;
    }
}
