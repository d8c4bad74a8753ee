using System.Globalization;

namespace FlowDuct.Quantities;

/// <summary>Reads decimal numbers by a grammar of our own, the same on every machine and under every locale.</summary>
/// <remarks>
/// number = [sign] digits [ "." digits ] [ ("e" or "E") [sign] digits ]. A point must be followed by a digit, so that "4..12"
/// splits into 4 and 12. No thousands separators, no decimal comma, no hexadecimal, no names for what is not a number.
/// </remarks>
internal static class NumberParser
{
    /// <summary>Exponents with more digits than this are far outside a double, and would overflow an int when summed.</summary>
    private const int MostExponentDigits = 6;

    /// <summary>Reads a text that is one number and nothing else.</summary>
    /// <param name="text">The text, without spaces around it.</param>
    /// <param name="number">The number, finite.</param>
    /// <param name="problem">Why the text is refused, as the end of a sentence; empty on success.</param>
    /// <returns>True where the whole text is a number.</returns>
    public static bool TryParse(ReadOnlySpan<char> text, out PrintedNumber number, out string problem)
    {
        number = default;
        int length = Measure(text, out int lastPlace);
        if (length == 0 || length < text.Length)
        {
            problem = NumberProblem.Describe(text);
            return false;
        }

        double value = double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
        double halfPlace = HalfOfPlace(lastPlace);
        problem = SizeProblem(text, value, halfPlace);
        number = problem.Length == 0 ? new PrintedNumber(value, halfPlace) : default;
        return problem.Length == 0;
    }

    /// <summary>Length of the longest number at the start of a text; 0 where it starts with none.</summary>
    /// <param name="text">The text.</param>
    /// <param name="lastPlace">Power of ten of the last printed place.</param>
    public static int Measure(ReadOnlySpan<char> text, out int lastPlace)
    {
        lastPlace = 0;
        int at = SkipSign(text, 0);
        int digits = CountDigits(text, at);
        if (digits == 0)
            return 0;
        at += digits;
        if (at < text.Length && text[at] == '.')
        {
            int decimals = CountDigits(text, at + 1);
            at += decimals == 0 ? 0 : decimals + 1;
            lastPlace = -decimals;
        }

        return at + MeasureExponent(text[at..], ref lastPlace);
    }

    /// <summary>0.5 times a power of ten, correctly rounded; Math.Pow differs between platforms in its last digit.</summary>
    private static double HalfOfPlace(int place)
    {
        ReadOnlySpan<double> common = [0.5, 0.05, 0.005, 0.0005, 0.00005, 0.000005, 0.0000005];
        if (place <= 0 && -place < common.Length)
            return common[-place];
        string half = string.Create(CultureInfo.InvariantCulture, $"5E{place - 1}");
        return double.Parse(half, NumberStyles.Float, CultureInfo.InvariantCulture);
    }

    private static int MeasureExponent(ReadOnlySpan<char> text, ref int lastPlace)
    {
        if (text.IsEmpty || (text[0] != 'e' && text[0] != 'E'))
            return 0;
        int start = SkipSign(text, 1);
        int digits = CountDigits(text, start);
        if (digits == 0)
            return 0;
        int exponent = ExponentOf(text.Slice(start, digits));
        lastPlace += text[1] == '-' ? -exponent : exponent;
        return start + digits;
    }

    private static int ExponentOf(ReadOnlySpan<char> digits)
    {
        ReadOnlySpan<char> significant = digits.TrimStart('0');
        if (significant.IsEmpty)
            return 0;
        return significant.Length > MostExponentDigits
            ? 9_999_999
            : int.Parse(significant, NumberStyles.None, CultureInfo.InvariantCulture);
    }

    private static string SizeProblem(ReadOnlySpan<char> text, double value, double halfPlace)
    {
        if (!double.IsFinite(value) || !double.IsFinite(halfPlace))
            return $"{text} is too large; the greatest number is 1.79e308";
        return value == 0 && HasNonZeroDigit(text) ? $"{text} is too small; the least positive number is 4.9e-324" : string.Empty;
    }

    private static bool HasNonZeroDigit(ReadOnlySpan<char> text)
    {
        int exponent = text.IndexOfAny('e', 'E');
        return (exponent < 0 ? text : text[..exponent]).ContainsAnyInRange('1', '9');
    }

    private static int SkipSign(ReadOnlySpan<char> text, int at) => at < text.Length && (text[at] is '+' or '-') ? at + 1 : at;

    private static int CountDigits(ReadOnlySpan<char> text, int start)
    {
        int at = start;
        while (at < text.Length && char.IsAsciiDigit(text[at]))
            at++;
        return Math.Max(at - start, 0);
    }
}
