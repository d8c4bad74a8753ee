using System.Globalization;
using System.Text;

namespace FlowDuct.Quantities;

/// <summary>Shows typed text in a message: ASCII only, so that it reads the same in every terminal and log.</summary>
internal static class Echo
{
    /// <summary>The text with every control and non-ASCII character written as \uXXXX.</summary>
    /// <param name="text">Text as typed.</param>
    public static string Ascii(ReadOnlySpan<char> text)
    {
        if (!text.ContainsAnyExceptInRange(' ', '~'))
            return text.ToString();
        StringBuilder shown = new();
        foreach (char c in text)
            _ = c is >= ' ' and <= '~' ? shown.Append(c) : shown.Append(CultureInfo.InvariantCulture, $"\\u{(int)c:x4}");
        return shown.ToString();
    }
}
