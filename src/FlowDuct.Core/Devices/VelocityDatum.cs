using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>How the velocity at a station is known.</summary>
internal enum VelocityKind
{
    /// <summary>It is not: at rest, or to be found from a pair of pressures.</summary>
    None,

    /// <summary>V itself.</summary>
    Velocity,

    /// <summary>The Mach number.</summary>
    Mach,

    /// <summary>The mass flux density: flow through a known section.</summary>
    Flux,
}

/// <summary>A velocity that may depend on the state it belongs to.</summary>
internal readonly record struct VelocityDatum(VelocityKind Kind, double Value)
{
    /// <summary>The velocity at a state, m/s.</summary>
    internal double At(in FluidState state) => Kind switch
    {
        VelocityKind.Velocity => Value,
        VelocityKind.Mach => Value * state.w,
        VelocityKind.Flux => Value * state.v,
        _ => 0,
    };
}
