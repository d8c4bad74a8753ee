namespace FlowDuct.Quantities;

/// <summary>Says why a text is no number, with the way to write it; called only when a text was refused.</summary>
internal static class NumberProblem
{
    /// <summary>Why <paramref name="text"/> is no number, as a sentence without its stop.</summary>
    /// <param name="text">The text that the number parser refused.</param>
    public static string Describe(ReadOnlySpan<char> text)
    {
        if (text.IsEmpty)
            return "there is no number";
        string shown = Echo.Ascii(text);
        if (IsNamed(text))
            return $"{shown} is not a finite number";
        if (text.Contains('\u2212'))
            return $"{shown} has a typographic minus sign; write a hyphen, -";
        int length = NumberParser.Measure(text, out _);
        return length == 0 ? DescribeStart(text, shown) : DescribeRest(text, length, shown);
    }

    private static bool IsNamed(ReadOnlySpan<char> text)
    {
        ReadOnlySpan<char> bare = text.TrimStart("+-");
        return bare.Equals("nan", StringComparison.OrdinalIgnoreCase)
            || bare.StartsWith("inf", StringComparison.OrdinalIgnoreCase)
            || bare.Equals("\u221e", StringComparison.Ordinal);
    }

    private static string DescribeStart(ReadOnlySpan<char> text, string shown) =>
        text.TrimStart("+-").StartsWith(".", StringComparison.Ordinal)
            ? $"{shown} has no digit before its point; write for example 0.5"
            : $"{shown} is not a number; write for example 1.5 or 2e5";

    private static string DescribeRest(ReadOnlySpan<char> text, int length, string shown)
    {
        char next = text[length];
        bool digitFollows = length + 1 < text.Length && char.IsAsciiDigit(text[length + 1]);
        return next switch
        {
            ',' when digitFollows => $"{shown} has a decimal comma; write {Echo.Ascii(text[..length])}.{Echo.Ascii(text[(length + 1)..])}",
            '.' when text[..length].Contains('.') => $"{shown} has two points",
            '.' => $"{shown} has no digit after its point; write {Echo.Ascii(text[..length])} or {Echo.Ascii(text[..length])}.0",
            '\'' or '_' or ' ' or '\u00a0' or '\u2019' => $"{shown} has a thousands separator; write the digits without a gap",
            ':' => $"{shown} is a ratio of two numbers; write it as one number",
            'x' or 'X' when text[..length].TrimStart("+-") is "0" => $"{shown} is hexadecimal; write a decimal number",
            _ => $"{shown} is not a number; write for example 1.5 or 2e5",
        };
    }
}
