using System.Text;
using CsvHelper;
using FlowDuct.Errors;

namespace FlowDuct.Sheets.Csv;

/// <summary>The records of a sheet in their order, cut into blocks; a record whose cells do not match the heading ends the sheet there.</summary>
internal sealed class RecordSource : IDisposable
{
    /// <summary>Records to a block: enough that handing one over costs nothing, few enough that all of them stay in the cache.</summary>
    internal const int BlockRows = 1024;

    private readonly CsvReader _reader;
    private readonly string _name;
    private readonly int _columns;
    private long _rows;

    /// <summary>Opens a sheet and reads its heading.</summary>
    /// <param name="name">The file as typed, for refusals.</param>
    /// <param name="sheet">The sheet.</param>
    /// <param name="decimalComma">True where numbers have a decimal comma.</param>
    internal RecordSource(string name, Stream sheet, bool decimalComma)
    {
        _name = name;
        (Dialect, Stream rest) = SheetStart.Read(sheet, name, decimalComma);
        _reader = CsvReader.Create(rest, Options(Dialect.Separator) with { TrackLineNumbers = true }, leaveOpen: true);
        FirstLine = Dialect.Declaration.IsEmpty ? 1 : 2;
        if (!Next(out FlowDuctException? failure)) throw failure ?? throw new InvalidOperationException("A heading vanished.");
        _columns = _reader.FieldCount;
        Headings = [.. Enumerable.Range(0, _columns).Select(column => Encoding.UTF8.GetString(_reader.GetSpan(column)))];
        RawHeading = _reader.RawRecord.ToArray();
    }

    /// <summary>How the sheet is written.</summary>
    internal SheetDialect Dialect { get; }

    /// <summary>The line of the heading.</summary>
    internal long FirstLine { get; }

    /// <summary>The headings, unquoted.</summary>
    internal IReadOnlyList<string> Headings { get; }

    /// <summary>The heading as it stands in the sheet.</summary>
    internal ReadOnlyMemory<byte> RawHeading { get; }

    /// <summary>Bytes of the sheet that were read so far, about.</summary>
    internal long Position => _reader.ByteOffset;

    /// <summary>What every reader of this sheet is told; its own defaults let ragged rows and open quotes pass.</summary>
    internal static CsvReaderOptions Options(byte separator) => new()
    {
        Separator = (char)separator,
        HasHeader = false,
        DetectSeparatorHint = false,
        MalformedData = CsvMalformedDataHandling.Throw,
        FieldCountMismatch = CsvFieldCountHandling.Allow,
        SkipEmptyLines = true,
    };

    /// <summary>Fills a block with the next records.</summary>
    /// <returns>False where this is the last block: the sheet has ended, or cannot be trusted any further (see the block's failure).</returns>
    internal bool Fill(RowBlock block)
    {
        block.Start(_rows + 1);
        while (block.Rows < BlockRows)
        {
            if (!Next(out FlowDuctException? failure)) return End(block, failure);
            if (_reader.FieldCount != _columns) return End(block, Ragged(_reader.FieldCount));
            block.Add(_reader.RawRecord, _reader.LineNumber + FirstLine - 1);
            _rows++;
        }

        return true;
    }

    /// <inheritdoc/>
    public void Dispose() => _reader.Dispose();

    private static bool End(RowBlock block, FlowDuctException? failure)
    {
        block.Failure = failure;
        return false;
    }

    private bool Next(out FlowDuctException? failure)
    {
        failure = null;
        try
        {
            return _reader.Read();
        }
        catch (CsvFormatException malformed)
        {
            failure = Malformed(malformed);
            return false;
        }
    }

    private FlowDuctException Malformed(CsvFormatException malformed) => new(new Refusal(
        RefusalKind.NotUnderstood,
        $"{_name} line {malformed.LineNumber + FirstLine - 1}",
        "a quote stands where none can stand, or is never closed",
        "put quotes around the whole cell and double those inside; nothing behind this line was read"));

    private FlowDuctException Ragged(int cells) => new(new Refusal(
        RefusalKind.NotUnderstood,
        $"{_name} row {_rows + 1}, line {_reader.LineNumber + FirstLine - 1}, column {Math.Min(cells, _columns) + 1}",
        $"the row has {cells} cells, the heading {_columns}",
        "a cell that holds the separator needs quotes; nothing behind this line was read"));
}
