using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Sweep;

/// <summary>Reads the range of a variation: "4..12 bar by 0.5 bar", "200..300 degC in 11 points", "1..100 bar in 5 points log".</summary>
internal static class RangeParser
{
    private static readonly string[] s_rules = [" by ", " in ", " log "];

    private const int MostPoints = 1_000_000;

    /// <summary>Reads a range.</summary>
    /// <param name="name">The input that varies.</param>
    /// <param name="row">Its quantity.</param>
    /// <param name="text">The range.</param>
    internal static Variation Parse(string name, QuantityRow row, string text)
    {
        int dots = text.IndexOf("..", StringComparison.Ordinal);
        (double from, string fromText, string left) = Number(name, text[..dots]);
        (double to, string toText, string rest) = Number(name, text[(dots + 2)..]);
        (string unit, string rule) = SplitRule(name, rest);
        if (left.Length > 0 && left != unit) throw VariationRefusals.TwoUnits(name, left, unit);
        UnitReading reading = UnitOf(name, row, unit);
        IReadOnlyList<double> values = rule.StartsWith("by ", StringComparison.Ordinal) ? ByStep(name, row, reading, from, to, rule[3..]) : InPoints(name, reading, from, to, rule);
        return new Variation(name, unit, [.. values.Select(value => Text(value, (from, fromText), (to, toText)))]);
    }

    // The ends stay as they were typed; 15 digits between them leave no trace of binary fractions.
    private static string Text(double value, (double Value, string Text) from, (double Value, string Text) to) =>
        value == from.Value ? from.Text : value == to.Value ? to.Text : NumberFormatter.Shortest(value, 15);

    private static (double Value, string Text, string Behind) Number(string name, string text)
    {
        string trimmed = text.Trim();
        int length = NumberParser.Measure(trimmed, out _);
        bool read = NumberParser.TryParse(trimmed.AsSpan(0, length), out PrintedNumber number, out _);
        return read ? (number.Value, trimmed[..length], trimmed[length..].Trim()) : throw VariationRefusals.NoNumber(name, trimmed);
    }

    // "bar by 0.5 bar", "degC in 11 points log", "% log in 5 points".
    private static (string Unit, string Rule) SplitRule(string name, string rest)
    {
        string padded = " " + rest;
        int at = s_rules.Select(word => padded.IndexOf(word, StringComparison.Ordinal)).Where(index => index >= 0).DefaultIfEmpty(-1).Min();
        return at < 0 ? throw VariationRefusals.NoRule(name) : (padded[..at].Trim(), padded[at..].Trim());
    }

    private static UnitReading UnitOf(string name, QuantityRow row, string unit)
    {
        bool needsNone = unit.Length == 0 && row.Dimension is Dimension.Ratio or Dimension.Count;
        foreach (Dimension dimension in (Dimension[])[row.Dimension, .. row.AlsoGivenAs])
        {
            if (UnitTable.TryFind(needsNone ? "1" : unit, dimension, out UnitReading reading)) return reading;
        }

        throw unit.Length == 0 ? VariationRefusals.NoUnit(name, row) : VariationRefusals.Unit(name, UnitSuggestion.For(unit, row));
    }

    private static double[] ByStep(string name, QuantityRow row, in UnitReading unit, double from, double to, string text)
    {
        double step = Step(name, row, unit, text);
        double count = Math.Floor((Math.Abs(to - from) / step) + 1e-9) + 1;
        if (count > MostPoints) throw VariationRefusals.TooMany(name, MostPoints);
        double signed = to < from ? -step : step;
        double[] values = [.. Enumerable.Range(0, (int)count).Select(i => from + (i * signed))];
        if (Math.Abs(values[^1] - to) <= 1e-9 * step) values[^1] = to;
        return values;
    }

    // A step is a difference: 10 K is one of 10 degC, 0.5 bar one of 0.5 barg.
    private static double Step(string name, QuantityRow row, in UnitReading unit, string text)
    {
        (double size, _, string own) = Number(name, text);
        if (!(size > 0)) throw VariationRefusals.NoStep(name, text);
        if (own.Length == 0 || own == unit.Spelling) return size;
        Dimension difference = unit.Dimension switch
        {
            Dimension.Pressure => Dimension.PressureDifference,
            Dimension.Temperature => Dimension.TemperatureDifference,
            _ => unit.Dimension,
        };
        if (!UnitTable.TryFind(own, difference, out UnitReading reading)) throw VariationRefusals.Unit(name, UnitTable.Suggest(own, difference));
        return UnitConverter.IntervalToSi(size, reading) / UnitConverter.IntervalToSi(1, unit);
    }

    private static double[] InPoints(string name, in UnitReading unit, double from, double to, string rule)
    {
        string[] words = rule.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        bool log = words.Contains("log");
        string[] rest = [.. words.Where(word => word != "log")];
        bool shaped = rest is ["in", _, "points"] && words.Length - rest.Length <= 1;
        bool read = NumberParser.TryParse(shaped ? rest[1] : string.Empty, out PrintedNumber number, out _);
        if (!read || number.Value != Math.Floor(number.Value) || !(number.Value is >= 2 and <= MostPoints)) throw VariationRefusals.NoRule(name);
        if (log && (!(from > 0 && to > 0) || unit.NeedsAmbient || unit.Unit.Offset != 0)) throw VariationRefusals.NoLog(name);
        int last = (int)number.Value - 1;
        double[] values = [.. Enumerable.Range(0, last + 1).Select(i => log ? from * Math.Exp(Math.Log(to / from) * i / last) : from + ((to - from) * i / last))];
        (values[0], values[^1]) = (from, to);
        return values;
    }
}
