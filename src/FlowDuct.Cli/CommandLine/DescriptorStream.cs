using System.Runtime.InteropServices;

namespace FlowDuct.Cli.CommandLine;

/// <summary>
/// Writes to a Unix file descriptor by write(2). The console's own stream hides a broken pipe, and a file stream keeps a position of
/// its own, which makes two commands that share one redirected file write over each other.
/// </summary>
internal sealed partial class DescriptorStream(int descriptor) : Stream
{
    private const int Interrupted = 4;

    public override bool CanRead => false;

    public override bool CanSeek => false;

    public override bool CanWrite => true;

    public override long Length => throw new NotSupportedException();

    public override long Position
    {
        get => throw new NotSupportedException();
        set => throw new NotSupportedException();
    }

    /// <summary>True where a descriptor leads to a terminal; asking the console class instead costs start-up time.</summary>
    internal static bool IsTerminal(int descriptor) => IsATerminal(descriptor) == 1;

    public override void Write(ReadOnlySpan<byte> buffer)
    {
        while (buffer.Length > 0)
        {
            nint written = WriteTo(descriptor, buffer, buffer.Length);
            int error = written < 0 ? Marshal.GetLastPInvokeError() : 0;
            if (error == Interrupted) continue;
            if (error != 0) throw new IOException(Marshal.GetPInvokeErrorMessage(error), error);
            buffer = buffer[(int)written..];
        }
    }

    public override void Write(byte[] buffer, int offset, int count) => Write(buffer.AsSpan(offset, count));

    public override void Flush()
    {
    }

    public override int Read(byte[] buffer, int offset, int count) => throw new NotSupportedException();

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();

    [LibraryImport("libc", EntryPoint = "isatty")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static partial int IsATerminal(int descriptor);

    [LibraryImport("libc", EntryPoint = "write", SetLastError = true)]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static partial nint WriteTo(int descriptor, ReadOnlySpan<byte> bytes, nint count);
}
