using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>Reads a range such as "200..1000 K by 100 K" or "4..12 bar in 17 points".</summary>
internal static class ValueRangeParser
{
    /// <summary>The most values of a range: more than a table is ever read, and few enough for memory.</summary>
    internal const int MostPoints = 10_000;

    // Of a step: the rounding of decimal ends and steps, far below any step that somebody leaves out.
    private const double WholeStep = 1e-6;

    /// <summary>True of a text that means a range.</summary>
    public static bool IsRange(string text) => text.Contains("..", StringComparison.Ordinal);

    /// <summary>Reads a range.</summary>
    /// <param name="context">Where it stands.</param>
    /// <param name="text">The range.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <exception cref="FlowDuctException">The text is no range of this quantity; kind NotUnderstood.</exception>
    public static ValueRange Parse(in ValueContext context, string text, double ambientPressure)
    {
        int dots = text.IndexOf("..", StringComparison.Ordinal);
        (string end, string word, string spacing) = Cut(context, text, text[(dots + 2)..].Trim());
        GivenValue last = ValueParser.Parse(context, end, ambientPressure);
        GivenValue first = ValueParser.Parse(context, WithUnit(text[..dots].Trim(), last.Unit.Spelling), ambientPressure);
        if (first.Si == last.Si) throw context.Refuse($"{context.Shown(text)} begins where it ends", "give one value, or two that differ");
        return new ValueRange(first.Si, last.Si, word == "in" ? Points(context, text, spacing) : Steps(context, text, spacing, last.Si - first.Si));
    }

    private static (string End, string Word, string Spacing) Cut(in ValueContext context, string text, string right)
    {
        foreach (string word in (string[])["by", "in"])
        {
            int at = right.IndexOf($" {word} ", StringComparison.Ordinal);
            if (at > 0) return (right[..at].TrimEnd(), word, right[(at + 4)..].Trim());
        }

        throw context.Refuse($"{context.Shown(text)} says no step", $"write for example {context.Prefix}{Echo.Ascii(text)} in 11 points, or by a step with its unit");
    }

    // The unit stands once, behind the last value.
    private static string WithUnit(string number, string unit) =>
        unit == "1" || NumberParser.Measure(number, out _) < number.Length ? number : $"{number} {unit}";

    private static int Points(in ValueContext context, string text, string spacing)
    {
        string[] words = spacing.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        bool said = words.Length == 2 && words[1] == "points" && words[0].All(char.IsAsciiDigit) && words[0].Length <= 5;
        int count = said ? int.Parse(words[0], System.Globalization.CultureInfo.InvariantCulture) : 0;
        return count is >= 2 and <= MostPoints ? count : throw context.Refuse(
            $"{context.Shown(text)}: {Echo.Ascii(spacing)} is not a number of points from 2 to {MostPoints}", "write for example in 11 points");
    }

    private static int Steps(in ValueContext context, string text, string spacing, double length)
    {
        double step = Math.Abs(ValueParser.Parse(new ValueContext(context.Place, StepOf(context.Row), string.Empty), spacing, 0).Si);
        if (step == 0) throw context.Refuse($"{context.Shown(text)} has a step of zero", "give a step above zero");
        double steps = Math.Abs(length) / step, whole = Math.Round(steps);
        if (whole is < 1 or >= MostPoints) throw context.Refuse($"{context.Shown(text)} has {(whole < 1 ? "a step longer than itself" : $"more than {MostPoints} values")}", "give another step");
        return Math.Abs(steps - whole) <= WholeStep ? (int)whole + 1 : throw context.Refuse(
            $"{context.Shown(text)} is {NumberFormatter.Shortest(steps, 4)} steps long, no whole number", $"move an end, or write in {(int)whole + 1} points");
    }

    // A step of temperature or pressure is a difference: no offset, no basis.
    private static QuantityRow StepOf(QuantityRow row) => new()
    {
        Key = row.Key,
        Symbol = row.Symbol,
        Word = "step",
        Name = "step",
        Dimension = row.Dimension switch
        {
            Dimension.Temperature => Dimension.TemperatureDifference,
            Dimension.Pressure => Dimension.PressureDifference,
            Dimension other => other,
        },
        Kind = row.Kind,
        JsonKey = row.JsonKey,
        Help = row.Help,
        Example = row.Example,
    };
}
