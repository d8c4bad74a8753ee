namespace FlowDuct.Quantities;

/// <summary>The quantities a station list can give; the number is the slot in a <c>StationGivens</c>.</summary>
internal enum StationSymbol
{
    /// <summary>p, static pressure.</summary>
    Pressure,

    /// <summary>p0, stagnation pressure.</summary>
    StagnationPressure,

    /// <summary>T, static temperature.</summary>
    Temperature,

    /// <summary>T0, stagnation temperature.</summary>
    StagnationTemperature,

    /// <summary>h, static specific enthalpy.</summary>
    Enthalpy,

    /// <summary>h0, stagnation specific enthalpy.</summary>
    StagnationEnthalpy,

    /// <summary>s, specific entropy.</summary>
    Entropy,

    /// <summary>u, specific internal energy.</summary>
    InternalEnergy,

    /// <summary>v, specific volume (input only; the answer is density).</summary>
    SpecificVolume,

    /// <summary>rho, density.</summary>
    Density,

    /// <summary>x, vapour mass fraction.</summary>
    Quality,

    /// <summary>moisture, 1 - x.</summary>
    Moisture,

    /// <summary>superheat, T - Tsat(p).</summary>
    Superheat,

    /// <summary>subcooling, Tsat(p) - T.</summary>
    Subcooling,

    /// <summary>V, velocity.</summary>
    Velocity,

    /// <summary>M, Mach number.</summary>
    Mach,

    /// <summary>A, clear area normal to the flow, of one opening.</summary>
    Area,

    /// <summary>d, circular bore of one opening.</summary>
    Diameter,

    /// <summary>n, equal openings in parallel.</summary>
    Openings,

    /// <summary>dp, inlet static pressure minus this static pressure.</summary>
    PressureDrop,

    /// <summary>rise, this static pressure minus inlet static pressure.</summary>
    PressureRise,

    /// <summary>p/p0, this static pressure over inlet stagnation pressure.</summary>
    PressureOverInletStagnation,

    /// <summary>p/p1, this static pressure over inlet static pressure.</summary>
    PressureOverInlet,

    /// <summary>z, height above the inlet datum.</summary>
    Elevation,

    /// <summary>altitude above mean sea level (ambient only).</summary>
    Altitude,

    /// <summary>rect, width x height of a rectangular section; the first side diverges.</summary>
    Rectangle,

    /// <summary>annulus, outer x inner diameter of a ring.</summary>
    Annulus,

    /// <summary>beta, this diameter over inlet diameter.</summary>
    DiameterRatio,

    /// <summary>humidity, partial over saturation pressure of water vapour (humid-air).</summary>
    Humidity,

    /// <summary>dew-point at the static pressure of the station (humid-air).</summary>
    DewPoint,

    /// <summary>humidity-ratio, water vapour over dry air by mass (humid-air).</summary>
    HumidityRatio,
}
