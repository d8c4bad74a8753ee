using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Sweep;

/// <summary>Reads "inlet.p=4..12 bar by 0.5 bar", "inlet.T=200..300 degC in 11 points", "exit.p=1..100 bar in 5 points log", "exit.p=1,2,3 bar".</summary>
internal static class VariationParser
{
    /// <summary>Reads a variation.</summary>
    /// <exception cref="Errors.FlowDuctException">It is not understood; kind NotUnderstood.</exception>
    internal static Variation Parse(string text)
    {
        int equals = text.IndexOf('=', StringComparison.Ordinal);
        // p/p0 has no equals sign; a mixture has some behind the first.
        if (equals <= 0) throw VariationRefusals.NoEquals(text);
        string name = text[..equals].Trim(), values = text[(equals + 1)..].Trim();
        if (values.Length == 0) throw VariationRefusals.NoValues(name);
        QuantityRow? row = RowOf(name);
        if (row is null) return Words(name, values);
        return values.Contains("..", StringComparison.Ordinal) ? RangeParser.Parse(name, row, values) : Numbers(name, row, values);
    }

    // A word (fluid, shape) is left to the option that it is written to.
    private static QuantityRow? RowOf(string name)
    {
        int point = name.IndexOf('.', StringComparison.Ordinal);
        if (point < 0) return QuantityCatalogue.TryFindOption(name, out QuantityRow? option) ? option : null;
        StationLists list = StationWords.Find(name[..point]);
        if (list == StationLists.None) throw VariationRefusals.NoStation(name);
        bool known = QuantityCatalogue.TryFindStationQuantity(name.AsSpan(point + 1), out QuantityRow? row) && row.StationSlot is not null && (row.TakenBy & list) != 0;
        return known ? row : throw VariationRefusals.NoFigure(name, list);
    }

    private static Variation Words(string name, string values) => values.Contains("..", StringComparison.Ordinal)
        ? throw VariationRefusals.WordsOnly(name)
        : new Variation(name.Replace('_', '-'), string.Empty, values.Split(',', StringSplitOptions.TrimEntries));

    // "1,2,3 bar": a unit serves those before it that have none.
    private static Variation Numbers(string name, QuantityRow row, string values)
    {
        string[] pieces = values.Split(',', StringSplitOptions.TrimEntries);
        (string Number, string Unit)[] items = [.. pieces.Select(piece => Split(name, piece))];
        string last = items[^1].Unit;
        if (last.Length == 0 && row.Dimension is not (Dimension.Ratio or Dimension.Count)) throw VariationRefusals.NoUnit(name, row);
        for (int i = items.Length - 2; i >= 0; i--)
        {
            if (items[i].Unit.Length == 0) items[i].Unit = items[i + 1].Unit;
        }

        bool same = items.All(item => item.Unit == last);
        return new Variation(name, same ? last : string.Empty, [.. items.Select(item => same ? item.Number : $"{item.Number} {item.Unit}".TrimEnd())]);
    }

    private static (string Number, string Unit) Split(string name, string piece)
    {
        int length = NumberParser.Measure(piece, out _);
        return length == 0 ? throw VariationRefusals.NoNumber(name, piece) : (piece[..length], piece[length..].Trim());
    }
}
