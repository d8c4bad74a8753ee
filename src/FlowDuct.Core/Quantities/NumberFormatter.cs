using System.Globalization;

namespace FlowDuct.Quantities;

/// <summary>Prints numbers for people: significant digits, no locale, the same bytes on every platform.</summary>
internal static class NumberFormatter
{
    private const int LeastPlainExponent = -4;
    private const int FirstExponentOfLarge = 7;

    /// <summary>A number with a fixed count of significant digits, trailing zeros kept: 230.00 with five.</summary>
    /// <param name="value">A finite number.</param>
    /// <param name="digits">Significant digits, 1 to 17.</param>
    /// <returns>Plain decimals from 1e-4 up to 1e7, else with an exponent; never "-0".</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite, or the count is outside 1 to 17.</exception>
    public static string Significant(double value, int digits)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(digits, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(digits, 17);
        if (!double.IsFinite(value))
            throw new ArgumentOutOfRangeException(nameof(value), value, "Only finite numbers are printed.");

        // "E" rounds the exact binary value, once, a tie to the even digit; the digits are only put in place below.
        string format = "E" + (digits - 1).ToString(CultureInfo.InvariantCulture);
        string scientific = (value == 0 ? 0 : value).ToString(format, CultureInfo.InvariantCulture);
        int e = scientific.IndexOf('E', StringComparison.Ordinal);
        int exponent = int.Parse(scientific.AsSpan(e + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        ReadOnlySpan<char> mantissa = scientific.AsSpan(0, e);
        return exponent is >= LeastPlainExponent and < FirstExponentOfLarge
            ? Plain(mantissa, exponent)
            : string.Create(CultureInfo.InvariantCulture, $"{mantissa}e{exponent}");
    }

    /// <summary>A number with at most a count of significant digits, without trailing zeros: 230.</summary>
    /// <param name="value">A finite number.</param>
    /// <param name="digits">Significant digits at most, 1 to 17.</param>
    public static string Shortest(double value, int digits)
    {
        string text = Significant(value, digits);
        int e = text.IndexOf('e', StringComparison.Ordinal);
        string mantissa = e < 0 ? text : text[..e];
        string tail = e < 0 ? string.Empty : text[e..];
        return mantissa.Contains('.', StringComparison.Ordinal) ? mantissa.TrimEnd('0').TrimEnd('.') + tail : text;
    }

    private static string Plain(ReadOnlySpan<char> mantissa, int exponent)
    {
        string sign = mantissa[0] == '-' ? "-" : string.Empty;
        string digits = mantissa[sign.Length..].ToString().Replace(".", string.Empty, StringComparison.Ordinal);
        if (exponent < 0)
            return $"{sign}0.{new string('0', -exponent - 1)}{digits}";
        int whole = exponent + 1;
        return digits.Length > whole ? $"{sign}{digits[..whole]}.{digits[whole..]}" : sign + digits.PadRight(whole, '0');
    }
}
