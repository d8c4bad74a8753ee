using FlowDuct.Cli.CommandLine;
using FlowDuct.Cli.Rendering;
using FlowDuct.Errors;
using FlowDuct.Sheets.Batch;

namespace FlowDuct.Cli.Batch;

/// <summary>Where a command's results go: the standard output, a file whole or not at all, or something that is no file.</summary>
internal static class ResultTargets
{
    /// <summary>Opens the target, uses it, and closes it.</summary>
    /// <exception cref="FlowDuctException">It could not be written; kind NotWritten.</exception>
    internal static T Use<T>(Arguments arguments, Streams streams, string settings, Func<ResultTarget, T> use)
    {
        string? output = arguments.Value("--output");
        bool resume = arguments.Has("--resume");
        if (resume && output is null) throw Usage.Refuse("--resume", "there is no file to go on with", "give the --output of the broken run");
        try
        {
            if (output is null) return use(new StreamTarget(bytes => Output.WriteAll(streams.Out, bytes.Span)));
            using Stream? special = OutputFile.OpenSpecial(output);
            if (special is not null) return use(new StreamTarget(bytes => Output.WriteAll(special, bytes.Span)));
            using var part = new PartFile(OutputFile.Followed(output), $"{ToolVersion.Version}+{ToolVersion.Commit}", settings, resume);
            return use(part);
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            throw OutputFile.NotWritten(output, failure);
        }
    }
}
