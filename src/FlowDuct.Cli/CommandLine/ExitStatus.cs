using FlowDuct.Errors;

namespace FlowDuct.Cli.CommandLine;

/// <summary>The exit statuses that scripts depend on.</summary>
internal static class ExitStatus
{
    internal const int Passed = 0;
    internal const int Failed = 1;
    internal const int NotUnderstood = 2;
    internal const int NoAnswer = 3;
    internal const int NotWritten = 4;
    internal const int Defect = 70;

    /// <summary>The status of a refusal.</summary>
    internal static int Of(RefusalKind kind) => kind switch
    {
        RefusalKind.NotUnderstood => NotUnderstood,
        RefusalKind.NoAnswer => NoAnswer,
        _ => NotWritten,
    };
}
