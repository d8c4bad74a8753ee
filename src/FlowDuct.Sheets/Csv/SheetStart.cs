using FlowDuct.Errors;

namespace FlowDuct.Sheets.Csv;

/// <summary>Reads as much of a sheet as tells how it is written, and gives the rest of it to the reader.</summary>
internal static class SheetStart
{
    // A heading longer than this is no heading.
    private const int MostBytes = 1 << 20;

    /// <summary>The dialect of a sheet and the sheet from its heading on.</summary>
    /// <exception cref="FlowDuctException">It is empty, or no UTF-8; kind NotUnderstood.</exception>
    internal static (SheetDialect Dialect, Stream Sheet) Read(Stream sheet, string name, bool decimalComma)
    {
        using var guarded = new PrefixedStream(default, sheet, name);
        byte[] start = Fill(guarded, name, out int count);
        ReadOnlySpan<byte> bytes = start.AsSpan(0, count);
        RefuseOtherEncodings(bytes, name);
        bool hasMark = bytes.StartsWith(SheetDialect.Mark);
        int at = hasMark ? SheetDialect.Mark.Length : 0;
        int declared = DeclarationLength(bytes[at..]);
        ReadOnlyMemory<byte> declaration = start.AsMemory(at, declared);
        if (declared > 0) at += declared + LineEndAt(bytes[(at + declared)..]).Length;
        ReadOnlySpan<byte> heading = bytes[at..];
        if (heading.Trim(" \r\n"u8).IsEmpty) throw Refuse(name, "the sheet is empty", "give a heading and at least one row");
        byte separator = declared > 0 ? declaration.Span[^1] : SeparatorOf(heading, out _);
        SeparatorOf(heading, out int end);
        byte[] lineEnd = LineEndAt(heading[end..]).ToArray();
        var dialect = new SheetDialect(separator, decimalComma ? (byte)',' : (byte)'.', lineEnd.Length == 0 ? "\n"u8.ToArray() : lineEnd, hasMark, declaration);
        return (dialect, new PrefixedStream(start.AsMemory(at, count - at), sheet, name));
    }

    // Until the heading has ended, or the sheet.
    private static byte[] Fill(Stream sheet, string name, out int count)
    {
        byte[] start = new byte[1 << 12];
        count = 0;
        while (true)
        {
            int read = sheet.Read(start, count, start.Length - count);
            count += read;
            ReadOnlySpan<byte> seen = start.AsSpan(0, count);
            int declared = DeclarationLength(seen.StartsWith(SheetDialect.Mark) ? seen[SheetDialect.Mark.Length..] : seen);
            SeparatorOf(declared > 0 ? seen[(declared + 1)..] : seen, out int end);
            bool ended = end < seen.Length - declared - 2;
            if (read == 0 || ended) return start;
            if (count == MostBytes) throw Refuse(name, "the heading does not end within a megabyte", "look for a quote that is not closed");
            if (count == start.Length) Array.Resize(ref start, start.Length * 2);
        }
    }

    private static void RefuseOtherEncodings(ReadOnlySpan<byte> bytes, string name)
    {
        bool utf16 = bytes.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || bytes.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]);
        if (utf16 || bytes[..Math.Min(bytes.Length, 64)].Contains((byte)0)) throw Refuse(name, "the sheet is not UTF-8", "save it as CSV UTF-8");
    }

    // "sep=;" is what a spreadsheet writes to tell itself the separator.
    private static int DeclarationLength(ReadOnlySpan<byte> bytes) =>
        bytes.StartsWith("sep="u8) && bytes.Length > 5 && bytes[4] is (byte)',' or (byte)';' or (byte)'\t' && bytes[5] is (byte)'\r' or (byte)'\n' ? 5 : 0;

    private static ReadOnlySpan<byte> LineEndAt(ReadOnlySpan<byte> bytes) => bytes.StartsWith("\r\n"u8) ? "\r\n"u8 : bytes.IsEmpty ? default : bytes[..1];

    // The most frequent candidate outside quotes; no unit holds one.
    private static byte SeparatorOf(ReadOnlySpan<byte> heading, out int end)
    {
        (int comma, int semicolon, int tab) = (0, 0, 0);
        bool quoted = false;
        for (end = 0; end < heading.Length; end++)
        {
            byte at = heading[end];
            if (at == '"') quoted = !quoted;
            if (quoted) continue;
            if (at is (byte)'\n' or (byte)'\r') break;
            comma += at == ',' ? 1 : 0;
            semicolon += at == ';' ? 1 : 0;
            tab += at == '\t' ? 1 : 0;
        }

        if (tab > comma && tab > semicolon) return (byte)'\t';
        return semicolon > comma ? (byte)';' : (byte)',';
    }

    private static FlowDuctException Refuse(string name, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, name, reason, next));
}
