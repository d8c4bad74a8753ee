namespace FlowDuct.Quantities;

/// <summary>The words for a dimension in messages and help.</summary>
internal static class DimensionWords
{
    /// <summary>The dimension in words, lower case.</summary>
    public static string Of(Dimension dimension) => dimension switch
    {
        Dimension.Ratio => "a ratio",
        Dimension.Count => "a count",
        Dimension.Pressure => "pressure",
        Dimension.PressureDifference => "pressure difference",
        Dimension.Temperature => "temperature",
        Dimension.TemperatureDifference => "temperature difference",
        Dimension.SpecificEnergy => "energy per mass",
        Dimension.SpecificEntropy => "entropy or heat capacity per mass",
        Dimension.SpecificVolume => "specific volume",
        Dimension.Density => "density",
        Dimension.Velocity => "velocity",
        Dimension.Length => "length",
        Dimension.Area => "area",
        Dimension.MassFlow => "mass flow",
        Dimension.VolumeFlow => "volume flow",
        Dimension.NormalVolumeFlow => "normal volume flow",
        Dimension.StandardVolumeFlow => "standard volume flow",
        Dimension.ReferenceVolumeFlow => "reference volume flow",
        Dimension.HeatRate => "heat rate",
        Dimension.Acceleration => "acceleration",
        Dimension.Force => "force",
        Dimension.Angle => "angle",
        Dimension.MassFlux => "mass flux",
        Dimension.DynamicViscosity => "dynamic viscosity",
        Dimension.KinematicViscosity => "kinematic viscosity",
        Dimension.ThermalConductivity => "thermal conductivity",
        Dimension.SurfaceTension => "surface tension",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };

    /// <summary>The coherent SI unit, in the spelling of the unit table.</summary>
    public static string SiUnit(Dimension dimension) => dimension switch
    {
        Dimension.Ratio or Dimension.Count => "1",
        Dimension.Pressure or Dimension.PressureDifference => "Pa",
        Dimension.Temperature or Dimension.TemperatureDifference => "K",
        Dimension.SpecificEnergy => "J/kg",
        Dimension.SpecificEntropy => "J/(kg.K)",
        Dimension.SpecificVolume => "m3/kg",
        Dimension.Density => "kg/m3",
        Dimension.Velocity => "m/s",
        Dimension.Length => "m",
        Dimension.Area => "m2",
        Dimension.MassFlow => "kg/s",
        Dimension.VolumeFlow => "m3/s",
        Dimension.NormalVolumeFlow => "Nm3/s",
        Dimension.StandardVolumeFlow => "Sm3/s",
        Dimension.ReferenceVolumeFlow => "m3/s(ref)",
        Dimension.HeatRate => "W",
        Dimension.Acceleration => "m/s2",
        Dimension.Force => "N",
        Dimension.Angle => "rad",
        Dimension.MassFlux => "kg/(m2.s)",
        Dimension.DynamicViscosity => "Pa.s",
        Dimension.KinematicViscosity => "m2/s",
        Dimension.ThermalConductivity => "W/(m.K)",
        Dimension.SurfaceTension => "N/m",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };
}
