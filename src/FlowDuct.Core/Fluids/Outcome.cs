namespace FlowDuct.Fluids;

/// <summary>How a property call ended. Anything but <see cref="Ok"/> means that the state was not computed.</summary>
internal enum Outcome
{
    /// <summary>The state is valid.</summary>
    Ok,

    /// <summary>Pressure below the least of the formulation.</summary>
    PressureTooLow,

    /// <summary>Pressure above the greatest of the formulation (at this temperature).</summary>
    PressureTooHigh,

    /// <summary>Temperature below the least of the formulation.</summary>
    TemperatureTooLow,

    /// <summary>Temperature above the greatest of the formulation.</summary>
    TemperatureTooHigh,

    /// <summary>The pair lies outside, on the side of too little enthalpy, entropy or too high density.</summary>
    PairTooLow,

    /// <summary>The pair lies outside, on the side of too much enthalpy, entropy or too low density.</summary>
    PairTooHigh,

    /// <summary>The fluid has no saturation line, or none at this pressure or temperature.</summary>
    NoSaturation,

    /// <summary>Between the bubble and the dew line of a mixture that is taken as one pure fluid: no state there.</summary>
    BetweenPhases,

    /// <summary>Quality outside 0 to 1.</summary>
    QualityOutsideRange,

    /// <summary>A bracketed solve did not reach its tolerance: a defect, reported as such.</summary>
    NotConverged,
}
