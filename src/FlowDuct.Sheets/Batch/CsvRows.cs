using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>Results as CSV: the record as it came, then the results, then row, status and findings.</summary>
internal sealed class CsvRows(SheetDialect dialect, ReadOnlyMemory<byte> heading, IReadOnlyList<ResultColumn> results, int digits) : RowRenderer
{
    /// <summary>Significant digits where none were asked for.</summary>
    internal const int UsualDigits = 7;

    private readonly ResultColumn[] _results = [.. results];
    private readonly byte[] _separator = [dialect.Separator];
    private readonly bool _quoteNumbers = dialect.Separator == dialect.DecimalMark;

    internal override Extent Extent { get; } = results.Any(result => result.NeedsExitHead) ? Extent.Full : Extent.WithoutExitHead;

    /// <summary>The names that this adds behind the columns of the sheet.</summary>
    internal static string[] Titles(IEnumerable<ResultColumn> results) => [.. results.Select(result => "calc " + result.Title), "row", "status", "findings"];

    internal override void Begin(ByteSink to)
    {
        dialect.WriteOpening(to);
        to.Write(heading.Span);
        bool first = heading.IsEmpty;
        foreach (string title in Titles(_results))
        {
            if (!first) to.Write(_separator);
            first = false;
            CellText.Write(to, title, dialect.Separator);
        }

        to.Write(dialect.LineEnd.Span);
    }

    internal override void Row(ByteSink to, in RowPlace row, in RowAnswer answer, IReadOnlyList<Finding> findings, RowVerdict verdict)
    {
        to.Write(row.Record);
        foreach (ResultColumn result in _results)
        {
            to.Write(_separator);
            Result(to, result, row, answer);
        }

        to.Write(_separator);
        Whole(to, row.Number);
        to.Write(_separator);
        CellText.Write(to, Status(answer, verdict), dialect.Separator);
        to.Write(_separator);
        Codes(to, findings);
        to.Write(dialect.LineEnd.Span);
    }

    private static string Status(in RowAnswer answer, RowVerdict verdict) => answer switch
    {
        { Refusal: Refusal refusal } => RefusalText.Of(refusal),
        { Defect: Exception defect } => $"defect: {defect.GetType().Name}; please report this row",
        _ => verdict == RowVerdict.Impossible ? "impossible" : "ok",
    };

    private void Result(ByteSink to, ResultColumn result, in RowPlace row, in RowAnswer answer)
    {
        if (result.Row.IsText)
        {
            if (answer.Device is DeviceAnswer device && result.ReadText(device) is string text) CellText.Write(to, text, dialect.Separator);
            return;
        }

        double? si = answer.Device is not null ? result.Read(answer.Device) : answer.State is not null ? result.Read(answer.State) : null;
        if (si is double value) Number(to, result.Scale.FromSi(value, row.AmbientPressure));
    }

    private void Number(ByteSink to, double value)
    {
        if (_quoteNumbers) to.Write((byte)'"');
        to.Advance(DecimalText.Write(value, digits, dialect.DecimalMark, to.Room(DecimalText.MostBytes)));
        if (_quoteNumbers) to.Write((byte)'"');
    }

    private static void Whole(ByteSink to, long value)
    {
        System.Buffers.Text.Utf8Formatter.TryFormat(value, to.Room(20), out int count);
        to.Advance(count);
    }

    private static void Codes(ByteSink to, IReadOnlyList<Finding> findings)
    {
        for (int i = 0; i < findings.Count; i++)
        {
            if (i > 0) to.Write((byte)' ');
            to.Write(findings[i].Code);
        }
    }
}
