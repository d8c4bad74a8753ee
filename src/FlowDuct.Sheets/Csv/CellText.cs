namespace FlowDuct.Sheets.Csv;

/// <summary>Writes text of our own into a cell: quoted where it must be, and never such that a spreadsheet would run it.</summary>
internal static class CellText
{
    /// <summary>Writes a text as one cell.</summary>
    internal static void Write(ByteSink to, string text, byte separator) => WriteQuoted(to, Guarded(text), separator);

    /// <summary>The same for a text that was typed by the reader, such as a negative number.</summary>
    internal static void WriteQuoted(ByteSink to, string safe, byte separator)
    {
        bool quoted = safe.AsSpan().ContainsAny(['"', '\n', '\r', (char)separator]);
        if (!quoted)
        {
            to.Write(safe);
            return;
        }

        to.Write((byte)'"');
        to.Write(safe.Replace("\"", "\"\"", StringComparison.Ordinal));
        to.Write((byte)'"');
    }

    // A spreadsheet takes a cell that begins so for a formula; an apostrophe makes it text.
    private static string Guarded(string text) => text.Length > 0 && text[0] is '=' or '+' or '-' or '@' or '\t' or '\r' ? "'" + text : text;
}
