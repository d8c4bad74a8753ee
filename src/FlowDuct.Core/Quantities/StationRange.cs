using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>One item of a station list that is a range, and the rest of the list.</summary>
/// <param name="Row">The quantity that varies.</param>
/// <param name="Range">Its values.</param>
/// <param name="Typed">The range as typed, without its symbol.</param>
/// <param name="Rest">The other items; empty where there are none.</param>
internal sealed record StationRange(QuantityRow Row, ValueRange Range, string Typed, string Rest)
{
    /// <summary>Finds the range in a list; null where it has none.</summary>
    /// <param name="optionName">The option as typed, for messages.</param>
    /// <param name="list">Which list; exactly one.</param>
    /// <param name="text">The list.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <exception cref="FlowDuctException">A range that is not understood, or a second one; kind NotUnderstood.</exception>
    public static StationRange? Find(string optionName, StationLists list, string text, double ambientPressure)
    {
        if (!ValueRangeParser.IsRange(text)) return null;
        List<string> pieces = [.. text.Split(',', StringSplitOptions.TrimEntries)];
        int at = pieces.FindIndex(IsRange);
        if (at < 0) return null;
        string piece = pieces[at];
        pieces.RemoveAt(at);
        StationListRefusals refusals = new(optionName, list);
        if (pieces.Find(IsRange) is string second) throw refusals.SecondRange(piece, second);
        int equals = piece.IndexOf('=', StringComparison.Ordinal);
        (string symbol, string value) = (piece[..equals].TrimEnd(), piece[(equals + 1)..].Trim());
        QuantityRow row = StationListParser.RowOf(refusals, symbol, value);
        ValueRange range = ValueRangeParser.Parse(new ValueContext(optionName, row, symbol + "="), value, ambientPressure);
        return new StationRange(row, range, value, string.Join(',', pieces));
    }

    private static bool IsRange(string piece) => piece.IndexOf('=', StringComparison.Ordinal) > 0 && ValueRangeParser.IsRange(piece);
}
