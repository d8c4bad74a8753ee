namespace FlowDuct.Quantities;

/// <summary>The kind of quantity a unit measures. Values of different kinds never mix, also where their SI unit is the same.</summary>
internal enum Dimension
{
    /// <summary>A ratio; unit 1 or %.</summary>
    Ratio,

    /// <summary>A whole number.</summary>
    Count,

    /// <summary>Absolute pressure, Pa; a gauge reading becomes one with the ambient pressure.</summary>
    Pressure,

    /// <summary>Difference of two pressures, Pa.</summary>
    PressureDifference,

    /// <summary>Thermodynamic temperature, K.</summary>
    Temperature,

    /// <summary>Difference of two temperatures, K; never shifted by an offset.</summary>
    TemperatureDifference,

    /// <summary>Energy per mass, J/kg.</summary>
    SpecificEnergy,

    /// <summary>Entropy or heat capacity per mass, J/(kg.K).</summary>
    SpecificEntropy,

    /// <summary>Volume per mass, m3/kg.</summary>
    SpecificVolume,

    /// <summary>Mass per volume, kg/m3.</summary>
    Density,

    /// <summary>Velocity, m/s.</summary>
    Velocity,

    /// <summary>Length, m.</summary>
    Length,

    /// <summary>Area, m2.</summary>
    Area,

    /// <summary>Mass flow rate, kg/s.</summary>
    MassFlow,

    /// <summary>Volume flow rate at inlet static conditions, m3/s.</summary>
    VolumeFlow,

    /// <summary>Volume flow rate of ideal gas at 0 degC, 101.325 kPa (DIN 1343), m3/s.</summary>
    NormalVolumeFlow,

    /// <summary>Volume flow rate of ideal gas at 15 degC, 101.325 kPa (ISO 13443), m3/s.</summary>
    StandardVolumeFlow,

    /// <summary>Volume flow rate of ideal gas at a reference state that is given beside it, m3/s.</summary>
    ReferenceVolumeFlow,

    /// <summary>Heat rate or power, W.</summary>
    HeatRate,

    /// <summary>Acceleration, m/s2.</summary>
    Acceleration,

    /// <summary>Force, N.</summary>
    Force,

    /// <summary>Plane angle, rad.</summary>
    Angle,

    /// <summary>Mass flow rate per area, kg/(m2.s).</summary>
    MassFlux,

    /// <summary>Dynamic viscosity, Pa.s.</summary>
    DynamicViscosity,

    /// <summary>Kinematic viscosity, m2/s.</summary>
    KinematicViscosity,

    /// <summary>Thermal conductivity, W/(m.K).</summary>
    ThermalConductivity,

    /// <summary>Surface tension, N/m.</summary>
    SurfaceTension,
}
