namespace FlowDuct.Sheets.Csv;

/// <summary>Bytes that grow as they are written; emptied and used again for the next block.</summary>
internal sealed class ByteSink
{
    private byte[] _bytes = new byte[1 << 16];

    /// <summary>How many bytes are written.</summary>
    internal int Length { get; private set; }

    /// <summary>What is written so far.</summary>
    internal ReadOnlySpan<byte> Written => _bytes.AsSpan(0, Length);

    /// <summary>The same as memory, for readers; not valid beyond the next write.</summary>
    internal ReadOnlyMemory<byte> Memory => _bytes.AsMemory(0, Length);

    internal void Clear() => Length = 0;

    /// <summary>Forgets what was written after a length.</summary>
    internal void Cut(int length) => Length = length;

    /// <summary>Room for so many bytes; say by <see cref="Advance"/> how many were used.</summary>
    internal Span<byte> Room(int count)
    {
        if (_bytes.Length - Length < count) Array.Resize(ref _bytes, Math.Max(_bytes.Length * 2, Length + count));
        return _bytes.AsSpan(Length);
    }

    internal void Advance(int count) => Length += count;

    internal void Write(byte value)
    {
        Room(1)[0] = value;
        Length++;
    }

    internal void Write(ReadOnlySpan<byte> bytes)
    {
        bytes.CopyTo(Room(bytes.Length));
        Length += bytes.Length;
    }

    /// <summary>Text as UTF-8.</summary>
    internal void Write(string text) => Length += System.Text.Encoding.UTF8.GetBytes(text, Room(text.Length * 3));
}
