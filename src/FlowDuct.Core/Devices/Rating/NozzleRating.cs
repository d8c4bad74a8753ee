using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>Why a nozzle could not be rated.</summary>
internal enum RatingOutcome
{
    /// <summary>Rated.</summary>
    Ok,

    /// <summary>The back pressure is above the stagnation pressure: the flow would turn round.</summary>
    Reversed,

    /// <summary>No throat lies inside the range of the fluid.</summary>
    NoThroat,

    /// <summary>The expansion leaves the range of the fluid before it reaches the exit.</summary>
    OutsideRange,

    /// <summary>So great a loss leaves no supersonic flow in this exit area.</summary>
    TooGreatALoss,

    /// <summary>A held phase gives way where no steady stream goes on: slower than sound in the throat, or across the exit plane.</summary>
    InsideReversion,

    /// <summary>A bracketed search did not close: a defect, reported as such.</summary>
    NotConverged,
}

/// <summary>The three back pressures that part the regimes, Pa; null where the range of the fluid hides one, or it has no meaning.</summary>
internal readonly record struct BackPressureLimits(double? Subsonic, double? ShockAtExit, double? FullExpansion);

/// <summary>A normal shock: both sides and where it stands.</summary>
internal readonly record struct ShockAnswer(FluidState Upstream, double V1, FluidState Downstream, double V2, double AreaRatio);

/// <summary>A nozzle of given areas at a given back pressure.</summary>
internal readonly record struct NozzleRating
{
    internal Regime Regime { get; init; }

    /// <summary>Mass flow, kg/s.</summary>
    internal double MassFlow { get; init; }

    /// <summary>Isentropic flow of the throat at this back pressure, kg/s; the discharge coefficient refers to it.</summary>
    internal double IsentropicFlow { get; init; }

    /// <summary>The state in the exit plane.</summary>
    internal FluidState Exit { get; init; }

    internal double ExitVelocity { get; init; }

    /// <summary>The state in the throat of a divergent nozzle.</summary>
    internal FluidState Throat { get; init; }

    internal double ThroatVelocity { get; init; }

    /// <summary>Pressure of the choked throat, Pa.</summary>
    internal double CriticalPressure { get; init; }

    /// <summary>True where the flux is greatest where the flow meets saturation, not where M = 1.</summary>
    internal bool AtKink { get; init; }

    internal bool Choked { get; init; }

    internal BackPressureLimits Limits { get; init; }

    internal ShockAnswer? Shock { get; init; }
}
