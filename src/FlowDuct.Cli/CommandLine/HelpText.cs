using FlowDuct.Cli.Rendering;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Help: an example that runs, the purpose, then every option with its unit.</summary>
internal static class HelpText
{
    private const int Column = 30;

    internal static void Write(TextWriter to, CommandName command)
    {
        if (command == CommandName.None) Root(to);
        else Command(to, CommandTable.Of(command));
    }

    private static void Root(TextWriter to)
    {
        Example(to, CommandTable.Of(CommandName.Nozzle).Example);
        TextWrap.Write(to, string.Empty, "FlowDuct checks, rates and audits nozzles and diffusers in steam, water, air and other gases: exit state, velocity, quality, efficiency, and a verdict of mass, energy and entropy.", 0);
        to.WriteLine();
        to.WriteLine("commands");
        foreach (CommandRow row in CommandTable.All) Entry(to, row.Word, row.Purpose);
        to.WriteLine();
        to.WriteLine("flowduct COMMAND --help tells the rest; flowduct --version the version.");
        to.WriteLine();
        to.WriteLine("exit status");
        Entry(to, "0", "answered, every check passed");
        Entry(to, "1", "answered, but the figures are impossible, or --strict met a caution");
        Entry(to, "2", "not understood: syntax, unit, unknown, missing or redundant input");
        Entry(to, "3", "understood, but there is no answer: no physical solution, or out of range");
        Entry(to, "4", "the output could not be written");
        Entry(to, "70", "a defect in flowduct; please report it");
        to.WriteLine();
        TextWrap.Write(to, string.Empty, TextAnswer.Caution, 0);
    }

    private static void Command(TextWriter to, CommandRow command)
    {
        Example(to, command.Example);
        TextWrap.Write(to, string.Empty, command.Purpose, 0);
        Options(to, command.Name, "the case", ofTheCase: true);
        if ((command.Name & CommandName.Answering) != 0) Symbols(to, command.Name);
        Options(to, command.Name, "the answer", ofTheCase: false);
    }

    private static void Example(TextWriter to, string example)
    {
        to.WriteLine("example");
        TextWrap.Write(to, "  ", Tied(example), 4, " \\");
        to.WriteLine();
    }

    // A break inside quotes would change the command, one between an option and its value would hide what belongs together.
    private static string Tied(string example)
    {
        string[] pieces = example.Split('"');
        for (int i = 1; i < pieces.Length; i += 2) pieces[i] = pieces[i].Replace(' ', TextWrap.Tie);
        string[] words = string.Join('"', pieces).Split(' ');
        string text = words[0];
        for (int i = 1; i < words.Length; i++)
        {
            bool value = words[i - 1].StartsWith("--", StringComparison.Ordinal) && !words[i].StartsWith("--", StringComparison.Ordinal);
            text += (value ? TextWrap.Tie : ' ') + words[i];
        }

        return text;
    }

    private static void Options(TextWriter to, CommandName command, string title, bool ofTheCase)
    {
        List<OptionRow> rows = [.. OptionTable.Of(command).Where(row => row.OfTheCase == ofTheCase)];
        if (rows.Count == 0) return;
        to.WriteLine();
        to.WriteLine(title);
        foreach (OptionRow row in rows)
        {
            string example = row.Example.Length > 0 && row.OfTheCase ? " Example: " + Tied(row.Example) : string.Empty;
            Entry(to, row.IsSwitch ? row.Name : $"{row.Name} {row.Value}", row.Help + example);
        }
    }

    private static void Symbols(TextWriter to, CommandName command)
    {
        StationLists lists = command == CommandName.State ? StationLists.At : StationLists.Inlet | StationLists.Exit;
        to.WriteLine();
        to.WriteLine("symbols in lists, each written symbol=value unit (case matters)");
        foreach (QuantityRow row in QuantityCatalogue.StationQuantities)
        {
            if (row.StationSlot is null || (row.TakenBy & lists) == 0) continue;
            string where = command == CommandName.State ? string.Empty : (row.TakenBy & lists) switch
            {
                StationLists.Inlet => " (inlet)",
                StationLists.Exit => " (exit)",
                _ => string.Empty,
            };
            string example = row.Example.Length > 0 ? $", for example {row.Example}" : string.Empty;
            Entry(to, row.Word.Length > 0 && row.Word != row.Key ? $"{row.Key}, {row.Word}" : row.Key, row.Name + where + example);
        }
    }

    private static void Entry(TextWriter to, string name, string text) => TextWrap.Write(to, ("  " + name).PadRight(Column), " " + text, Column + 1);
}
