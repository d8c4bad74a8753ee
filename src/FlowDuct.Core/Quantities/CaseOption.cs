namespace FlowDuct.Quantities;

/// <summary>The figures of a case that belong to no station; the number is the slot in a <c>DeviceCase</c>.</summary>
internal enum CaseOption
{
    /// <summary>Mass flow, kg/s (volume flows are converted at the door).</summary>
    Flow,

    /// <summary>Isentropic efficiency.</summary>
    Efficiency,

    /// <summary>Velocity coefficient (nozzle).</summary>
    VelocityCoefficient,

    /// <summary>Pressure-recovery coefficient (diffuser).</summary>
    Recovery,

    /// <summary>Stagnation-pressure loss coefficient.</summary>
    LossCoefficient,

    /// <summary>Heat added per mass of fluid, J/kg.</summary>
    Heat,

    /// <summary>Heat lost per mass of fluid, J/kg.</summary>
    HeatLoss,

    /// <summary>Temperature of the boundary that the heat crosses, K.</summary>
    BoundaryTemperature,

    /// <summary>Gravitational acceleration, m/s2.</summary>
    Gravity,

    /// <summary>Discharge coefficient (nozzle).</summary>
    DischargeCoefficient,

    /// <summary>Included angle of the convergent part, rad (nozzle).</summary>
    ConvergentAngle,

    /// <summary>Included angle of the divergent part, rad (nozzle).</summary>
    DivergentAngle,

    /// <summary>Onset of the other phase where one is held: its equilibrium mass fraction, or a temperature difference, K (nozzle).</summary>
    Onset,

    /// <summary>Axial length, m (diffuser).</summary>
    Length,

    /// <summary>Angle between the diverging walls, rad (diffuser).</summary>
    IncludedAngle,

    /// <summary>Share of the inlet area that the boundary layers block (diffuser).</summary>
    InletBlockage,

    /// <summary>Kinetic energy of the inlet stream over that of its mean velocity (diffuser).</summary>
    KineticEnergyCoefficient,

    /// <summary>Roughness of the wall, m (diffuser).</summary>
    Roughness,
}
