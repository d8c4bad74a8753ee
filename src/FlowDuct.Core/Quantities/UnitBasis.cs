namespace FlowDuct.Quantities;

/// <summary>What the zero of a pressure unit is; every other unit has none.</summary>
internal enum UnitBasis
{
    /// <summary>None said. On a pressure this reads as absolute.</summary>
    None,

    /// <summary>Above a perfect vacuum.</summary>
    Absolute,

    /// <summary>Above the ambient pressure.</summary>
    Gauge,

    /// <summary>Below the ambient pressure: ambient minus reading.</summary>
    Vacuum,

    /// <summary>A column of liquid: plain on a difference, but on a pressure the basis must be said.</summary>
    Head,
}
