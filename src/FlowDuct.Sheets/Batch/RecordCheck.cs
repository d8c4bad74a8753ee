using System.Buffers.Binary;
using System.Numerics;

namespace FlowDuct.Sheets.Batch;

/// <summary>Check sum of the records that were read: CRC-32C (RFC 3720, section 12.1), which processors have as an instruction.</summary>
internal sealed class RecordCheck
{
    private uint _crc = uint.MaxValue;

    /// <summary>The sum so far.</summary>
    internal uint Value => ~_crc;

    internal void Add(ReadOnlySpan<byte> bytes)
    {
        uint crc = _crc;
        while (bytes.Length >= sizeof(ulong))
        {
            crc = BitOperations.Crc32C(crc, BinaryPrimitives.ReadUInt64LittleEndian(bytes));
            bytes = bytes[sizeof(ulong)..];
        }

        foreach (byte value in bytes) crc = BitOperations.Crc32C(crc, value);
        _crc = crc;
    }
}
