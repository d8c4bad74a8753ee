namespace FlowDuct.Sheets.Csv;

/// <summary>
/// Reads the plain decimals that nearly every cell holds. Its digits make a whole number; below 2^53 it and its power of ten are exact
/// doubles, so one division rounds correctly (W. D. Clinger, PLDI 1990). Anything else is left to the parser of the core.
/// </summary>
internal static class DecimalCell
{
    // More would overflow the sum.
    private const int MostDigits = 18;
    private const long LastExact = 1L << 53;

    private static readonly double[] s_powers = [1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18];
    private static readonly double[] s_halves = [0.5, 0.05, 0.005, 0.0005, 0.00005, 0.000005, 0.0000005, 0.00000005, 0.000000005, 0.0000000005];

    /// <summary>Reads a cell that is one plain decimal.</summary>
    /// <param name="text">The cell, without spaces around it.</param>
    /// <param name="decimalMark">Point or comma.</param>
    /// <param name="value">The number.</param>
    /// <param name="halfPlace">Half of its last printed place.</param>
    /// <returns>False where the cell is anything else.</returns>
    internal static bool TryRead(ReadOnlySpan<byte> text, byte decimalMark, out double value, out double halfPlace)
    {
        (value, halfPlace) = (0, 0);
        bool negative = text.Length > 0 && text[0] == '-';
        ReadOnlySpan<byte> digits = negative ? text[1..] : text;
        if (digits.Length is 0 or > MostDigits || !TryDigits(digits, decimalMark, out long whole, out int decimals)) return false;
        if (whole >= LastExact || decimals >= s_halves.Length) return false;
        value = decimals == 0 ? whole : whole / s_powers[decimals];
        if (negative) value = -value;
        halfPlace = s_halves[decimals];
        return true;
    }

    private static bool TryDigits(ReadOnlySpan<byte> text, byte decimalMark, out long whole, out int decimals)
    {
        whole = 0;
        decimals = 0;
        int point = -1;
        for (int i = 0; i < text.Length; i++)
        {
            int digit = text[i] - '0';
            if ((uint)digit <= 9) whole = (whole * 10) + digit;
            else if (text[i] == decimalMark && point < 0 && i > 0) point = i;
            else return false;
        }

        decimals = point < 0 ? 0 : text.Length - 1 - point;
        return point < 0 || decimals > 0;
    }
}
