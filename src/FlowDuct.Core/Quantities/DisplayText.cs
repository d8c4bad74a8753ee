namespace FlowDuct.Quantities;

/// <summary>Writes values in a unit system, with units of the reader's own where asked.</summary>
internal sealed class DisplayText(UnitSystem system, double ambientPressure, IReadOnlyDictionary<Dimension, UnitReading>? own = null) : IQuantityText
{
    /// <summary>Metric units; gauge readings do not occur.</summary>
    internal static readonly DisplayText Metric = new(UnitSystem.Metric, 0);

    /// <summary>The unit system.</summary>
    internal UnitSystem System => system;

    /// <summary>True where a unit of the reader's own was asked for.</summary>
    internal bool Asks(Dimension dimension) => own is not null && own.ContainsKey(dimension);

    /// <summary>The unit in which a dimension is shown.</summary>
    internal UnitReading UnitOf(Dimension dimension)
    {
        if (own is not null && own.TryGetValue(dimension, out UnitReading chosen)) return chosen;
        return UnitTable.TryFind(DisplayUnits.Of(dimension, system), dimension, out UnitReading usual)
            ? usual
            : throw new InvalidOperationException("A dimension has no display unit.");
    }

    /// <summary>The unit of a quantity: one asked for, its own where it has one, else that of its dimension.</summary>
    internal UnitReading UnitOf(QuantityRow row)
    {
        return !Asks(row.Dimension) && UnitTable.TryFind(row.DisplayUnit(system), row.Dimension, out UnitReading usual) ? usual : UnitOf(row.Dimension);
    }

    /// <summary>The number alone, with trailing zeros to the count of digits, as columns want it.</summary>
    internal string Number(double si, in UnitReading unit, int digits) =>
        NumberFormatter.Significant(UnitConverter.FromSi(si, unit, ambientPressure), digits);

    /// <inheritdoc/>
    public string Text(double si, Dimension dimension, int digits = 5) => Text(si, UnitOf(dimension), digits);

    /// <summary>The value with a unit of its own.</summary>
    internal string Text(double si, in UnitReading unit, int digits)
    {
        string number = NumberFormatter.Shortest(UnitConverter.FromSi(si, unit, ambientPressure), digits);
        return unit.Dimension is Dimension.Ratio or Dimension.Count ? number : $"{number} {unit.Spelling}";
    }
}
