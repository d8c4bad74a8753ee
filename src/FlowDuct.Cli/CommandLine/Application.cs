using FlowDuct.Cli.Batch;
using FlowDuct.Cli.Rendering;
using FlowDuct.Devices;
using FlowDuct.Devices.Inverse;
using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids.Water.Verification;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>The program without its process: arguments and streams in, exit status out.</summary>
internal static class Application
{
    /// <summary>Answers one command line.</summary>
    /// <param name="args">The arguments.</param>
    /// <param name="stdout">Takes the answer, written once.</param>
    /// <param name="stderr">Takes refusals.</param>
    /// <param name="terminal">True where the answer is shown on a terminal.</param>
    /// <param name="stdin">Opens the standard input, where a sheet comes from it; null where there is none.</param>
    /// <param name="errorTerminal">True where progress may be shown on stderr.</param>
    /// <returns>The documented exit status.</returns>
    internal static int Run(string[] args, Stream stdout, Stream stderr, bool terminal, Func<Stream>? stdin = null, bool errorTerminal = false)
    {
        try
        {
            using var memory = new MemoryStream(4096);
            Arguments arguments = Arguments.Read(args);
            if (arguments is { Command: CommandName.Run or CommandName.Sweep, WantsHelp: false, WantsVersion: false })
            {
                var streams = new Streams(stdin ?? (() => Stream.Null), stdout, stderr, errorTerminal);
                return arguments.Command == CommandName.Run ? BatchCommand.Run(arguments, streams) : SweepCommand.Run(arguments, streams);
            }

            int status = Answer(arguments, memory, terminal);
            Deliver(arguments, memory, stdout);
            return status;
        }
        catch (FlowDuctException refused)
        {
            Complain(stderr, refused.Refusal.ToString());
            return ExitStatus.Of(refused.Refusal.Kind);
        }
#pragma warning disable CA1031 // The last line of defence: a defect is told in one line, never as a stack trace.
        catch (Exception defect)
        {
            Complain(stderr, $"defect: {defect.GetType().Name}: {defect.Message}\n  please report the command line; the answer is missing, nothing was written");
            return ExitStatus.Defect;
        }
#pragma warning restore CA1031
    }

    private static int Answer(Arguments arguments, MemoryStream memory, bool terminal)
    {
        if (arguments.WantsHelp) return Text(memory, to => HelpText.Write(to, arguments.Command));
        if (arguments.WantsVersion) return Text(memory, to => to.WriteLine($"flowduct {ToolVersion.Version} {ToolVersion.Commit}".TrimEnd()));
        return arguments.Command switch
        {
            CommandName.Fluids => Text(memory, Listings.Fluids),
            CommandName.Units => Text(memory, to => Listings.Units(to, arguments.Words)),
            CommandName.SelfCheck => SelfCheck(arguments, memory),
            CommandName.State => State(arguments, memory, terminal),
            _ => Device(arguments, memory, terminal),
        };
    }

    private static int SelfCheck(Arguments arguments, MemoryStream memory)
    {
        bool json = RenderBinder.WantsJson(new CaseBinder(arguments)), quiet = arguments.Has("--quiet");
        IReadOnlyList<CheckResult> results = CheckResult.Run();
        if (json) SelfCheckJson.Write(memory, results);
        else Text(memory, to => SelfCheckText.Write(to, results, quiet));
        return results.All(result => result.Met) ? ExitStatus.Passed : ExitStatus.Failed;
    }

    private static int State(Arguments arguments, MemoryStream memory, bool terminal)
    {
        var binder = new CaseBinder(arguments);
        RenderOptions options = RenderBinder.Bind(arguments, binder, terminal);
        AnswerFormat format = RenderBinder.Format(binder);
        if (binder.AtRange() is (StationRange range, GivenSlots rest)) return Table(StateTable.Solve(binder.Fluid(), rest, range, format == AnswerFormat.Json ? UnitSystem.Metric : RenderBinder.System(binder)), format, memory, options);
        if (format == AnswerFormat.Csv) throw Usage.Refuse("--format", "csv holds a table of states, and one state is asked for", "give a range, for example --at \"T=200..1000 K by 100 K\"");
        StateAnswer answer = StateAnswer.Solve(binder.Fluid(), binder.At());
        if (format == AnswerFormat.Json) StateJson.Write(memory, answer, options);
        else Text(memory, to => StateText.Write(to, answer, options));
        return FindingRules.Pass(answer.Findings, options.Strict) ? ExitStatus.Passed : ExitStatus.Failed;
    }

    private static int Table(StateTable table, AnswerFormat format, MemoryStream memory, RenderOptions options)
    {
        if (format == AnswerFormat.Json) StateTableJson.Write(memory, table, options);
        else Text(memory, to => StateTableText.Write(to, table, options, csv: format == AnswerFormat.Csv));
        return FindingRules.Pass(table.Findings, options.Strict) ? ExitStatus.Passed : ExitStatus.Failed;
    }

    private static int Device(Arguments arguments, MemoryStream memory, bool terminal)
    {
        var binder = new CaseBinder(arguments);
        RenderOptions options = RenderBinder.Bind(arguments, binder, terminal);
        AnswerFormat format = RenderBinder.Format(binder);
        DeviceCase c = binder.Device(arguments.Command switch { CommandName.Nozzle => DeviceKind.Nozzle, CommandName.Diffuser => DeviceKind.Diffuser, _ => DeviceKind.Venturi });
        DeviceAnswer answer = binder.Question() is InverseQuestion question ? question.Answer(c, binder.RootNumber) : DeviceSolver.Solve(c);
        PathTable? path = PathBinder.Read(arguments, answer, options);
        if (format == AnswerFormat.Csv && path is null) throw Usage.Refuse("--format", "csv holds the states along a nozzle, and none are asked for", "add --path, for example --path 21");
        if (format == AnswerFormat.Json) JsonAnswer.Write(memory, answer, path, options);
        else if (format == AnswerFormat.Csv) Text(memory, to => path!.Csv(to, options));
        else Text(memory, to => TextAnswer.Write(to, answer, path, options));
        return answer.Passes(options.Strict) ? ExitStatus.Passed : ExitStatus.Failed;
    }

    private static int Text(MemoryStream memory, Action<TextWriter> write)
    {
        using StreamWriter to = Output.WriterOn(memory);
        write(to);
        return ExitStatus.Passed;
    }

    private static void Deliver(Arguments arguments, MemoryStream memory, Stream stdout)
    {
        ReadOnlySpan<byte> bytes = memory.GetBuffer().AsSpan(0, (int)memory.Length);
        string? file = arguments.Value("--output");
        try
        {
            if (file is null) Output.WriteAll(stdout, bytes);
            else OutputFile.Write(file, bytes);
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            throw OutputFile.NotWritten(file, failure);
        }
    }

    internal static void Complain(Stream stderr, string text)
    {
        using var memory = new MemoryStream();
        using (StreamWriter to = Output.WriterOn(memory))
        {
            foreach (string line in ("flowduct: " + text).Split('\n')) to.WriteLine(Quantities.Echo.Ascii(line));
        }

        try
        {
            Output.WriteAll(stderr, memory.GetBuffer().AsSpan(0, (int)memory.Length));
        }
        catch (IOException)
        {
            // Nobody listens: the exit status still says it.
        }
    }
}
