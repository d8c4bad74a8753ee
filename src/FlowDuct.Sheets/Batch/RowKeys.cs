using System.Numerics;

namespace FlowDuct.Sheets.Batch;

/// <summary>
/// Keys (tag and case) that occurred, to find one that occurs again. Only their 64-bit hashes are kept, so that memory has a bound; behind
/// the first <see cref="Most"/> rows with a key no more are taken in.
/// </summary>
internal sealed class RowKeys
{
    /// <summary>Keys that are kept.</summary>
    internal const int Most = 1 << 18;

    // Open addressing at half load: a key is found or placed within a step or two.
    private const int Slots = 2 * Most;

    private readonly ulong[] _keys;
    private readonly long[] _rows;
    private int _count;

    /// <summary>A set of the size that a sheet may need, so that it never moves.</summary>
    /// <param name="used">False for a sheet without keys.</param>
    internal RowKeys(bool used) => (_keys, _rows) = (new ulong[used ? Slots : 0], new long[used ? Slots : 0]);

    /// <summary>True where no more keys are taken in.</summary>
    internal bool IsFull => _count == Most;

    /// <summary>The earlier row of a key, or 0; a key that is new is kept. A key of 0 is none.</summary>
    internal long EarlierRow(ulong key, long row)
    {
        if (key == 0) return 0;
        int slot = (int)(key % Slots);
        while (_keys[slot] != 0)
        {
            if (_keys[slot] == key) return _rows[slot];
            slot = (slot + 1) % Slots;
        }

        if (!IsFull) (_keys[slot], _rows[slot], _count) = (key, row, _count + 1);
        return 0;
    }

    /// <summary>Hash of a tag and a case; 0 where both are empty.</summary>
    internal static ulong Hash(ReadOnlySpan<byte> tag, ReadOnlySpan<byte> @case)
    {
        if (tag.IsEmpty && @case.IsEmpty) return 0;
        ulong hash = Mix(Mix(0x9E3779B97F4A7C15, tag), "\n"u8);
        hash = Mix(hash, @case);
        hash = (hash ^ (hash >> 32)) * 0xD6E8FEB86659FD93;
        hash ^= hash >> 32;
        return hash == 0 ? 1 : hash;
    }

    private static ulong Mix(ulong hash, ReadOnlySpan<byte> bytes)
    {
        foreach (byte value in bytes) hash = BitOperations.RotateLeft((hash ^ value) * 0xFF51AFD7ED558CCD, 29);
        return hash;
    }
}
