using System.Text;
using FlowDuct.Cli.CommandLine;
using FlowDuct.Cli.Rendering;
using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Quantities;
using FlowDuct.Sheets;
using FlowDuct.Sheets.Batch;
using FlowDuct.Sheets.Csv;
using FlowDuct.Sheets.Sweep;

namespace FlowDuct.Cli.Batch;

/// <summary>The command sweep: each point is the command line of its device with other values, so its answer is that command's answer.</summary>
internal static class SweepCommand
{
    private const int PointsBetweenWrites = 256;

    /// <summary>Answers every point.</summary>
    /// <returns>The documented exit status: 0 where at least one point was answered.</returns>
    /// <exception cref="FlowDuctException">The command line is refused.</exception>
    internal static int Run(Arguments arguments, Streams streams)
    {
        var binder = new CaseBinder(arguments);
        RenderOptions options = RenderBinder.Bind(arguments, binder, terminal: false);
        BatchFormat format = BatchCommand.Format(binder);
        var grid = new SweepGrid([.. arguments.Repeated.Select(VariationParser.Parse)]);
        RequireInputs(arguments, grid);
        if (arguments.Has("--dry-run")) return Print(streams, grid);
        IReadOnlyList<ResultColumn> results = Results(arguments, options);
        RowRenderer renderer = BatchCommand.Renderer(format, SheetDialect.Plain, Heading(grid), results, options);
        using var stop = new StopSignals();
        BatchTally tally = ResultTargets.Use(arguments, streams, string.Empty, target => Points(arguments, grid, renderer, options, target, stop));
        new BatchReport("sweep", streams.Error, options.Quiet).Tell(new BatchEnd(tally, false, false));
        long answered = tally[RowVerdict.Passed] + tally[RowVerdict.Cautioned] + tally[RowVerdict.Impossible];
        return stop.Status != 0 ? stop.Status : answered > 0 ? ExitStatus.Passed : BatchReport.StatusOf(tally.Gravest);
    }

    // What is varied must be an option of the device, and what the device cannot do without must be given or varied.
    private static void RequireInputs(Arguments arguments, SweepGrid grid)
    {
        OptionRow[] inputs = [.. OptionTable.OfSweep(arguments.Device).Where(row => row.OfTheCase && row.Name != "--vary")];
        foreach (Variation variation in grid.Variations)
        {
            if (!Array.Exists(inputs, row => row.Name == OptionOf(variation))) throw VariationRefusals.NotAnInput(variation.Name, inputs.Select(row => row.Name[2..]));
        }

        foreach (OptionRow row in inputs)
        {
            if (row.IsRequired && !arguments.Has(row.Name) && !grid.Variations.Any(variation => OptionOf(variation) == row.Name)) throw Usage.Missing(row);
        }
    }

    private static int Print(Streams streams, SweepGrid grid)
    {
        string parts = string.Join(", ", grid.Variations.Select(variation => $"{variation.Name} {variation.Values.Count}"));
        Output.WriteAll(streams.Out, Encoding.ASCII.GetBytes($"{grid.Count} points: {parts}\n"));
        return ExitStatus.Passed;
    }

    private static IReadOnlyList<ResultColumn> Results(Arguments arguments, RenderOptions options)
    {
        if (arguments.Value("--show") is string list) return ResultSet.Parse(list, options.Units);
        StationLists station = arguments.Device == CommandName.State ? StationLists.At : StationLists.Inlet;
        return ResultSet.Default([new SheetColumn(string.Empty, ColumnKind.Figure) { List = station }], options.Units);
    }

    private static byte[] Heading(SweepGrid grid)
    {
        var sink = new ByteSink();
        foreach (Variation variation in grid.Variations)
        {
            if (sink.Length > 0) sink.Write((byte)',');
            CellText.Write(sink, variation.Unit.Length == 0 ? variation.Name : $"{variation.Name} [{WithBasis(variation)}]", (byte)',');
        }

        return sink.Written.ToArray();
    }

    // On the command line a bare pressure unit is absolute; in a sheet that has to be seen.
    private static string WithBasis(Variation variation)
    {
        bool pressure = QuantityCatalogue.TryFindStationQuantity(variation.Symbol, out QuantityRow? row) && row.Dimension == Dimension.Pressure;
        return pressure && UnitTable.TryFind(variation.Unit, Dimension.Pressure, out UnitReading unit) && PressureBasis.IsOpen(unit) ? variation.Unit + "(a)" : variation.Unit;
    }

    private static BatchTally Points(Arguments arguments, SweepGrid grid, RowRenderer renderer, RenderOptions options, ResultTarget target, StopSignals stop)
    {
        var (tally, sink) = (new BatchTally(), new ByteSink());
        int[] indices = new int[grid.Variations.Count];
        renderer.Begin(sink);
        for (long point = 0; point < grid.Count; point++)
        {
            grid.At(point, indices);
            Point(arguments, grid, indices, point + 1, renderer, options, sink, tally);
            if ((point + 1) % PointsBetweenWrites != 0) continue;
            if (stop.Status != 0 || !target.Write(sink.Written)) return tally;
            sink.Clear();
        }

        renderer.End(sink);
        if (target.Write(sink.Written) && stop.Status == 0) target.Complete();
        return tally;
    }

    private static void Point(
        Arguments arguments, SweepGrid grid, int[] indices, long number, RowRenderer renderer, RenderOptions options, ByteSink sink, BatchTally tally)
    {
        RowAnswer answer = Answer(arguments, grid, indices, out double ambient);
        IReadOnlyList<Finding> findings = answer.Findings;
        RowVerdict verdict = answer.Verdict(findings, options.Strict);
        tally.Count(verdict);
        if (answer.Refusal is Refusal refusal) tally.FirstFailure ??= $"row {number}: {RefusalText.Of(refusal)}";
        renderer.Row(sink, new RowPlace { Number = number, IsFirst = number == 1, Record = Record(grid, indices), AmbientPressure = ambient }, answer, findings, verdict);
    }

    private static RowAnswer Answer(Arguments arguments, SweepGrid grid, int[] indices, out double ambient)
    {
        ambient = 0;
        try
        {
            var binder = new CaseBinder(arguments.With(SweepPoint.Options(arguments, grid, indices)));
            ambient = binder.AmbientPressure;
            if (arguments.Device == CommandName.State) return RowAnswer.Of(StateAnswer.Solve(binder.Fluid(), binder.At()));
            return RowAnswer.Of(DeviceSolver.Solve(binder.Device(KindOf(arguments.Device))));
        }
        catch (FlowDuctException refused)
        {
            return RowAnswer.Of(refused.Refusal);
        }
    }

    private static DeviceKind KindOf(CommandName device) => device switch
    {
        CommandName.Nozzle => DeviceKind.Nozzle,
        CommandName.Diffuser => DeviceKind.Diffuser,
        _ => DeviceKind.Venturi,
    };

    private static byte[] Record(SweepGrid grid, int[] indices)
    {
        var sink = new ByteSink();
        for (int i = 0; i < indices.Length; i++)
        {
            if (i > 0) sink.Write((byte)',');
            CellText.WriteQuoted(sink, grid.Variations[i].Values[indices[i]], (byte)',');
        }

        return sink.Written.ToArray();
    }

    private static string OptionOf(Variation variation) => SweepPoint.OptionOf(variation);
}
