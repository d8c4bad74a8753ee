using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>Where a value stands: what a refusal needs to name it.</summary>
/// <param name="Place">The option, or file, row and column, as typed.</param>
/// <param name="Row">The quantity.</param>
/// <param name="Prefix">The symbol and equals sign of a station item; empty for an option or a cell.</param>
internal readonly record struct ValueContext(string Place, QuantityRow Row, string Prefix)
{
    /// <summary>The item as the user wrote it.</summary>
    public string Shown(string text) => Prefix + Echo.Ascii(text);

    /// <summary>A value with the quantity's name before it, for messages on ranges.</summary>
    public string Named(string text) => Prefix.Length > 0 ? Shown(text) : $"{Row.Word} {Echo.Ascii(text)}".TrimStart();

    /// <summary>The example of the row in the form that fits here.</summary>
    public string Example()
    {
        string example = Row.Example;
        string value = example[(example.LastIndexOf('=') + 1)..];
        return Prefix + value;
    }

    /// <summary>A refusal at this place whose way out is the example of the quantity.</summary>
    public FlowDuctException Refuse(string reason) => Refuse(reason, $"write for example {Example()}");

    /// <summary>A refusal at this place.</summary>
    public FlowDuctException Refuse(string reason, string nextStep) => new(new Refusal(RefusalKind.NotUnderstood, Place, reason, nextStep));

    /// <summary>Refuses a text that holds no number.</summary>
    public FlowDuctException NotANumber(string text)
    {
        if (text.Length == 0)
            return Refuse($"{(Prefix.Length == 0 ? "there is" : Prefix + " has")} no value; write for example {Example()}", string.Empty);
        ReadOnlySpan<char> chunk = NumberChunk(text);
        if (Row.Dimension == Dimension.Ratio && chunk.Contains(':'))
            return Refuse($"{Shown(text)} is a ratio of two numbers", ColonHint(chunk));
        string problem = NumberProblem.Describe(chunk);
        return problem.Contains("write", StringComparison.Ordinal) ? Refuse(Prefix + problem, string.Empty) : Refuse(Prefix + problem);
    }

    /// <summary>Refuses a number without the unit it needs.</summary>
    public FlowDuctException NoUnit(string text)
    {
        string value = Echo.Ascii(text) + " " + SuggestedUnit();
        return Refuse($"{Shown(text)} has no unit; write for example {Prefix}{value}", string.Empty);
    }

    /// <summary>Refuses a unit that is not one of the quantity's.</summary>
    public FlowDuctException WrongUnit(string text, string spelling)
    {
        if (spelling == "%" && Row.Dimension != Dimension.Ratio)
            return Refuse($"{Shown(text)}: a percentage suits a ratio only; write for example {Example()}", string.Empty);
        string suggestion = UnitSuggestion.For(spelling, Row);
        return Refuse($"{Shown(text)}: {suggestion}", string.Empty);
    }

    private string SuggestedUnit()
    {
        string value = Example();
        int at = value.IndexOf(' ', StringComparison.Ordinal);
        return at < 0 ? Row.DisplayUnit(UnitSystem.Metric) : value[(at + 1)..];
    }

    /// <summary>The text up to its unit, so that the message shows the number that went wrong.</summary>
    private static ReadOnlySpan<char> NumberChunk(string text)
    {
        if (NumberParser.Measure(text, out _) == 0)
            return FirstWord(text);
        int end = 0;
        while (end < text.Length && !IsUnitLetter(text, end))
            end++;
        return text.AsSpan(0, end).Trim();
    }

    private static ReadOnlySpan<char> FirstWord(string text)
    {
        int space = text.IndexOf(' ', StringComparison.Ordinal);
        return space < 0 ? text : text.AsSpan(0, space);
    }

    private static bool IsUnitLetter(string text, int at) =>
        text[at] == '%' || (char.IsAsciiLetter(text[at]) && !(at > 0 && text[at] is 'e' or 'E' or 'x' or 'X'));

    private string ColonHint(ReadOnlySpan<char> chunk)
    {
        int colon = chunk.IndexOf(':');
        bool isOk = NumberParser.TryParse(chunk[..colon].Trim(), out PrintedNumber over, out _)
            & NumberParser.TryParse(chunk[(colon + 1)..].Trim(), out PrintedNumber under, out _);
        bool isPressure = Row.StationSlot is StationSymbol.PressureOverInlet or StationSymbol.PressureOverInletStagnation;
        if (!isOk || over.Value <= 0 || under.Value <= 0)
            return $"write one number, for example {Example()}";
        double ratio = isPressure && over.Value > under.Value ? under.Value / over.Value : over.Value / under.Value;
        string hint = $"write {Prefix}{NumberFormatter.Shortest(ratio, 4)}";
        return isPressure ? $"{hint} (this pressure over that of the inlet)" : hint;
    }
}
