namespace FlowDuct.Quantities;

/// <summary>Where a quantity of the catalogue occurs.</summary>
internal enum QuantityKind
{
    /// <summary>Given at a station, never answered there.</summary>
    StationInput,

    /// <summary>Answered at a station, never given.</summary>
    StationAnswer,

    /// <summary>Given or answered at a station.</summary>
    Both,

    /// <summary>A case option.</summary>
    Option,

    /// <summary>A result of the device as a whole.</summary>
    Performance,
}
