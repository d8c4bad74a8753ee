using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>What is known at one station. What cannot be known from what was given is null.</summary>
internal sealed record StationAnswer
{
    /// <summary>The static state. Of a reading on the saturation line only p and T are known, and its phase is None.</summary>
    internal required FluidState State { get; init; }

    /// <summary>Velocity, m/s.</summary>
    internal double? Velocity { get; init; }

    /// <summary>Height above the inlet datum, m.</summary>
    internal double Elevation { get; init; }

    /// <summary>Area of one opening, m2.</summary>
    internal double? Area { get; init; }

    /// <summary>Equal openings in parallel.</summary>
    internal double Openings { get; init; } = 1;

    /// <summary>The stagnation state; null where it lies outside the formulation or cannot be known.</summary>
    internal FluidState? Stagnation { get; init; }

    /// <summary>True where the whole static state is known.</summary>
    internal bool HasState => State.Phase != Phase.None;

    internal double? Mach => HasState && State.w > 0 ? Velocity / State.w : null;

    /// <summary>Bore of the circle with this area, m.</summary>
    internal double? Diameter => Area is double A ? Math.Sqrt(4 * A / Math.PI) : null;

    /// <summary>Kinetic energy of the stream over that of its mean velocity; 1 of a uniform one.</summary>
    internal double KineticEnergyCoefficient { get; init; } = 1;

    internal double? StagnationEnthalpy => HasState && Velocity is double V ? State.h + (KineticEnergyCoefficient * V * V / 2) : null;

    /// <summary>Mass flux density, kg/(m2.s).</summary>
    internal double? Flux => HasState ? Velocity / State.v : null;

    /// <summary>A station from its state and velocity, with the stagnation state where the formulation holds it.</summary>
    internal static StationAnswer From(Fluid fluid, in FluidState state, double V, double kineticEnergyCoefficient = 1)
    {
        bool known = Flow.Stagnation.Of(fluid, state, V * Math.Sqrt(kineticEnergyCoefficient), out FluidState stagnation) == Outcome.Ok;
        return new StationAnswer { State = state, Velocity = V, KineticEnergyCoefficient = kineticEnergyCoefficient, Stagnation = known ? stagnation : null };
    }

    /// <summary>The same station with the area that carries a mass flow, kg/s.</summary>
    internal StationAnswer Carrying(double? massFlow) =>
        Area is null && Flux is double G && G > 0 ? this with { Area = massFlow / G / Openings } : this;
}
