using FlowDuct.Errors;

namespace FlowDuct.Sheets.Csv;

/// <summary>A sheet whose first bytes were read already; it is read forward only and never closed from here.</summary>
internal sealed class PrefixedStream(ReadOnlyMemory<byte> prefix, Stream rest, string name) : Stream
{
    private ReadOnlyMemory<byte> _prefix = prefix;

    public override bool CanRead => true;

    public override bool CanSeek => false;

    public override bool CanWrite => false;

    public override long Length => throw new NotSupportedException();

    public override long Position { get => throw new NotSupportedException(); set => throw new NotSupportedException(); }

    public override int Read(byte[] buffer, int offset, int count) => Read(buffer.AsSpan(offset, count));

    public override int Read(Span<byte> buffer)
    {
        if (_prefix.IsEmpty) return ReadOn(buffer);
        int count = Math.Min(buffer.Length, _prefix.Length);
        _prefix.Span[..count].CopyTo(buffer);
        _prefix = _prefix[count..];
        return count;
    }

    // A failure to read is told here, so that any other one is a failure to write.
    private int ReadOn(Span<byte> buffer)
    {
        try
        {
            return rest.Read(buffer);
        }
        catch (IOException failure)
        {
            throw new FlowDuctException(new Refusal(RefusalKind.NotUnderstood, name, $"it could not be read to its end: {failure.Message}", "copy it to a disk of this machine"));
        }
    }

    public override void Flush()
    {
    }

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();

    public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
}
