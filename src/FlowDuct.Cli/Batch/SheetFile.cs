using FlowDuct.Cli.CommandLine;
using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Batch;

/// <summary>Opens the sheet that a command names.</summary>
internal static class SheetFile
{
    /// <summary>The sheet; - is the standard input.</summary>
    /// <exception cref="FlowDuctException">No file is named, or it cannot be opened; kind NotUnderstood.</exception>
    internal static Stream Open(string name, Streams streams)
    {
        if (name == Arguments.StandardInput) return streams.In();
        try
        {
            return new FileStream(name, FileMode.Open, FileAccess.Read, FileShare.ReadWrite, bufferSize: 0, FileOptions.SequentialScan);
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            string reason = failure is FileNotFoundException ? "there is no such file" : OutputFile.Reason(failure);
            throw Usage.Refuse(string.Empty, $"{Echo.Ascii(name)} could not be read: {reason}", "check the name; - reads the standard input");
        }
    }

    /// <summary>The file that a command names.</summary>
    internal static string NameOf(Arguments arguments) => arguments.Words.Count == 1
        ? arguments.Words[0]
        : throw Usage.Refuse(string.Empty, "no sheet is named", "write for example flowduct run cases.csv, or - for the standard input");

    /// <summary>The name in messages.</summary>
    internal static string Shown(string name) => name == Arguments.StandardInput ? "standard input" : Echo.Ascii(name);
}
