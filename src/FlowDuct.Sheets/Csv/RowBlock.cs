using FlowDuct.Errors;

namespace FlowDuct.Sheets.Csv;

/// <summary>Some records on their way from the sheet through a worker to the results; used again and again.</summary>
internal sealed class RowBlock
{
    private readonly long[] _lines = new long[RecordSource.BlockRows];

    /// <summary>The records, each with a line feed behind it.</summary>
    internal ByteSink Input { get; } = new();

    /// <summary>The results.</summary>
    internal ByteSink Output { get; } = new();

    /// <summary>How many records there are.</summary>
    internal int Rows { get; private set; }

    /// <summary>Number of the first record, counted from 1 behind the heading.</summary>
    internal long FirstRow { get; private set; }

    /// <summary>Why the sheet ends behind this block; null where it simply ends, or goes on.</summary>
    internal FlowDuctException? Failure { get; set; }

    /// <summary>Hash of the key of each record; 0 where it has none.</summary>
    internal ulong[] Keys { get; } = new ulong[RecordSource.BlockRows];

    /// <summary>For each record the earlier row with its key; 0 where there is none.</summary>
    internal long[] EarlierRows { get; } = new long[RecordSource.BlockRows];

    /// <summary>How the records ended.</summary>
    internal Batch.BatchTally Tally { get; } = new();

    /// <summary>Number of the last record.</summary>
    internal long LastRow => FirstRow + Rows - 1;

    /// <summary>Line of the sheet on which a record of this block begins.</summary>
    internal long LineOf(int index) => _lines[index];

    internal void Start(long firstRow)
    {
        Input.Clear();
        Array.Clear(EarlierRows);
        (Rows, FirstRow, Failure) = (0, firstRow, null);
    }

    internal void Add(ReadOnlySpan<byte> record, long line)
    {
        Input.Write(record);
        Input.Write((byte)'\n');
        _lines[Rows++] = line;
    }
}
