using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Findings;

namespace FlowDuct.Sheets.Batch;

/// <summary>What came of a row: the answer of a device, that of a property question, a refusal, or a defect of this program.</summary>
internal readonly struct RowAnswer
{
    private RowAnswer(DeviceAnswer? device, StateAnswer? state, Refusal? refusal, Exception? defect) =>
        (Device, State, Refusal, Defect) = (device, state, refusal, defect);

    internal DeviceAnswer? Device { get; }

    internal StateAnswer? State { get; }

    internal Refusal? Refusal { get; }

    internal Exception? Defect { get; }

    /// <summary>The findings; none where there is no answer.</summary>
    internal IReadOnlyList<Finding> Findings => Device?.Findings ?? State?.Findings ?? [];

    /// <summary>How the row ended, apart from what strictness makes of its findings.</summary>
    internal RowVerdict Verdict(IReadOnlyList<Finding> findings, bool strict) => this switch
    {
        { Defect: not null } => RowVerdict.Defect,
        { Refusal.Kind: RefusalKind.NoAnswer } => RowVerdict.Unsolved,
        { Refusal: not null } => RowVerdict.NotUnderstood,
        _ => FindingRules.Pass(findings, strict: false) ? (strict && !FindingRules.Pass(findings, strict: true) ? RowVerdict.Cautioned : RowVerdict.Passed) : RowVerdict.Impossible,
    };

    internal static RowAnswer Of(DeviceAnswer answer) => new(answer, null, null, null);

    internal static RowAnswer Of(StateAnswer answer) => new(null, answer, null, null);

    internal static RowAnswer Of(Refusal refusal) => new(null, null, refusal, null);

    internal static RowAnswer Of(Exception defect) => new(null, null, null, defect);
}
