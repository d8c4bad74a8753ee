using System.Globalization;
using FlowDuct.Errors;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Writes a file whole or not at all; what is no plain file (a pipe, a device) is written into, never replaced.</summary>
internal static class OutputFile
{
    /// <summary>Writes all bytes to a path.</summary>
    internal static void Write(string path, ReadOnlySpan<byte> bytes)
    {
        // A rename puts a plain file in the place of whatever stood there: for root that includes the devices of the machine.
        if (!OperatingSystem.IsWindows() && File.Exists(path) && TryWriteInto(path, bytes)) return;
        Replace(Followed(path), bytes);
    }

    /// <summary>A path that is no plain file (a pipe, a device), opened to be written into; null for a plain file or where nothing stands yet.</summary>
    internal static Stream? OpenSpecial(string path)
    {
        if (OperatingSystem.IsWindows() || !File.Exists(path)) return null;
        var stream = new FileStream(path, FileMode.Open, FileAccess.Write, FileShare.ReadWrite, bufferSize: 0);
        if (!IsPlain(stream)) return stream;
        stream.Dispose();
        return null;
    }

    /// <summary>The refusal for an answer that could not be written; null for the standard output.</summary>
    internal static FlowDuctException NotWritten(string? path, Exception failure)
    {
        string place = path is null ? "standard output" : "--output " + path;
        return new FlowDuctException(new Refusal(RefusalKind.NotWritten, place, $"could not be written: {Reason(failure)}", "free some space or name another file"));
    }

    /// <summary>Why a file could not be written or read, in words: the texts of the runtime are left out of the native binary.</summary>
    internal static string Reason(Exception failure) => failure switch
    {
        DirectoryNotFoundException => "its folder does not exist",
        UnauthorizedAccessException => "it is a folder, or permission is denied",
        PathTooLongException => "the path is too long",
        IOException => failure.Message,
        _ => "this is no path of a file",
    };

    // Only a plain file can be cut to a length; its own length leaves it as it is.
    private static bool TryWriteInto(string path, ReadOnlySpan<byte> bytes)
    {
        using var stream = new FileStream(path, FileMode.Open, FileAccess.Write, FileShare.ReadWrite, bufferSize: 0);
        if (IsPlain(stream)) return false;
        stream.Write(bytes);
        return true;
    }

    private static bool IsPlain(FileStream stream)
    {
        if (!stream.CanSeek) return false;
        try
        {
            stream.SetLength(stream.Length);
            return true;
        }
        catch (Exception refused) when (refused is IOException or ArgumentException or NotSupportedException)
        {
            return false;
        }
    }

    // A link that leads nowhere yet is followed too; a path at which nothing stands has no link to ask for.
    internal static string Followed(string path) =>
        new FileInfo(path).LinkTarget is null ? path : File.ResolveLinkTarget(path, returnFinalTarget: true)!.FullName;

    private static void Replace(string path, ReadOnlySpan<byte> bytes)
    {
        string part = string.Create(CultureInfo.InvariantCulture, $"{path}.{Environment.ProcessId}.part");
        bool ours = false;
        try
        {
            // CreateNew: a file of that name belongs to somebody else.
            using (var stream = new FileStream(part, FileMode.CreateNew, FileAccess.Write, FileShare.None, bufferSize: 0))
            {
                ours = true;
                stream.Write(bytes);
            }

            File.Move(part, path, overwrite: true);
        }
        catch
        {
            if (ours) File.Delete(part);
            throw;
        }
    }
}
