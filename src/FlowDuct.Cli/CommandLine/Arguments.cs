using System.CommandLine;
using System.CommandLine.Parsing;

namespace FlowDuct.Cli.CommandLine;

/// <summary>What was typed: the command, the value of each option, and words beside them.</summary>
internal sealed class Arguments
{
    /// <summary>The word that stands for the standard input where a file is asked for.</summary>
    internal const string StandardInput = "-";

    private readonly Dictionary<string, string> _values = [];

    internal CommandName Command { get; private init; }

    internal bool WantsHelp { get; private init; }

    internal bool WantsVersion { get; private init; }

    /// <summary>Words after the command that belong to no option.</summary>
    internal IReadOnlyList<string> Words { get; private init; } = [];

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
        foreach (OptionRow option in OptionTable.Of(row.Name))
        {
            // A switch of type bool would take "--quiet false" for a value and count as given.
            var parsed = new Option<string>(option.Name) { Arity = option.IsSwitch ? ArgumentArity.Zero : ArgumentArity.ZeroOrOne };
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
            if (given.IdentifierTokenCount > 1) twice ??= row;
            _values[row.Name] = row.IsSwitch ? string.Empty : ValueOf(row, given);
        }

        if (twice is not null) throw Usage.Twice(twice);

        if (Words.Count > MostWords(Command)) throw Usage.UnknownOption(Words[MostWords(Command)], Command);
        if (Words.FirstOrDefault(word => word.StartsWith('-') && word != StandardInput) is string stray) throw Usage.UnknownOption(stray, Command);
        foreach ((OptionRow row, _) in options)
        {
            if (row.IsRequired && !Has(row.Name)) throw Usage.Missing(row);
        }
    }

    private static int MostWords(CommandName command) => command switch
    {
        CommandName.Units => int.MaxValue,
        CommandName.Run => 1,
        _ => 0,
    };

    // A forgotten value leaves nothing, or makes the next option look like one.
    private static string ValueOf(OptionRow row, OptionResult given)
    {
        if (given.Tokens.Count == 0) throw Usage.NoValue(row);
        string value = given.Tokens[0].Value;
        return value.StartsWith("--", StringComparison.Ordinal) || value.Trim().Length == 0 ? throw Usage.NoValue(row) : value;
    }
}
