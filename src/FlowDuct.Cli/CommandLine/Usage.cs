using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Refusals of the command line itself; each ends with status 2.</summary>
internal static class Usage
{
    internal static FlowDuctException Refuse(string place, string reason, string next) =>
        new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));

    internal static FlowDuctException UnknownCommand(string word) => Refuse(
        string.Empty,
        $"{Echo.Ascii(word)} is not a command",
        Nearest(word, CommandTable.All.Select(row => row.Word)) is string near ? $"did you mean {near}?" : "write one of " + CommandTable.WordsOf(CommandName.All));

    internal static FlowDuctException BeforeCommand(string word) => Nearest(word, ["--help", "--version"]) is string near && near != word
        ? Refuse(string.Empty, $"{Echo.Ascii(word)} is not an option", $"did you mean {near}?")
        : Refuse(string.Empty, $"{Echo.Ascii(word)} comes before a command", "begin with one of " + CommandTable.WordsOf(CommandName.All));

    internal static FlowDuctException UnknownOption(string word, CommandName command)
    {
        string name = word.Split('=')[0];
        string shown = Echo.Ascii(name);
        if (!word.StartsWith('-')) return Refuse(string.Empty, $"{Echo.Ascii(word)} belongs to no option", "quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"");
        OptionRow? elsewhere = Array.Find(OptionTable.All, row => row.Name == name);
        string reason = elsewhere is null ? $"{shown} is not an option" : $"{shown} is not an option of {CommandTable.WordOf(command)}";
        string? near = elsewhere is null ? Nearest(name, OptionTable.Of(command).Select(row => row.Name)) : null;
        string next = (elsewhere, near) switch
        {
            (not null, _) => $"it belongs to {CommandTable.WordsOf(elsewhere.Commands)}",
            (_, not null) => $"did you mean {near}?",
            _ => $"flowduct {CommandTable.WordOf(command)} --help lists the options",
        };
        return Refuse(string.Empty, reason, next);
    }

    internal static FlowDuctException NoValue(OptionRow row) => Refuse(row.Name, "has no value", $"write for example {row.Name} {row.Example}");

    internal static FlowDuctException Twice(OptionRow row) => Refuse(row.Name, "is given twice", "keep one of them");

    internal static FlowDuctException Missing(OptionRow row) => Refuse(row.Name, "is missing", $"write for example {row.Name} {row.Example}");

    internal static FlowDuctException NotOneOf(string name, string value, IReadOnlyList<string> choices) => Refuse(
        name,
        $"{Echo.Ascii(value)} is not one of {string.Join(", ", choices)}",
        Nearest(value, choices) is string near ? $"did you mean {near}?" : string.Empty);

    /// <summary>The word at the least distance, if it is near enough to be a slip.</summary>
    internal static string? Nearest(string word, IEnumerable<string> words) => Slips.NearestWord(word, words);
}
