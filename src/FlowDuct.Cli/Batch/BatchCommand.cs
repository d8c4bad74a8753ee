using FlowDuct.Cli.CommandLine;
using FlowDuct.Cli.Rendering;
using FlowDuct.Errors;
using FlowDuct.Sheets;
using FlowDuct.Sheets.Batch;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Cli.Batch;

/// <summary>The command run: every row of a sheet.</summary>
internal static class BatchCommand
{
    private const int MostJobs = 1024;

    /// <summary>Runs a sheet to its end.</summary>
    /// <returns>The documented exit status.</returns>
    /// <exception cref="FlowDuctException">The command line, the sheet or its heading is refused.</exception>
    internal static int Run(Arguments arguments, Streams streams)
    {
        var binder = new CaseBinder(arguments);
        RenderOptions options = RenderBinder.Bind(arguments, binder, terminal: false);
        BatchFormat format = Format(binder);
        bool comma = binder.Choice("--decimal", false, ("point", false), ("comma", true));
        int jobs = arguments.Value("--jobs") is string text ? WholeNumber.Read("--jobs", text, 1, MostJobs, Environment.ProcessorCount) : Environment.ProcessorCount;
        Shard shard = arguments.Value("--shard") is string share ? Shard.Parse(share) : Shard.Whole;
        string file = SheetFile.NameOf(arguments), name = SheetFile.Shown(file);
        using Stream sheet = SheetFile.Open(file, streams);
        using var source = new RecordSource(name, sheet, comma);
        string place = $"{name} line {source.FirstLine}";
        SheetPlan plan = SheetPlan.Compile(source.Headings, source.Dialect.DecimalMark, place, binder.Mixtures());
        IReadOnlyList<ResultColumn> results = arguments.Value("--show") is string list ? ResultSet.Parse(list, options.Units) : ResultSet.Default(plan.Columns, options.Units);
        if (format == BatchFormat.Csv) plan.RequireFree(CsvRows.Titles(results), place);
        RowRenderer renderer = Renderer(format, source.Dialect, source.RawHeading, results, options);
        using var stop = new StopSignals();
        var progress = new ProgressLine(streams.Error, sheet.CanSeek ? sheet.Length : 0);
        var request = new BatchRequest
        {
            Jobs = jobs,
            Shard = shard,
            Strict = options.Strict,
            Stop = () => stop.Status != 0,
            Progress = (_, target) => Show(progress, target, source, streams),
        };
        var report = new BatchReport(name, streams.Error, options.Quiet);
        foreach ((string heading, string near) in plan.NearMisses) report.NearMiss(heading, near);
        BatchEnd end = Finish(arguments, streams, new BatchRun(source, request, plan, renderer), Settings(source, plan, renderer, format, shard, options), progress);
        report.Tell(end);
        if (stop.Status != 0 && arguments.Value("--output") is string output) report.TellKept(output);
        return stop.Status != 0 ? stop.Status : BatchReport.StatusOf(end.Tally.Gravest);
    }

    private static void Show(ProgressLine progress, ResultTarget target, RecordSource source, Streams streams)
    {
        if (streams.ErrorIsTerminal) progress.Show(target.SafeRow, source.Position);
    }

    /// <summary>The format of the results.</summary>
    internal static BatchFormat Format(CaseBinder binder) =>
        binder.Choice("--format", BatchFormat.Csv, ("csv", BatchFormat.Csv), ("jsonl", BatchFormat.JsonLines), ("json", BatchFormat.Json));

    /// <summary>What writes the results in a format.</summary>
    internal static RowRenderer Renderer(BatchFormat format, SheetDialect dialect, ReadOnlyMemory<byte> heading, IReadOnlyList<ResultColumn> results, RenderOptions options) => format switch
    {
        BatchFormat.Csv => new CsvRows(dialect, heading, results, options.Digits ?? CsvRows.UsualDigits),
        _ => new JsonRows(format == BatchFormat.JsonLines, options),
    };

    // Everything but the rows that decides the bytes of the results.
    private static string Settings(RecordSource source, SheetPlan plan, RowRenderer renderer, BatchFormat format, Shard shard, RenderOptions options)
    {
        var sink = new ByteSink();
        renderer.Begin(sink);
        sink.Write(source.RawHeading.Span);
        sink.Write($"{format} {shard.Index}/{shard.Count} {options.Digits} {options.Strict} {source.Dialect.DecimalMark}");
        foreach ((string name, Fluids.Fluid mixture) in plan.Mixtures) sink.Write($" {name} {mixture.Name} {mixture.Formulation}");
        var check = new RecordCheck();
        check.Add(sink.Written);
        return check.Value.ToString("x8", System.Globalization.CultureInfo.InvariantCulture);
    }

    private static BatchEnd Finish(Arguments arguments, Streams streams, BatchRun run, string settings, ProgressLine progress)
    {
        try
        {
            return ResultTargets.Use(arguments, streams, settings, run.Run);
        }
        finally
        {
            progress.End();
        }
    }
}
