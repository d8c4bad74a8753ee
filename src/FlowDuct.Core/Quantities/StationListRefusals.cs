using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>The refusals of a station list, in one place; each uses what was typed to guess what was meant.</summary>
/// <param name="place">The option as typed.</param>
/// <param name="list">Which list it is.</param>
internal sealed class StationListRefusals(string place, StationLists list)
{
    /// <summary>The option as typed.</summary>
    public string Place => place;

    /// <summary>Which list it is.</summary>
    public StationLists List => list;

    /// <summary>Refuses a list without an item.</summary>
    public FlowDuctException Empty() => Refuse("the list is empty", $"write for example \"{ListExample()}\"");

    /// <summary>Refuses a piece that is not symbol=value.</summary>
    public FlowDuctException NotAnItem(string piece)
    {
        if (piece.Length == 0)
            return Refuse("an item is empty: there is a comma too many", string.Empty);
        string shown = Echo.Ascii(piece);
        return piece[0] == '='
            ? Refuse($"{shown} has no symbol before its equals sign", $"write for example {ListExample()}")
            : Refuse($"{shown} has no equals sign", $"write symbol=value, for example {ListExample()}");
    }

    /// <summary>Refuses a single value where two are meant.</summary>
    public FlowDuctException NotAPair(QuantityRow row, string value) =>
        Refuse($"{row.Key}={Echo.Ascii(value)} is one number, and {row.Name} takes two", $"write for example {row.Example}");

    /// <summary>Refuses a ring whose inner diameter is not the smaller one.</summary>
    public FlowDuctException NoRing(string value) =>
        Refuse($"annulus={Echo.Ascii(value)} has no ring between its diameters", "write outer x inner diameter, for example annulus=900x500 mm");

    /// <summary>Refuses "p=1,5 bar": a number, then a piece that goes on with digits.</summary>
    public void RequireNoDecimalComma(string[] pieces, int index)
    {
        if (index + 1 >= pieces.Length)
            return;
        string piece = pieces[index];
        string next = pieces[index + 1];
        bool endsInDigit = piece.Length > 0 && piece.Contains('=', StringComparison.Ordinal) && char.IsAsciiDigit(piece[^1]);
        if (endsInDigit && next.Length > 0 && char.IsAsciiDigit(next[0]) && !next.Contains('=', StringComparison.Ordinal))
            throw Refuse($"{Echo.Ascii(piece)},{Echo.Ascii(next)} has a decimal comma", $"write {Echo.Ascii(piece)}.{Echo.Ascii(next)}");
    }

    /// <summary>Refuses a symbol with the unit of the quantity whose symbol differs from it in case only.</summary>
    public void RequireOwnUnit(QuantityRow row, string symbol, string value)
    {
        string unit = UnitOf(value);
        if (unit.Length == 0 || UnitTable.TryFind(unit, row.Dimension, out _))
            return;
        if (CaseTwin(symbol, unit) is { } twin && !ReferenceEquals(twin, row))
            throw Refuse($"{symbol} is {row.Name}, {DimensionWords.SiUnit(row.Dimension)}; {ForTwin(twin, value)}", string.Empty);
    }

    /// <summary>Refuses a symbol that the catalogue does not hold.</summary>
    public FlowDuctException UnknownSymbol(string symbol, string value)
    {
        string shown = Echo.Ascii(symbol);
        if (CaseTwin(symbol, UnitOf(value)) is { } twin)
            return Refuse($"{shown} is not a symbol (case matters); {ForTwin(twin, value)}", string.Empty);
        QuantityRow? near = Nearest(symbol);
        string reason = near is null ? $"{shown} is not a symbol" : $"{shown} is not a symbol; did you mean {near.Example}?";
        return Refuse(reason, $"{place} takes {Taken()}");
    }

    /// <summary>Refuses a quantity that is never given.</summary>
    public FlowDuctException AnswerOnly(QuantityRow row, string symbol) =>
        Refuse($"{symbol} ({row.Name}) is an answer, it cannot be given", $"{place} takes {Taken()}");

    /// <summary>Refuses a quantity that other stations take.</summary>
    public FlowDuctException NotTakenHere(string symbol, QuantityRow row) =>
        Refuse($"{symbol} ({row.Name}) is not taken here", $"{place} takes {Taken()}");

    /// <summary>Refuses a second item of a quantity.</summary>
    public FlowDuctException Twice(QuantityRow row) => Refuse($"{row.Symbol} is given twice", string.Empty);

    /// <summary>Refuses a second range: a table has one quantity that varies.</summary>
    public FlowDuctException SecondRange(string first, string second) =>
        Refuse($"{Echo.Ascii(first)} and {Echo.Ascii(second)} are two ranges, and a table has one", "give one of them a value");

    /// <summary>Refuses a range where one value is wanted.</summary>
    public void RequireNoRange(string piece, string value)
    {
        if (ValueRangeParser.IsRange(value) && NumberParser.Measure(value, out _) > 0)
            throw Refuse($"{Echo.Ascii(piece)} is a range, and one value is wanted here", "a range belongs to --at of flowduct state");
    }

    /// <summary>Refuses an ambient or reference pressure that is told relative to the ambient pressure.</summary>
    public FlowDuctException NeedsAbsolute(string piece, in GivenValue given)
    {
        string spelling = given.Unit.Unit.Spelling;
        string plain = given.Unit.Unit.Basis == UnitBasis.Gauge ? spelling[..^1] : spelling;
        string reason = list == StationLists.Ambient
            ? $"{Echo.Ascii(piece)}: gauge and vacuum readings start from the ambient pressure itself"
            : $"{Echo.Ascii(piece)}: a reference state does not move with the weather";
        return Refuse(reason, $"give it absolute, in {plain}(a)");
    }

    private FlowDuctException Refuse(string reason, string nextStep) =>
        new(new Refusal(RefusalKind.NotUnderstood, place, reason, nextStep));

    private static string ForTwin(QuantityRow twin, string value) => $"for {twin.Name} write {twin.Symbol}={Echo.Ascii(value)}";

    private static string UnitOf(string value) => value[NumberParser.Measure(value, out _)..].Trim();

    private static QuantityRow? CaseTwin(string symbol, string unit)
    {
        foreach (QuantityRow row in QuantityCatalogue.StationQuantities)
        {
            bool same = symbol.Equals(row.Symbol, StringComparison.OrdinalIgnoreCase)
                || symbol.Equals(row.Word, StringComparison.OrdinalIgnoreCase);
            if (same && row.StationSlot is not null && UnitTable.TryFind(unit.Length == 0 ? "1" : unit, row.Dimension, out _))
                return row;
        }

        return null;
    }

    private QuantityRow? Nearest(string symbol)
    {
        foreach (QuantityRow row in QuantityCatalogue.StationQuantities)
        {
            bool isTaken = (row.TakenBy & list) != 0;
            if (isTaken && (IsNear(symbol, row.Word) || IsNear(symbol, row.Key)))
                return row;
        }

        return null;
    }

    /// <summary>Short symbols are all near to each other; only words of four letters and more, or a mere case slip, are compared.</summary>
    private static bool IsNear(string typed, string known) =>
        known.Length > 0 && Slips.Distance(typed, known) <= (known.Length >= 4 ? 2 : 0);

    private string Taken() =>
        string.Join(", ", QuantityCatalogue.StationQuantities.Where(row => (row.TakenBy & list) != 0).Select(row => row.Symbol));

    private string ListExample()
    {
        IEnumerable<QuantityRow> taken = QuantityCatalogue.StationQuantities.Where(row => (row.TakenBy & list) != 0);
        return taken.First().Example;
    }
}
