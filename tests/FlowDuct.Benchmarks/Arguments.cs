using System.Globalization;

namespace FlowDuct.Benchmarks;

/// <summary>Options in front, the rest behind.</summary>
/// <param name="Output">File for the results, or null for the terminal.</param>
/// <param name="Runs">How often everything is repeated.</param>
/// <param name="Rest">What is not an option.</param>
internal sealed record Arguments(string? Output, int Runs, IReadOnlyList<string> Rest)
{
    internal static Arguments Parse(string[] args, int defaultRuns) => args switch
    {
        ["--output", string file, .. string[] rest] => Parse(rest, defaultRuns) with { Output = file },
        ["--runs", string runs, .. string[] rest] => Parse(rest, int.Parse(runs, CultureInfo.InvariantCulture)),
        _ => new Arguments(null, defaultRuns, args),
    };
}
