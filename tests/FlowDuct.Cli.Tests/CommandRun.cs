using System.Text;
using FlowDuct.Cli.CommandLine;

namespace FlowDuct.Cli.Tests;

/// <summary>One run of the program in this process.</summary>
internal sealed record CommandRun(int Status, string Output, string Error)
{
    internal static CommandRun Run(params string[] args) => Run(terminal: false, args);

    /// <summary>Runs as if the answer were shown on a terminal, or not.</summary>
    internal static CommandRun Run(bool terminal, string[] args)
    {
        using var output = new MemoryStream();
        using var error = new MemoryStream();
        int status = Application.Run(args, output, error, terminal);
        return new CommandRun(status, Encoding.UTF8.GetString(output.ToArray()), Encoding.UTF8.GetString(error.ToArray()));
    }

    /// <summary>Runs with a sheet on the standard input.</summary>
    internal static CommandRun RunOn(string sheet, params string[] args)
    {
        using var output = new MemoryStream();
        using var error = new MemoryStream();
        int status = Application.Run(args, output, error, terminal: false, () => new MemoryStream(Encoding.UTF8.GetBytes(sheet)));
        return new CommandRun(status, Encoding.UTF8.GetString(output.ToArray()), Encoding.UTF8.GetString(error.ToArray()));
    }

    /// <summary>Runs a line as a shell would split it: words at spaces, double quotes kept together, a backslash joins lines.</summary>
    internal static CommandRun RunLine(string line) => Run([.. Words(line).Skip(1)]);

    internal static IEnumerable<string> Words(string line)
    {
        StringBuilder word = new();
        (bool quoted, bool any) = (false, false);
        foreach (char c in line.Replace("\\\n", string.Empty, StringComparison.Ordinal) + " ")
        {
            if (c == '"') (quoted, any) = (!quoted, true);
            else if (quoted || !char.IsWhiteSpace(c)) (_, any) = (word.Append(c), true);
            else if (any)
            {
                yield return word.ToString();
                word.Clear();
                any = false;
            }
        }
    }
}
