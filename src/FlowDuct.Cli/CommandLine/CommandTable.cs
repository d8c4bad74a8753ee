namespace FlowDuct.Cli.CommandLine;

/// <summary>One command: name, purpose, and the example that its help begins with.</summary>
internal sealed record CommandRow(CommandName Name, string Word, string Purpose, string Example);

/// <summary>Every command, in the order of help.</summary>
internal static class CommandTable
{
    internal static readonly CommandRow[] All =
    [
        new(CommandName.State, "state", "All properties of a fluid at one state, from two that are known.",
            "flowduct state --fluid water --at \"p=7 bar, superheat=20 K\""),
        new(CommandName.Nozzle, "nozzle", "Exit state, velocity, efficiency and choking of a nozzle, and whether its figures obey mass, energy and entropy.",
            "flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar\" --efficiency 96%"),
        new(CommandName.Diffuser, "diffuser", "Exit state, recovery, efficiency and loss of a diffuser, and whether its figures obey mass, energy and entropy.",
            "flowduct diffuser --fluid air --inlet \"p=14.2 psi, T=70 degF, V=540 ft/s\" --exit \"V=120 ft/s\" --recovery 0.72"),
        new(CommandName.Venturi, "venturi", "A nozzle followed by a diffuser as one device: flow, throat, recovery, permanent pressure loss and choking of a metering throat.",
            "flowduct venturi --fluid air --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm, dp=25 kPa\" --exit \"d=100 mm\" --loss-coefficient idelchik --included-angle \"8 deg\""),
        new(CommandName.Sweep, "sweep", "Answers one case again and again while inputs vary: sweep nozzle, diffuser, venturi or state, with the options of that command; a row of CSV to the point, several --vary make a grid of which the last varies fastest.",
            "flowduct sweep nozzle --fluid steam --inlet \"T=230 degC\" --exit \"p=1 bar\" --vary \"inlet.p=4..12 bar by 2 bar\""),
        new(CommandName.Run, "run", "Answers every row of a sheet (CSV, a file or - for the standard input): devices, fluids and units may be mixed; results stand behind the cells of each row, errors in their row.",
            "flowduct run cases.csv --output results.csv"),
        new(CommandName.SelfCheck, "selfcheck", "Computes every printed check value of the IAPWS releases on this machine and lists printed value, computed value and deviation.",
            "flowduct selfcheck --output selfcheck.txt"),
        new(CommandName.Fluids, "fluids", "The fluids with their formulations and ranges.", "flowduct fluids"),
        new(CommandName.Units, "units", "The units by quantity, with their SI size and source; a word picks a quantity.", "flowduct units pressure"),
    ];

    internal static CommandRow Of(CommandName name) => Array.Find(All, row => row.Name == name)!;

    /// <summary>The words of several commands.</summary>
    internal static string WordsOf(CommandName names) => string.Join(", ", All.Where(row => (row.Name & names) != 0).Select(row => row.Word));

    internal static string WordOf(CommandName name) => name == CommandName.None ? string.Empty : Of(name).Word;
}
