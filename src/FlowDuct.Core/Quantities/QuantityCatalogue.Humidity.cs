namespace FlowDuct.Quantities;

/// <content>Water vapour in a gas.</content>
internal static partial class QuantityCatalogue
{
    /// <summary>Slots from relative humidity to humidity ratio.</summary>
    private static QuantityRow[] HumidityRows() =>
    [
        new()
        {
            Key = "humidity",
            Symbol = "humidity",
            Name = "relative humidity",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.Humidity,
            TakenBy = StationLists.Inlet | StationLists.At,
            JsonKey = "humidity",
            Limits = QuantityLimits.Fraction,
            Help = "Partial pressure of the water vapour over the saturation pressure of water, below 0.01 degC of ice (humid-air).",
            Example = "humidity=60%",
        },
        new()
        {
            Key = "dew-point",
            Symbol = "dew-point",
            Name = "dew point",
            Dimension = Dimension.Temperature,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.DewPoint,
            TakenBy = StationLists.Inlet | StationLists.At,
            JsonKey = "dew_point",
            Limits = QuantityLimits.Positive,
            Help = "Temperature at which the water vapour is saturated at this static pressure; below 0.01 degC the frost point (humid-air).",
            Example = "dew-point=12 degC",
        },
        new()
        {
            Key = "humidity-ratio",
            Symbol = "humidity-ratio",
            Name = "humidity ratio",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.HumidityRatio,
            TakenBy = StationLists.Inlet | StationLists.At,
            JsonKey = "humidity_ratio",
            Limits = QuantityLimits.NotNegative,
            Help = "Mass of water vapour over mass of dry gas, kg/kg (humid-air).",
            Example = "humidity-ratio=0.008",
        },
    ];
}
