namespace FlowDuct.Fluids;

/// <summary>Why a pair of properties has no state: the quantity, its value, the limit crossed and where that limit comes from.</summary>
/// <param name="Symbol">The symbol of the quantity that is out of range, as in station lists (p, T, h, s, rho, x).</param>
/// <param name="Value">Its value, SI.</param>
/// <param name="Limit">The limit that was crossed, SI.</param>
/// <param name="IsUpper">True where the limit is a greatest value.</param>
/// <param name="Source">The publication that sets the limit, and a condition if one belongs to it.</param>
internal readonly record struct RangeViolation(string Symbol, double Value, double Limit, bool IsUpper, string Source);

/// <summary>The pairs from which a fluid computes a state.</summary>
internal enum StatePair
{
    /// <summary>Pressure and temperature.</summary>
    PT,

    /// <summary>Pressure and specific enthalpy.</summary>
    PH,

    /// <summary>Pressure and specific entropy.</summary>
    PS,

    /// <summary>Specific enthalpy and specific entropy.</summary>
    HS,

    /// <summary>Pressure and quality.</summary>
    PX,

    /// <summary>Temperature and quality.</summary>
    TX,

    /// <summary>Pressure and density.</summary>
    PRho,
}
