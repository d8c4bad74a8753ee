using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>Reads a value with its unit, such as "9 bar", "230degC", "96%", for a row of the catalogue.</summary>
internal static class ValueParser
{
    /// <summary>Reads the value of an option or cell.</summary>
    /// <param name="place">The option, or file, row and column, as typed.</param>
    /// <param name="row">The quantity.</param>
    /// <param name="text">The text; spaces around and before the unit are free.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <exception cref="FlowDuctException">The text is not a value of this quantity; kind NotUnderstood.</exception>
    public static GivenValue Parse(string place, QuantityRow row, string text, double ambientPressure) =>
        Parse(new ValueContext(place, row, string.Empty), text, ambientPressure);

    /// <summary>Reads the value of a cell whose column says the unit; a unit in the cell wins.</summary>
    /// <param name="place">File, row and column.</param>
    /// <param name="row">The quantity.</param>
    /// <param name="text">The text of the cell.</param>
    /// <param name="columnUnit">The unit of the column.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa, for gauge and vacuum readings.</param>
    /// <exception cref="FlowDuctException">The text is not a value of this quantity; kind NotUnderstood.</exception>
    public static GivenValue ParseCell(string place, QuantityRow row, string text, in UnitReading columnUnit, double ambientPressure)
    {
        ValueContext context = new(place, row, string.Empty);
        string trimmed = text.Trim();
        int length = NumberParser.Measure(trimmed, out _);
        return length == trimmed.Length && length > 0
            ? Finish(context, trimmed, ReadNumber(context, trimmed, length), columnUnit, ambientPressure)
            : Parse(context, text, ambientPressure);
    }

    /// <summary>Reads a value; the context carries what a message shows before it.</summary>
    internal static GivenValue Parse(in ValueContext context, string text, double ambientPressure)
    {
        string trimmed = text.Trim();
        int length = NumberParser.Measure(trimmed, out _);
        PrintedNumber number = ReadNumber(context, trimmed, length);
        UnitReading unit = FindUnit(context, trimmed, trimmed[length..].Trim());
        return Finish(context, trimmed, number, unit, ambientPressure);
    }

    private static PrintedNumber ReadNumber(in ValueContext context, string text, int length)
    {
        // What follows a number starts with a letter or % where it is a unit; anything else belongs to a number gone wrong.
        string rest = text[length..].TrimStart();
        bool restIsNumber = rest.Length > 0 && (rest[0] is ',' or '.' or '\'' or ':' or '_' or '\u2019' || char.IsAsciiDigit(rest[0]));
        if (length == 0 || restIsNumber || IsHexadecimal(text, length))
            throw context.NotANumber(text);
        if (!NumberParser.TryParse(text.AsSpan(0, length), out PrintedNumber number, out string problem))
            throw context.Refuse(problem);
        return number;
    }

    private static bool IsHexadecimal(string text, int length) =>
        length < text.Length && text[length] is 'x' or 'X' && text.AsSpan(0, length).TrimStart("+-") is "0";

    private static UnitReading FindUnit(in ValueContext context, string text, string spelling)
    {
        bool needsNone = context.Row.Dimension is Dimension.Ratio or Dimension.Count;
        if (spelling.Length == 0 && !needsNone)
            throw context.NoUnit(text);
        string wanted = spelling.Length == 0 ? "1" : spelling;
        if (UnitTable.TryFind(wanted, context.Row.Dimension, out UnitReading reading))
            return reading;
        foreach (Dimension other in context.Row.AlsoGivenAs)
        {
            if (UnitTable.TryFind(wanted, other, out reading))
                return reading;
        }

        throw context.WrongUnit(text, spelling);
    }

    /// <summary>True for the end of a fraction: x=1 means saturated vapour and an efficiency of 1 no loss, no reading that was rounded.</summary>
    internal static bool IsAnEnd(QuantityRow row, double si) =>
        row.Dimension == Dimension.Ratio && (si == row.Limits.Greatest || (row.Limits.IncludesLeast && si == row.Limits.Least));

    private static GivenValue Finish(
        in ValueContext context, string text, PrintedNumber number, in UnitReading unit, double ambientPressure)
    {
        double si = UnitConverter.ToSi(number.Value, unit, ambientPressure);
        double halfWidth = IsAnEnd(context.Row, si) ? 0 : UnitConverter.IntervalToSi(number.HalfPlace, unit);
        GivenValue given = new(si, halfWidth, text, unit);
        RangeCheck.Require(context, given, ambientPressure);
        return given;
    }
}
