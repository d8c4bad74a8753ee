using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>Reads a station list such as "p=9 bar, T=230 degC, V=25 m/s".</summary>
internal static class StationListParser
{
    /// <summary>Reads the list of a station.</summary>
    /// <param name="optionName">The option as typed, for messages.</param>
    /// <param name="station">The station.</param>
    /// <param name="text">The list.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <returns>The items in the order typed; none twice, none that the station does not take.</returns>
    /// <exception cref="FlowDuctException">The list is refused; kind NotUnderstood.</exception>
    public static IReadOnlyList<StationItem> Parse(string optionName, Station station, string text, double ambientPressure) =>
        Parse(optionName, station.ToList(), text, ambientPressure);

    /// <summary>Reads a station list, among them that of the space beyond the exit.</summary>
    /// <param name="optionName">The option as typed, for messages.</param>
    /// <param name="list">Which list; exactly one.</param>
    /// <param name="text">The list.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <returns>The items in the order typed; none twice, none that the list does not take.</returns>
    /// <exception cref="FlowDuctException">The list is refused; kind NotUnderstood.</exception>
    public static IReadOnlyList<StationItem> Parse(string optionName, StationLists list, string text, double ambientPressure)
    {
        StationListRefusals refusals = new(optionName, list);
        if (string.IsNullOrWhiteSpace(text))
            throw refusals.Empty();
        string[] pieces = text.Split(',', StringSplitOptions.TrimEntries);
        List<StationItem> items = new(pieces.Length);
        for (int i = 0; i < pieces.Length; i++)
        {
            refusals.RequireNoDecimalComma(pieces, i);
            Add(items, ReadItem(refusals, pieces[i], ambientPressure), refusals);
        }

        return items;
    }

    private static StationItem ReadItem(StationListRefusals refusals, string piece, double ambientPressure)
    {
        int equals = piece.IndexOf('=', StringComparison.Ordinal);
        if (piece.Length == 0 || equals <= 0)
            throw refusals.NotAnItem(piece);
        string symbol = piece[..equals].TrimEnd();
        string value = piece[(equals + 1)..].TrimStart();
        QuantityRow row = RowOf(refusals, symbol, value);
        refusals.RequireNoRange(piece, value);
        var context = new ValueContext(refusals.Place, row, symbol + "=");
        if (row.IsPair) return Pair(refusals, context, value, ambientPressure);
        GivenValue given = ValueParser.Parse(context, value, ambientPressure);
        if (given.WasGauge && refusals.List is (StationLists.Ambient or StationLists.Reference))
            throw refusals.NeedsAbsolute(piece, given);
        return new StationItem(row, given);
    }

    /// <summary>The quantity of a symbol that the list takes.</summary>
    internal static QuantityRow RowOf(StationListRefusals refusals, string symbol, string value)
    {
        if (!QuantityCatalogue.TryFindStationQuantity(symbol, out QuantityRow? row))
            throw refusals.UnknownSymbol(symbol, value);
        if (row.StationSlot is null)
            throw refusals.AnswerOnly(row, symbol);
        refusals.RequireOwnUnit(row, symbol, value);
        return (row.TakenBy & refusals.List) != 0 ? row : throw refusals.NotTakenHere(symbol, row);
    }

    // The unit stands once, behind the second number.
    private static StationItem Pair(StationListRefusals refusals, in ValueContext context, string value, double ambientPressure)
    {
        int by = value.IndexOf('x', StringComparison.Ordinal);
        if (by <= 0) throw refusals.NotAPair(context.Row, value);
        GivenValue second = ValueParser.Parse(context, value[(by + 1)..], ambientPressure);
        GivenValue first = ValueParser.Parse(context, value[..by] + second.Unit.Spelling, ambientPressure);
        if (context.Row.StationSlot == StationSymbol.Annulus && second.Si >= first.Si) throw refusals.NoRing(value);
        return new StationItem(context.Row, first, second);
    }

    private static void Add(List<StationItem> items, StationItem item, StationListRefusals refusals)
    {
        foreach (StationItem earlier in items)
        {
            if (ReferenceEquals(earlier.Row, item.Row))
                throw refusals.Twice(item.Row);
        }

        items.Add(item);
    }
}
