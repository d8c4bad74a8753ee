namespace FlowDuct.Quantities;

/// <content>Numeric case options; each is also a CSV column of the same name.</content>
internal static partial class QuantityCatalogue
{
    /// <summary>Options in the order of <see cref="CaseOption"/>.</summary>
    private static QuantityRow[] OptionRows() =>
    [
        new()
        {
            Key = "flow",
            Symbol = "qm",
            Word = "flow",
            Name = "mass flow",
            Dimension = Dimension.MassFlow,
            AlsoGivenAs = [Dimension.VolumeFlow, Dimension.NormalVolumeFlow, Dimension.StandardVolumeFlow],
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.Flow,
            JsonKey = "flow",
            Limits = QuantityLimits.Positive,
            AnsweredAs = ["mass_flow", "volume_flow"],
            Help = "Flow of all openings together, by mass or by volume.",
            Example = "1.4 kg/s",
        },
        new()
        {
            Key = "efficiency",
            Symbol = "eta",
            Word = "efficiency",
            Name = "isentropic efficiency",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.Efficiency,
            JsonKey = "efficiency",
            Limits = QuantityLimits.PositiveFraction,
            AnsweredAs = ["isentropic_efficiency"],
            Help = "Isentropic efficiency of the device.",
            Example = "96%",
        },
        new()
        {
            Key = "velocity_coefficient",
            Symbol = "phi",
            Word = "velocity-coefficient",
            Name = "velocity coefficient",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.VelocityCoefficient,
            JsonKey = "velocity_coefficient",
            Limits = QuantityLimits.PositiveFraction,
            AnsweredAs = ["velocity_coefficient"],
            Help = "Exit velocity over isentropic exit velocity (nozzle); the square root of the efficiency.",
            Example = "0.98",
        },
        new()
        {
            Key = "recovery",
            Symbol = "Cp",
            Word = "recovery",
            Name = "pressure-recovery coefficient",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.Recovery,
            JsonKey = "recovery",
            Limits = QuantityLimits.Any,
            AnsweredAs = ["recovery"],
            Help = "Static pressure rise over inlet dynamic pressure, stagnation minus static (diffuser).",
            Example = "0.72",
        },
        new()
        {
            Key = "loss_coefficient",
            Symbol = "zeta",
            Word = "loss-coefficient",
            Name = "loss coefficient",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.LossCoefficient,
            JsonKey = "loss_coefficient",
            Limits = QuantityLimits.NotNegative,
            AnsweredAs = ["loss_coefficient"],
            Help = "Loss of stagnation pressure over the dynamic pressure of the narrower end.",
            Example = "0.08",
        },
        new()
        {
            Key = "heat",
            Symbol = "q",
            Word = "heat",
            Name = "heat added",
            Dimension = Dimension.SpecificEnergy,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.Heat,
            JsonKey = "heat",
            AlsoGivenAs = [Dimension.HeatRate],
            AnsweredAs = ["heat_rate"],
            Help = "Heat added per mass of fluid.",
            Example = "12 kJ/kg",
        },
        new()
        {
            Key = "heat_loss",
            Symbol = "ql",
            Word = "heat-loss",
            Name = "heat lost",
            Dimension = Dimension.SpecificEnergy,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.HeatLoss,
            JsonKey = "heat_loss",
            AlsoGivenAs = [Dimension.HeatRate],
            AnsweredAs = ["heat_rate"],
            Help = "Heat lost per mass of fluid.",
            Example = "3 kJ/kg",
        },
        new()
        {
            Key = "boundary_temperature",
            Symbol = "Tb",
            Word = "boundary-temperature",
            Name = "boundary temperature",
            Dimension = Dimension.Temperature,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.BoundaryTemperature,
            JsonKey = "boundary_temperature",
            Limits = QuantityLimits.Positive,
            Help = "Temperature of the boundary that the heat crosses; the ambient temperature unless given.",
            Example = "25 degC",
        },
        new()
        {
            Key = "gravity",
            Symbol = "g",
            Word = "gravity",
            Name = "gravitational acceleration",
            Dimension = Dimension.Acceleration,
            Kind = QuantityKind.Option,
            OptionSlot = CaseOption.Gravity,
            JsonKey = "gravity",
            Limits = QuantityLimits.NotNegative,
            Help = "Acceleration of free fall; 9.80665 m/s2 unless given.",
            Example = "9.81 m/s2",
        },
    ];
}
