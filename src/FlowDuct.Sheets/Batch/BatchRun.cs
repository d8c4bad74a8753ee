using FlowDuct.Errors;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>Answers every row of a sheet.</summary>
internal sealed class BatchRun
{
    private readonly RecordSource _source;
    private readonly BatchRequest _request;
    private readonly SheetPlan _plan;
    private readonly RowRenderer _renderer;
    private readonly RecordCheck _check = new();
    private readonly RowKeys _keys;
    private readonly Queue<uint> _checks = new();
    private readonly BatchTally _tally = new();
    private bool _isSameSheet;
    private int _opening;

    /// <summary>Opens a sheet and compiles its heading.</summary>
    /// <exception cref="FlowDuctException">The sheet or its heading is refused; kind NotUnderstood.</exception>
    internal BatchRun(RecordSource source, BatchRequest request, SheetPlan plan, RowRenderer renderer) =>
        (_source, _request, _plan, _renderer, _keys) = (source, request, plan, renderer, new RowKeys(plan.Tag >= 0 || plan.Case >= 0));

    /// <summary>Rows that were read so far, among them those of other shares.</summary>
    internal long RowsRead { get; private set; }

    /// <summary>Runs to the end, or until something stops it.</summary>
    /// <param name="target">Takes the results.</param>
    /// <exception cref="FlowDuctException">The sheet cannot be trusted from some row on; what stands before is written.</exception>
    internal BatchEnd Run(ResultTarget target)
    {
        var settings = new RowSettings(_request.Shard, target.Earlier?.Row ?? 0, _request.Strict);
        var main = NewWorker(settings);
        if (target.Earlier is RunMark earlier) Restore(earlier);
        else if (!Opening(target)) return new BatchEnd(_tally, Stopped: true, KeysDropped: false);
        long bytes = target.Earlier?.Bytes ?? _opening;
        FlowDuctException? failure = null;
        bool stopped = false;
        new BlockPipeline(_request.Jobs, () => NewWorker(settings)).Run(Fill, Consume);
        if (failure is not null) throw failure;
        if (target.Earlier is RunMark unmet && !stopped && !_isSameSheet) throw ResumeRefusals.OtherSheet(unmet.Row);
        if (!stopped) stopped = !Closing(target);
        if (!stopped) target.Complete();
        return new BatchEnd(_tally, stopped, _keys.IsFull);

        bool Consume(RowBlock block)
        {
            if (FindTwins(block)) main.Process(block);
            uint check = _checks.Dequeue();
            Compare(target.Earlier, block, check);
            _tally.Add(block.Tally);
            RowsRead = block.LastRow;
            stopped = _request.Stop() || !target.Write(block.Output.Written);
            bytes += block.Output.Length;
            if (!stopped && block.LastRow > settings.After) target.Reached(new RunMark(block.LastRow, check, bytes, _tally.ToCounts()));
            _request.Progress(this, target);
            failure = block.Failure;
            return !stopped && failure is null;
        }
    }

    private BlockWorker NewWorker(RowSettings settings) => new(_plan, RecordSource.Options(_source.Dialect.Separator), _renderer, settings);

    private bool Fill(RowBlock block)
    {
        bool more = _source.Fill(block);
        _check.Add(block.Input.Written);
        _checks.Enqueue(_check.Value);
        return more;
    }

    // Keys are compared in the order of the rows, so the same row is refused whatever the number of workers or shares.
    private bool FindTwins(RowBlock block)
    {
        bool any = false;
        for (int i = 0; i < block.Rows; i++)
        {
            block.EarlierRows[i] = _keys.EarlierRow(block.Keys[i], block.FirstRow + i);
            any |= block.EarlierRows[i] > 0;
        }

        return any;
    }

    // Blocks are cut alike in every run of a sheet, so one of them ends where the mark stands.
    private void Compare(RunMark? earlier, RowBlock block, uint check)
    {
        if (earlier is null || _isSameSheet || block.LastRow < earlier.Row) return;
        _isSameSheet = block.LastRow == earlier.Row && check == earlier.Check;
        if (!_isSameSheet) throw ResumeRefusals.OtherSheet(earlier.Row);
    }

    private void Restore(RunMark earlier)
    {
        foreach (RowVerdict verdict in Enum.GetValues<RowVerdict>()) _tally.Count(verdict, earlier.Counts[(int)verdict]);
    }

    private bool Opening(ResultTarget target)
    {
        var sink = new ByteSink();
        _renderer.Begin(sink);
        _opening = sink.Length;
        return target.Write(sink.Written);
    }

    private bool Closing(ResultTarget target)
    {
        var sink = new ByteSink();
        _renderer.End(sink);
        return sink.Length == 0 || target.Write(sink.Written);
    }
}

/// <summary>How a sheet is run.</summary>
internal sealed record BatchRequest
{
    /// <summary>Workers.</summary>
    internal int Jobs { get; init; } = 1;

    /// <summary>The share of the rows.</summary>
    internal Shard Shard { get; init; } = Shard.Whole;

    /// <summary>True where a caution fails a row.</summary>
    internal bool Strict { get; init; }

    /// <summary>Asked after each block; true stops the run.</summary>
    internal Func<bool> Stop { get; init; } = () => false;

    /// <summary>Told after each block.</summary>
    internal Action<BatchRun, ResultTarget> Progress { get; init; } = (_, _) => { };
}

/// <summary>How a run ended.</summary>
/// <param name="Tally">How its rows ended.</param>
/// <param name="Stopped">True where it was stopped, or nobody listened any more.</param>
/// <param name="KeysDropped">True where so many keys occurred that later ones were not compared.</param>
internal sealed record BatchEnd(BatchTally Tally, bool Stopped, bool KeysDropped);
