namespace FlowDuct.Sheets.Csv;

/// <summary>How a sheet is written; results are written the same way.</summary>
/// <param name="Separator">Between the cells: comma, semicolon or tab, as the heading has it.</param>
/// <param name="DecimalMark">Point, or comma where it was declared.</param>
/// <param name="LineEnd">Of the heading.</param>
/// <param name="HasMark">True where the file begins with the byte-order mark of UTF-8.</param>
/// <param name="Declaration">A first line such as "sep=;", without its end; empty where there is none.</param>
internal sealed record SheetDialect(byte Separator, byte DecimalMark, ReadOnlyMemory<byte> LineEnd, bool HasMark, ReadOnlyMemory<byte> Declaration)
{
    /// <summary>The byte-order mark of UTF-8.</summary>
    internal static ReadOnlySpan<byte> Mark => [0xEF, 0xBB, 0xBF];

    /// <summary>The lines of this program where there is no sheet to follow.</summary>
    internal static readonly SheetDialect Plain = new((byte)',', (byte)'.', "\n"u8.ToArray(), false, default);

    /// <summary>What stands before the heading.</summary>
    internal void WriteOpening(ByteSink to)
    {
        if (HasMark) to.Write(Mark);
        if (Declaration.IsEmpty) return;
        to.Write(Declaration.Span);
        to.Write(LineEnd.Span);
    }
}
