namespace FlowDuct.Quantities;

/// <summary>The unit in which a dimension is shown unless somebody asked otherwise.</summary>
internal static class DisplayUnits
{
    /// <summary>Spelling of the default display unit of a dimension.</summary>
    public static string Of(Dimension dimension, UnitSystem system) => system == UnitSystem.Us ? Us(dimension) : Metric(dimension);

    private static string Metric(Dimension dimension) => dimension switch
    {
        Dimension.Pressure or Dimension.PressureDifference => "bar",
        Dimension.Temperature => "degC",
        Dimension.SpecificEnergy => "kJ/kg",
        Dimension.SpecificEntropy => "kJ/(kg.K)",
        Dimension.Length => "mm",
        Dimension.Area => "mm2",
        Dimension.NormalVolumeFlow => "Nm3/h",
        Dimension.StandardVolumeFlow => "Sm3/h",
        Dimension.ReferenceVolumeFlow => "m3/h(ref)",
        Dimension.HeatRate => "kW",
        Dimension.Angle => "deg",
        Dimension.DynamicViscosity => "uPa.s",
        Dimension.KinematicViscosity => "mm2/s",
        Dimension.ThermalConductivity => "mW/(m.K)",
        Dimension.SurfaceTension => "mN/m",
        _ => DimensionWords.SiUnit(dimension),
    };

    private static string Us(Dimension dimension) => dimension switch
    {
        Dimension.Pressure or Dimension.PressureDifference => "psi",
        Dimension.Temperature or Dimension.TemperatureDifference => "degF",
        Dimension.SpecificEnergy => "Btu/lb",
        Dimension.SpecificEntropy => "Btu/(lb.degF)",
        Dimension.SpecificVolume => "ft3/lb",
        Dimension.Density => "lb/ft3",
        Dimension.Velocity => "ft/s",
        Dimension.Length => "in",
        Dimension.Area => "in2",
        Dimension.MassFlow => "lb/h",
        Dimension.VolumeFlow => "acfm",
        Dimension.ReferenceVolumeFlow => "scfm",
        Dimension.HeatRate => "Btu/h",
        Dimension.Acceleration => "ft/s2",
        Dimension.Force => "lbf",
        Dimension.MassFlux => "lb/(ft2.s)",
        Dimension.DynamicViscosity => "lb/(ft.h)",
        Dimension.KinematicViscosity => "ft2/s",
        Dimension.ThermalConductivity => "Btu/(h.ft.degF)",
        Dimension.SurfaceTension => "lbf/ft",
        _ => Metric(dimension),
    };
}
