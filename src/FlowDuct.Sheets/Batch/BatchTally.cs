namespace FlowDuct.Sheets.Batch;

/// <summary>How the rows of a run ended.</summary>
internal sealed class BatchTally
{
    private readonly long[] _counts = new long[Enum.GetValues<RowVerdict>().Length];

    /// <summary>Rows that were answered or refused.</summary>
    internal long Rows => _counts.Sum();

    /// <summary>The gravest end of a row.</summary>
    internal RowVerdict Gravest => (RowVerdict)Math.Max(0, Array.FindLastIndex(_counts, count => count > 0));

    /// <summary>The first row that was not answered, in words; null where there is none.</summary>
    internal string? FirstFailure { get; set; }

    /// <summary>The first tag that looks like a date; null where there is none.</summary>
    internal string? FirstDate { get; set; }

    /// <summary>How many tags look like dates.</summary>
    internal long Dates { get; set; }

    internal long this[RowVerdict verdict] => _counts[(int)verdict];

    internal void Count(RowVerdict verdict, long rows = 1) => _counts[(int)verdict] += rows;

    /// <summary>The counts, in the order of the verdicts.</summary>
    internal long[] ToCounts() => [.. _counts];

    internal void Clear()
    {
        Array.Clear(_counts);
        (FirstFailure, FirstDate, Dates) = (null, null, 0);
    }

    /// <summary>Adds the tally of rows that stand behind those counted here.</summary>
    internal void Add(BatchTally later)
    {
        for (int i = 0; i < _counts.Length; i++) _counts[i] += later._counts[i];
        FirstFailure ??= later.FirstFailure;
        FirstDate ??= later.FirstDate;
        Dates += later.Dates;
    }
}
