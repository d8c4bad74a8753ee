using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>Why a broken run cannot be continued.</summary>
internal static class ResumeRefusals
{
    internal static FlowDuctException Nothing(string file) => Refuse(
        $"there is nothing to go on from: {Echo.Ascii(file)} does not hold a mark of a broken run", "leave --resume out");

    internal static FlowDuctException OtherSheet(long row) => Refuse(
        $"the rows up to {row} are not those that the broken run has read", "leave --resume out to run the sheet from its first row");

    internal static FlowDuctException OtherVersion(string then, string now) => Refuse(
        $"the broken run was made by version {Echo.Ascii(then)}, this is {now}", "leave --resume out, or use that version");

    internal static FlowDuctException OtherSettings() => Refuse(
        "the broken run was asked for other results, another heading or another share of the rows", "repeat its options, or leave --resume out");

    internal static FlowDuctException Foreign(string file) => new(new Refusal(
        RefusalKind.NotWritten, "--output", $"results grow in {Echo.Ascii(file)}, and a file of that name stands there already", "remove it, or name another output"));

    private static FlowDuctException Refuse(string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, "--resume", reason, next));
}
