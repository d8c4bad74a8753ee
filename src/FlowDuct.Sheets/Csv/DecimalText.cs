using System.Globalization;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Csv;

/// <summary>
/// Writes numbers as <see cref="NumberFormatter.Shortest"/> does, in bytes and without a text in between. A decimal is scaled to a whole
/// number of the digits wanted; where the scaled value is so near a tie that the scaling itself could decide, the slow way is taken.
/// </summary>
internal static class DecimalText
{
    /// <summary>Longest text of a number, in bytes.</summary>
    internal const int MostBytes = 32;

    // Whole powers up to here are exact doubles, so scaling rounds once.
    private const int LastExactPower = 22;
    private const int MostQuickDigits = 9;
    private const int LeastPlainExponent = -4;
    private const int FirstExponentOfLarge = 7;

    // A product of two doubles is off by 2^-53 of itself; with nine digits that is below 1.2e-7 of the last one.
    private const double TieGuard = 1e-6;

    private static readonly double[] s_powers = [.. Enumerable.Range(0, LastExactPower + 1).Select(power => double.Parse("1e" + power.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture))];

    /// <summary>Writes a finite number with so many significant digits at most; returns the count of bytes.</summary>
    internal static int Write(double value, int digits, byte decimalMark, Span<byte> to)
    {
        if (value == 0)
        {
            to[0] = (byte)'0';
            return 1;
        }

        double size = Math.Abs(value);
        if (digits > MostQuickDigits || size is < 1e-4 or >= 1e7 || !TryScale(size, digits, out long whole, out int exponent)) return Slow(value, digits, decimalMark, to);
        int sign = 0;
        if (value < 0) to[sign++] = (byte)'-';
        return sign + Place(whole, digits, exponent, decimalMark, to[sign..]);
    }

    private static bool TryScale(double size, int digits, out long whole, out int exponent)
    {
        exponent = ExponentOf(size);
        int power = digits - 1 - exponent;
        double scaled = power >= 0 ? size * s_powers[power] : size / s_powers[-power];
        whole = (long)scaled;
        double rest = scaled - whole;
        if (Math.Abs(rest - 0.5) < TieGuard) return false;
        if (rest > 0.5) whole++;
        if (whole < (long)s_powers[digits]) return true;
        whole /= 10;
        exponent++;
        return exponent < FirstExponentOfLarge;
    }

    // From 1e-4 up to 1e7 only.
    private static int ExponentOf(double size)
    {
        int exponent = LeastPlainExponent;
        if (size >= 1)
        {
            exponent = 0;
            while (size >= s_powers[exponent + 1]) exponent++;
            return exponent;
        }

        ReadOnlySpan<double> tenths = [1e-3, 1e-2, 1e-1];
        foreach (double tenth in tenths) exponent += size >= tenth ? 1 : 0;
        return exponent;
    }

    private static int Place(long whole, int digits, int exponent, byte decimalMark, Span<byte> to)
    {
        Span<byte> text = stackalloc byte[MostQuickDigits];
        for (int i = digits - 1; i >= 0; i--)
        {
            long tens = whole / 10;
            text[i] = (byte)('0' + (whole - (tens * 10)));
            whole = tens;
        }

        return exponent >= 0 ? AboveOne(text, digits, exponent, decimalMark, to) : BelowOne(text, digits, exponent, decimalMark, to);
    }

    private static int AboveOne(ReadOnlySpan<byte> text, int digits, int exponent, byte decimalMark, Span<byte> to)
    {
        int ahead = exponent + 1, used = digits;
        while (used > ahead && text[used - 1] == '0') used--;
        for (int i = 0; i < ahead; i++) to[i] = i < digits ? text[i] : (byte)'0';
        if (used <= ahead) return ahead;
        to[ahead] = decimalMark;
        text[ahead..used].CopyTo(to[(ahead + 1)..]);
        return used + 1;
    }

    private static int BelowOne(ReadOnlySpan<byte> text, int digits, int exponent, byte decimalMark, Span<byte> to)
    {
        int used = digits, zeros = -exponent - 1;
        while (text[used - 1] == '0') used--;
        to[0] = (byte)'0';
        to[1] = decimalMark;
        to.Slice(2, zeros).Fill((byte)'0');
        text[..used].CopyTo(to[(2 + zeros)..]);
        return 2 + zeros + used;
    }

    private static int Slow(double value, int digits, byte decimalMark, Span<byte> to)
    {
        string text = NumberFormatter.Shortest(value, digits);
        int count = System.Text.Encoding.ASCII.GetBytes(text, to);
        int point = to[..count].IndexOf((byte)'.');
        if (point >= 0) to[point] = decimalMark;
        return count;
    }
}
