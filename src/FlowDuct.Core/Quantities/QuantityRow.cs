namespace FlowDuct.Quantities;

/// <summary>One quantity of the catalogue: everything that options, lists, headers, keys, help and docs say of it.</summary>
internal sealed class QuantityRow
{
    /// <summary>Unique with its kind: the symbol at a station, the underscored name of an option or of a result.</summary>
    public required string Key { get; init; }

    /// <summary>Short form in tables and equations.</summary>
    public required string Symbol { get; init; }

    /// <summary>The word also accepted for a station symbol, the hyphened name of an option; empty where there is none.</summary>
    public string Word { get; init; } = string.Empty;

    /// <summary>The term of the trade, such as "static pressure".</summary>
    public required string Name { get; init; }

    /// <summary>What it measures.</summary>
    public required Dimension Dimension { get; init; }

    /// <summary>Other dimensions in which it may be given (a flow by mass or by volume).</summary>
    public Dimension[] AlsoGivenAs { get; init; } = [];

    /// <summary>Where it occurs.</summary>
    public required QuantityKind Kind { get; init; }

    /// <summary>Slot of a station input; null for the rest.</summary>
    public StationSymbol? StationSlot { get; init; }

    /// <summary>Slot of a case option; null for the rest.</summary>
    public CaseOption? OptionSlot { get; init; }

    /// <summary>The lists that take it.</summary>
    public StationLists TakenBy { get; init; }

    /// <summary>Its key in JSON; a point leads into a nested object.</summary>
    public required string JsonKey { get; init; }

    /// <summary>The range it has by its nature, SI.</summary>
    public QuantityLimits Limits { get; init; } = QuantityLimits.Any;

    /// <summary>The results, by key, that answer this option; empty where there are none.</summary>
    public string[] AnsweredAs { get; init; } = [];

    /// <summary>True where the answer is a word or yes/no, not a number.</summary>
    public bool IsText { get; init; }

    /// <summary>True where two values of one unit are given as in 600x400 mm.</summary>
    public bool IsPair { get; init; }

    /// <summary>One sentence for help and docs.</summary>
    public required string Help { get; init; }

    /// <summary>A complete item or option value, for help and messages; empty for answers.</summary>
    public string Example { get; init; } = string.Empty;

    /// <summary>Display unit of its own, where that of the dimension would not suit; empty for the usual one.</summary>
    public string OwnMetricUnit { get; init; } = string.Empty;

    /// <summary>US display unit of its own; empty for the usual one.</summary>
    public string OwnUsUnit { get; init; } = string.Empty;

    /// <summary>The unit in which it is shown.</summary>
    public string DisplayUnit(UnitSystem system)
    {
        string own = system == UnitSystem.Us ? OwnUsUnit : OwnMetricUnit;
        return own.Length == 0 ? DisplayUnits.Of(Dimension, system) : own;
    }
}
