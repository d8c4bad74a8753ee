using System.CommandLine;
using System.CommandLine.Parsing;

namespace FlowDuct.Cli.CommandLine;

/// <summary>What was typed: the command, the value of each option, and words beside them.</summary>
internal sealed class Arguments
{
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
            ? Usage.Refuse(string.Empty, $"{Quantities.Echo.Ascii(args[0])} comes before a command", "begin with one of state, nozzle, diffuser, fluids, units")
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
            Option parsed = option.IsSwitch ? new Option<bool>(option.Name) : new Option<string>(option.Name) { Arity = ArgumentArity.ZeroOrOne };
            if (option.Name == "--help") parsed.Aliases.Add("-h");
            command.Options.Add(parsed);
            options.Add((option, parsed));
        }

        var configuration = new ParserConfiguration { EnablePosixBundling = false, ResponseFileTokenReplacer = null };
        ParseResult result = CommandLineParser.Parse(command, args[1..], configuration);
        var arguments = new Arguments
        {
            Command = row.Name,
            WantsHelp = result.GetResult("--help") is OptionResult { Implicit: false },
            Words = [.. result.UnmatchedTokens],
        };
        if (!arguments.WantsHelp) arguments.Collect(result, options);
        return arguments;
    }

    private void Collect(ParseResult result, List<(OptionRow Row, Option Option)> options)
    {
        foreach ((OptionRow row, Option option) in options)
        {
            if (result.GetResult(option) is not OptionResult given || given.Implicit) continue;
            if (given.IdentifierTokenCount > 1) throw Usage.Twice(row);
            if (row.IsSwitch) _values[row.Name] = string.Empty;
            else _values[row.Name] = ValueOf(row, given);
        }

        if (Command != CommandName.Units && Words.Count > 0) throw Usage.UnknownOption(Words[0], Command);
        if (Words.FirstOrDefault(word => word.StartsWith('-')) is string stray) throw Usage.UnknownOption(stray, Command);
        foreach ((OptionRow row, _) in options)
        {
            if (row.IsRequired && !Has(row.Name)) throw Usage.Missing(row);
        }
    }

    // A forgotten value leaves nothing, or makes the next option look like one.
    private static string ValueOf(OptionRow row, OptionResult given)
    {
        if (given.Tokens.Count == 0) throw Usage.NoValue(row);
        string value = given.Tokens[0].Value;
        return value.StartsWith("--", StringComparison.Ordinal) || value.Trim().Length == 0 ? throw Usage.NoValue(row) : value;
    }
}
