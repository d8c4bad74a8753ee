using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>Where the results of a run go.</summary>
internal abstract class ResultTarget
{
    /// <summary>Where an earlier run stopped that this one continues; null where it begins at the first row.</summary>
    internal virtual RunMark? Earlier => null;

    /// <summary>Last row that is safe, for those who report progress.</summary>
    internal virtual long SafeRow { get; private protected set; }

    /// <summary>Writes results; false where nobody listens any more.</summary>
    internal abstract bool Write(ReadOnlySpan<byte> bytes);

    /// <summary>All results up to a row are written.</summary>
    internal virtual void Reached(RunMark mark) => SafeRow = mark.Row;

    /// <summary>The run has come to its end.</summary>
    internal virtual void Complete()
    {
    }
}

/// <summary>Results that go to a stream, such as the standard output.</summary>
internal sealed class StreamTarget(Func<ReadOnlyMemory<byte>, bool> write) : ResultTarget
{
    private readonly ByteSink _copy = new();

    internal override bool Write(ReadOnlySpan<byte> bytes)
    {
        _copy.Clear();
        _copy.Write(bytes);
        return write(_copy.Memory);
    }
}
