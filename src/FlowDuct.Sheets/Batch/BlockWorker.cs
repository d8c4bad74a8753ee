using System.Text;
using CsvHelper;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>Answers the records of a block and writes their results. One to a thread.</summary>
/// <param name="plan">The heading, compiled.</param>
/// <param name="options">What every block of the sheet is read with.</param>
/// <param name="renderer">The format of the results.</param>
/// <param name="settings">Which rows are wanted.</param>
internal sealed class BlockWorker(SheetPlan plan, CsvReaderOptions options, RowRenderer renderer, RowSettings settings)
{
    private readonly RowSolver _solver = new(plan, renderer.Extent);

    /// <summary>Fills the block's output, keys and tally.</summary>
    internal void Process(RowBlock block)
    {
        block.Output.Clear();
        block.Tally.Clear();
        if (block.Rows == 0) return;
        using CsvReader records = CsvReader.Create(block.Input.Memory, options);
        for (int i = 0; i < block.Rows; i++)
        {
            if (!records.Read()) throw new InvalidOperationException("A record of a block vanished.");
            block.Keys[i] = RowKeys.Hash(RowBinder.Cell(records, plan.Tag), RowBinder.Cell(records, plan.Case));
            if (settings.Wants(block.FirstRow + i)) Process(block, i, records);
        }
    }

    private void Process(RowBlock block, int index, CsvReader record)
    {
        long row = block.FirstRow + index;
        RowAnswer answer = block.EarlierRows[index] > 0 ? RowAnswer.Of(Twice(record, block.EarlierRows[index])) : _solver.Solve(record);
        IReadOnlyList<Finding> findings = answer.Findings;
        RowVerdict verdict = answer.Verdict(findings, settings.Strict);
        var place = new RowPlace
        {
            Number = row,
            IsFirst = row == settings.Shard.Index,
            Tag = RowBinder.Cell(record, plan.Tag),
            Case = RowBinder.Cell(record, plan.Case),
            Record = record.RawRecord,
            AmbientPressure = _solver.Draft.Frame.AmbientPressure,
        };
        renderer.Row(block.Output, place, answer, findings, verdict);
        Count(block, index, place, answer, verdict);
    }

    private Refusal Twice(CsvReader record, long earlier)
    {
        string tag = Encoding.UTF8.GetString(RowBinder.Cell(record, plan.Tag)), name = Encoding.UTF8.GetString(RowBinder.Cell(record, plan.Case));
        return CellRefusals.KeyTwice(name.Length == 0 ? tag : $"{tag} {name}", earlier).Refusal;
    }

    private static void Count(RowBlock block, int index, in RowPlace place, in RowAnswer answer, RowVerdict verdict)
    {
        BatchTally tally = block.Tally;
        tally.Count(verdict);
        if (verdict >= RowVerdict.Unsolved) tally.FirstFailure ??= Failure(block, index, place, answer);
        if (!DateTag.LooksLike(place.Tag)) return;
        tally.FirstDate ??= $"row {place.Number}: {Echo.Ascii(Encoding.UTF8.GetString(place.Tag))}";
        tally.Dates++;
    }

    private static string Failure(RowBlock block, int index, in RowPlace place, in RowAnswer answer)
    {
        string why = answer.Refusal is Refusal refusal ? RefusalText.Of(refusal) : $"defect: {answer.Defect}";
        return $"row {place.Number}, line {block.LineOf(index)}: {why}";
    }
}

/// <summary>Which rows of a sheet are answered, and how strictly.</summary>
/// <param name="Shard">The share of the rows.</param>
/// <param name="After">Rows up to here were written by an earlier run.</param>
/// <param name="Strict">True where a caution fails a row.</param>
internal sealed record RowSettings(Shard Shard, long After, bool Strict)
{
    /// <summary>True for a row to be answered.</summary>
    internal bool Wants(long row) => row > After && Shard.Takes(row);
}
