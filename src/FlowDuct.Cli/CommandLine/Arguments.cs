using System.CommandLine;
using System.CommandLine.Parsing;

namespace FlowDuct.Cli.CommandLine;

/// <summary>What was typed: the command, the value of each option, and words beside them.</summary>
internal sealed class Arguments
{
    /// <summary>The word that stands for the standard input where a file is asked for.</summary>
    internal const string StandardInput = "-";

    private readonly Dictionary<string, string> _values = [];
    private string[] _repeated = [];

    internal CommandName Command { get; private init; }

    internal bool WantsHelp { get; private init; }

    internal bool WantsVersion { get; private init; }

    /// <summary>Words after the command that belong to no option.</summary>
    internal IReadOnlyList<string> Words { get; private init; } = [];

    /// <summary>The device of a sweep; None for every other command.</summary>
    internal CommandName Device { get; private init; }

    /// <summary>The values of the option that may be repeated, in the order given.</summary>
    internal IReadOnlyList<string> Repeated => _repeated;

    /// <summary>The same with other values of some options.</summary>
    internal Arguments With(IEnumerable<KeyValuePair<string, string>> values)
    {
        var changed = new Arguments { Command = Command, Device = Device, Words = Words };
        foreach ((string option, string value) in _values) changed._values[option] = value;
        foreach ((string option, string value) in values) changed._values[option] = value;
        return changed;
    }

    internal string? Value(string option) => _values.GetValueOrDefault(option);

    internal bool Has(string option) => _values.ContainsKey(option);

    /// <summary>Reads the command line, or refuses with a place and a way out.</summary>
    internal static Arguments Read(string[] args)
    {
        if (args.Length == 0 || args is ["--help"] or ["-h"]) return new Arguments { WantsHelp = true };
        if (args is ["--version"]) return new Arguments { WantsVersion = true };
        CommandRow command = Array.Find(CommandTable.All, row => row.Word == args[0]) ?? throw (args[0].StartsWith('-')
            ? Usage.BeforeCommand(args[0])
            : Usage.UnknownCommand(args[0]));
        return ReadCommand(command, args);
    }

    private static Arguments ReadCommand(CommandRow row, string[] args)
    {
        // Only the options of this command are built: start-up time is part of the contract.
        var command = new Command(row.Word) { TreatUnmatchedTokensAsErrors = false };
        List<(OptionRow Row, Option Option)> options = [];
        CommandName device = row.Name == CommandName.Sweep ? DeviceOfSweep(args) : CommandName.None;
        foreach (OptionRow option in device == CommandName.None ? OptionTable.Of(row.Name) : OptionTable.OfSweep(device))
        {
            // A switch of type bool would take "--quiet false" for a value and count as given.
            Option parsed = option.IsRepeatable
                ? new Option<string[]>(option.Name) { Arity = ArgumentArity.ZeroOrMore }
                : new Option<string>(option.Name) { Arity = option.IsSwitch ? ArgumentArity.Zero : ArgumentArity.ZeroOrOne };
            if (option.Name == "--help") parsed.Aliases.Add("-h");
            command.Options.Add(parsed);
            options.Add((option, parsed));
        }

        var configuration = new ParserConfiguration { EnablePosixBundling = false, ResponseFileTokenReplacer = null };
        // The parser drops a leading [word] as a directive and a leading repetition of the command: such words are taken before.
        int leading = Array.FindIndex(args, 1, word => word.StartsWith('-') && word != StandardInput) is int first and > 0 ? first : args.Length;
        ParseResult result = CommandLineParser.Parse(command, args[leading..], configuration);
        var arguments = new Arguments
        {
            Command = row.Name,
            Device = device,
            WantsHelp = IsGiven(result, "--help"),
            WantsVersion = IsGiven(result, "--version"),
            Words = [.. args[1..leading], .. result.UnmatchedTokens],
        };
        if (!arguments.WantsHelp && !arguments.WantsVersion) arguments.Collect(result, options);
        return arguments;
    }

    private static bool IsGiven(ParseResult result, string option) => result.GetResult(option) is OptionResult { Implicit: false };

    private void Collect(ParseResult result, List<(OptionRow Row, Option Option)> options)
    {
        // Values first: in "--fluid air --heat --fluid" the slip is the value that --heat lacks, not a second --fluid.
        OptionRow? twice = null;
        foreach ((OptionRow row, Option option) in options)
        {
            if (result.GetResult(option) is not OptionResult given || given.Implicit) continue;
            if (given.IdentifierTokenCount > 1 && !row.IsRepeatable) twice ??= row;
            _values[row.Name] = row.IsSwitch ? string.Empty : ValueOf(row, given);
            if (row.IsRepeatable) _repeated = ValuesOf(row, given);
        }

        if (twice is not null) throw Usage.Twice(twice);

        if (Words.Count > MostWords(Command)) throw Usage.UnknownOption(Words[MostWords(Command)], Command);
        if (Words.FirstOrDefault(word => word.StartsWith('-') && word != StandardInput) is string stray) throw Usage.UnknownOption(stray, Command);
        foreach ((OptionRow row, _) in options)
        {
            // What a sweep varies need not be given too.
            if (row.IsRequired && !Has(row.Name) && (Device == CommandName.None || row.Name == "--vary")) throw Usage.Missing(row);
        }
    }

    private static int MostWords(CommandName command) => command switch
    {
        CommandName.Units => int.MaxValue,
        CommandName.Run or CommandName.Sweep => 1,
        _ => 0,
    };

    private static string[] ValuesOf(OptionRow row, OptionResult given) =>
        given.Tokens.Count < given.IdentifierTokenCount ? throw Usage.NoValue(row) : [.. given.Tokens.Select(token => token.Value)];

    // The word behind sweep decides which options there are, so it is read before them.
    private static CommandName DeviceOfSweep(string[] args)
    {
        string word = args.Length > 1 ? args[1] : string.Empty;
        if (word is "--help" or "-h" or "--version") return CommandName.Nozzle;
        CommandRow? device = Array.Find(CommandTable.All, row => row.Word == word && (row.Name & CommandName.Answering) != 0);
        return device?.Name ?? throw Usage.NotOneOf("sweep", word.Length == 0 || word.StartsWith('-') ? "(nothing)" : word, [.. CommandTable.All.Where(row => (row.Name & CommandName.Answering) != 0).Select(row => row.Word)]);
    }

    // A forgotten value leaves nothing, or makes the next option look like one.
    private static string ValueOf(OptionRow row, OptionResult given)
    {
        if (given.Tokens.Count == 0) throw Usage.NoValue(row);
        string value = given.Tokens[0].Value;
        return value.StartsWith("--", StringComparison.Ordinal) || value.Trim().Length == 0 ? throw Usage.NoValue(row) : value;
    }
}
