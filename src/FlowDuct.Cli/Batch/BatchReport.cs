using FlowDuct.Cli.CommandLine;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Batch;

namespace FlowDuct.Cli.Batch;

/// <summary>What a run says on stderr: warnings, and how many rows have no answer.</summary>
internal sealed class BatchReport(string name, Stream stderr, bool quiet)
{
    /// <summary>The exit status of the gravest row.</summary>
    internal static int StatusOf(RowVerdict verdict) => verdict switch
    {
        RowVerdict.Passed => ExitStatus.Passed,
        RowVerdict.Cautioned or RowVerdict.Impossible => ExitStatus.Failed,
        RowVerdict.Unsolved => ExitStatus.NoAnswer,
        RowVerdict.NotUnderstood => ExitStatus.NotUnderstood,
        _ => ExitStatus.Defect,
    };

    /// <summary>Warns that a column goes through although its name is near one that is known.</summary>
    internal void NearMiss(string heading, string near) => Say($"column \"{Echo.Ascii(heading)}\" goes through unread; if it should be read, its name is {near}");

    /// <summary>Tells how a run ended; nothing where every row was answered.</summary>
    internal void Tell(BatchEnd end)
    {
        BatchTally tally = end.Tally;
        if (tally.FirstDate is string date) Say($"tags that look like dates, which a spreadsheet may have made of them: {tally.Dates}; the first in {date}");
        if (end.KeysDropped) Say($"tag and case were compared for the first {RowKeys.Most} rows only");
        if (tally[RowVerdict.Impossible] > 0) Say($"{tally[RowVerdict.Impossible]} of {tally.Rows} rows hold figures that are impossible");
        long unsolved = tally[RowVerdict.Unsolved] + tally[RowVerdict.NotUnderstood] + tally[RowVerdict.Defect];
        if (unsolved > 0) Say($"{unsolved} of {tally.Rows} rows have no answer{(tally.FirstFailure is string first ? "; the first is " + first : string.Empty)}");
    }

    /// <summary>Tells what an interrupted run has left; nothing where it left nothing.</summary>
    internal void TellKept(string output)
    {
        string part = PartFile.PartName(output);
        if (File.Exists(PartFile.MarksName(output))) Say($"the results so far are kept in {Echo.Ascii(part)}; the same command with --resume goes on from there");
    }

    private void Say(string text)
    {
        if (!quiet) Application.Complain(stderr, $"{name}: {text}");
    }
}
