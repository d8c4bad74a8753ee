namespace FlowDuct.Quantities;

/// <summary>Names the kind of a <see cref="Quantity{TDimension}"/> and the range that kind has by nature.</summary>
/// <remarks>Implemented by empty types that serve as type arguments only.</remarks>
public interface IDimensionMarker
{
    /// <summary>The quantity in words, lower case, such as "absolute pressure".</summary>
    static abstract string Name { get; }

    /// <summary>The coherent SI unit in ASCII, such as "J/(kg.K)"; "1" for a ratio.</summary>
    static abstract string SiUnit { get; }

    /// <summary>The lower limit in SI; negative infinity where there is none.</summary>
    static abstract double Least { get; }

    /// <summary>True where <see cref="Least"/> itself is allowed.</summary>
    static abstract bool LeastIsInclusive { get; }
}
