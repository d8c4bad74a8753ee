namespace FlowDuct.Quantities;

/// <summary>Pressure above a perfect vacuum, Pa; above zero.</summary>
public readonly struct AbsolutePressure : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "absolute pressure";

    /// <inheritdoc/>
    public static string SiUnit => "Pa";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Pressure above the ambient pressure, Pa; negative below it. Its lower limit depends on the ambient pressure.</summary>
public readonly struct GaugePressure : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "gauge pressure";

    /// <inheritdoc/>
    public static string SiUnit => "Pa";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Difference of two pressures, Pa; any sign.</summary>
public readonly struct PressureDifference : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "pressure difference";

    /// <inheritdoc/>
    public static string SiUnit => "Pa";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Temperature above absolute zero, K.</summary>
public readonly struct ThermodynamicTemperature : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "thermodynamic temperature";

    /// <inheritdoc/>
    public static string SiUnit => "K";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Difference of two temperatures, K; any sign, never shifted by an offset.</summary>
public readonly struct TemperatureDifference : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "temperature difference";

    /// <inheritdoc/>
    public static string SiUnit => "K";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Enthalpy per mass, J/kg, on the reference of a formulation.</summary>
public readonly struct SpecificEnthalpy : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "specific enthalpy";

    /// <inheritdoc/>
    public static string SiUnit => "J/kg";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Internal energy per mass, J/kg, on the reference of a formulation.</summary>
public readonly struct SpecificInternalEnergy : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "specific internal energy";

    /// <inheritdoc/>
    public static string SiUnit => "J/kg";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Heat per mass of fluid, J/kg; positive into the fluid.</summary>
public readonly struct SpecificHeat : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "heat per mass";

    /// <inheritdoc/>
    public static string SiUnit => "J/kg";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Entropy per mass, J/(kg.K), on the reference of a formulation.</summary>
public readonly struct SpecificEntropy : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "specific entropy";

    /// <inheritdoc/>
    public static string SiUnit => "J/(kg.K)";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Heat capacity per mass, J/(kg.K); above zero.</summary>
public readonly struct SpecificHeatCapacity : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "specific heat capacity";

    /// <inheritdoc/>
    public static string SiUnit => "J/(kg.K)";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Volume per mass, m3/kg; above zero.</summary>
public readonly struct SpecificVolume : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "specific volume";

    /// <inheritdoc/>
    public static string SiUnit => "m3/kg";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Mass per volume, kg/m3; above zero.</summary>
public readonly struct Density : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "density";

    /// <inheritdoc/>
    public static string SiUnit => "kg/m3";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Mean velocity through a section, m/s; zero or above, as flow is told from inlet to exit.</summary>
public readonly struct Velocity : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "velocity";

    /// <inheritdoc/>
    public static string SiUnit => "m/s";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => true;
}

/// <summary>Length or bore, m; above zero.</summary>
public readonly struct Length : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "length";

    /// <inheritdoc/>
    public static string SiUnit => "m";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Height above a datum, m; any sign.</summary>
public readonly struct Elevation : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "elevation";

    /// <inheritdoc/>
    public static string SiUnit => "m";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Area normal to the flow, m2; above zero.</summary>
public readonly struct Area : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "area";

    /// <inheritdoc/>
    public static string SiUnit => "m2";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Mass per time, kg/s; above zero.</summary>
public readonly struct MassFlowRate : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "mass flow rate";

    /// <inheritdoc/>
    public static string SiUnit => "kg/s";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Volume per time at inlet static conditions, m3/s; above zero.</summary>
public readonly struct VolumeFlowRate : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "volume flow rate";

    /// <inheritdoc/>
    public static string SiUnit => "m3/s";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Heat per time, W; positive into the fluid.</summary>
public readonly struct HeatRate : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "heat rate";

    /// <inheritdoc/>
    public static string SiUnit => "W";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Magnitude of an acceleration, m/s2; zero or above.</summary>
public readonly struct Acceleration : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "acceleration";

    /// <inheritdoc/>
    public static string SiUnit => "m/s2";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => true;
}

/// <summary>Force along the axis, N; positive downstream.</summary>
public readonly struct Force : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "force";

    /// <inheritdoc/>
    public static string SiUnit => "N";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}

/// <summary>Plane angle, rad; zero or above.</summary>
public readonly struct PlaneAngle : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "plane angle";

    /// <inheritdoc/>
    public static string SiUnit => "rad";

    /// <inheritdoc/>
    public static double Least => 0;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => true;
}

/// <summary>Quotient of two quantities of one kind; any finite number.</summary>
public readonly struct Ratio : IDimensionMarker
{
    /// <inheritdoc/>
    public static string Name => "ratio";

    /// <inheritdoc/>
    public static string SiUnit => "1";

    /// <inheritdoc/>
    public static double Least => double.NegativeInfinity;

    /// <inheritdoc/>
    public static bool LeastIsInclusive => false;
}
