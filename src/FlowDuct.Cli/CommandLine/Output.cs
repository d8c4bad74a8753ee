using System.Text;
using Microsoft.Win32.SafeHandles;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Writes finished bytes to a stream at once.</summary>
internal static class Output
{
    // EPIPE; Windows says ERROR_NO_DATA or ERROR_BROKEN_PIPE.
    private const int BrokenPipe = 32;
    private const int WindowsNoData = unchecked((int)0x800700E8);
    private const int WindowsBrokenPipe = unchecked((int)0x8007006D);

    /// <summary>The standard stream of a file descriptor, unbuffered.</summary>
    internal static Stream Standard(int descriptor)
    {
        if (!OperatingSystem.IsWindows()) return new DescriptorStream(descriptor);
        return descriptor == 1 ? Console.OpenStandardOutput() : Console.OpenStandardError();
    }

    /// <summary>The standard input, unbuffered.</summary>
    internal static Stream StandardInput() => OperatingSystem.IsWindows()
        ? Console.OpenStandardInput()
        : OpenInput();

#pragma warning disable CA2000 // The stream owns the handle, and the handle does not own the descriptor.
    private static FileStream OpenInput() => new(new SafeFileHandle(0, ownsHandle: false), FileAccess.Read, bufferSize: 0);
#pragma warning restore CA2000

    /// <summary>True where a descriptor, 1 or 2, is shown on a terminal.</summary>
    internal static bool IsTerminal(int descriptor)
    {
        if (!OperatingSystem.IsWindows()) return DescriptorStream.IsTerminal(descriptor);
        return descriptor == 1 ? !Console.IsOutputRedirected : !Console.IsErrorRedirected;
    }

    /// <summary>A writer into memory with the line ends of this program.</summary>
    internal static StreamWriter WriterOn(Stream memory) => new(memory, new UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };

    /// <summary>Writes all bytes; false where the other end of a pipe has gone, which is no failure.</summary>
    internal static bool WriteAll(Stream to, ReadOnlySpan<byte> bytes)
    {
        try
        {
            to.Write(bytes);
            to.Flush();
            return true;
        }
        catch (IOException failure) when (failure.HResult is BrokenPipe or WindowsNoData or WindowsBrokenPipe)
        {
            return false;
        }
    }
}
