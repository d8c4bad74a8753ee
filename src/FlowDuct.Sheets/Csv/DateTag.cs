namespace FlowDuct.Sheets.Csv;

/// <summary>Spreadsheets turn tags such as MAR-12 or 3-1 into dates when a sheet is opened; this knows what they make of them.</summary>
internal static class DateTag
{
    private static ReadOnlySpan<byte> Months => "janfebmaraprmayjunjulaugsepoctnovdec"u8;

    /// <summary>True for 12-Mar, Mar-12, 12-Mar-26, 2026-03-12, 12/03/2026, 12.03.2026.</summary>
    internal static bool LooksLike(ReadOnlySpan<byte> tag)
    {
        if (tag.Length is < 5 or > 11) return false;
        Span<Range> parts = stackalloc Range[4];
        byte mark = tag.Contains((byte)'/') ? (byte)'/' : tag.Contains((byte)'-') ? (byte)'-' : (byte)'.';
        int count = 0;
        foreach (Range part in tag.Split(mark))
        {
            if (count == 4) return false;
            parts[count++] = part;
        }

        return count switch
        {
            2 => mark == '-' && (IsMonth(tag[parts[0]]) ? IsNumber(tag[parts[1]], 2, 4) : IsMonth(tag[parts[1]]) && IsNumber(tag[parts[0]], 1, 2)),
            3 => IsDate(tag[parts[0]], tag[parts[1]], tag[parts[2]]),
            _ => false,
        };
    }

    private static bool IsDate(ReadOnlySpan<byte> first, ReadOnlySpan<byte> middle, ReadOnlySpan<byte> last)
    {
        bool month = IsMonth(middle) || IsNumber(middle, 1, 2);
        return month && ((IsNumber(first, 4, 4) && IsNumber(last, 1, 2)) || (IsNumber(first, 1, 2) && (IsNumber(last, 4, 4) || (IsMonth(middle) && IsNumber(last, 2, 2)))));
    }

    private static bool IsMonth(ReadOnlySpan<byte> text)
    {
        if (text.Length != 3) return false;
        for (int month = 0; month < Months.Length; month += 3)
        {
            if (System.Text.Ascii.EqualsIgnoreCase(text, Months.Slice(month, 3))) return true;
        }

        return false;
    }

    private static bool IsNumber(ReadOnlySpan<byte> text, int least, int most) =>
        text.Length >= least && text.Length <= most && !text.ContainsAnyExceptInRange((byte)'0', (byte)'9');
}
