using FlowDuct.Findings;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>Writes the results of a run in one of its formats. Used by several workers at once, so it keeps nothing of a row.</summary>
internal abstract class RowRenderer
{
    /// <summary>How much of an answer it needs.</summary>
    internal virtual Devices.Extent Extent => Devices.Extent.Full;

    /// <summary>Writes what stands before the first row.</summary>
    internal abstract void Begin(ByteSink to);

    /// <summary>Writes a row.</summary>
    /// <param name="to">Takes the bytes.</param>
    /// <param name="row">Which row.</param>
    /// <param name="answer">What came of it.</param>
    /// <param name="findings">Its findings.</param>
    /// <param name="verdict">How it ended.</param>
    internal abstract void Row(ByteSink to, in RowPlace row, in RowAnswer answer, IReadOnlyList<Finding> findings, RowVerdict verdict);

    /// <summary>Writes what stands behind the last row.</summary>
    internal virtual void End(ByteSink to)
    {
    }
}

/// <summary>A row on its way out.</summary>
internal readonly ref struct RowPlace
{
    /// <summary>Counted from 1 behind the heading.</summary>
    internal required long Number { get; init; }

    /// <summary>True for the first row of the run or of its shard.</summary>
    internal required bool IsFirst { get; init; }

    /// <summary>Its tag; empty where there is none.</summary>
    internal ReadOnlySpan<byte> Tag { get; init; }

    /// <summary>Its case; empty where there is none.</summary>
    internal ReadOnlySpan<byte> Case { get; init; }

    /// <summary>The record as it stands in the sheet.</summary>
    internal ReadOnlySpan<byte> Record { get; init; }

    /// <summary>Ambient pressure, Pa, for results in gauge units.</summary>
    internal double AmbientPressure { get; init; }
}
