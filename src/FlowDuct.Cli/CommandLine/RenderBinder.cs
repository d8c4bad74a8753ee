using FlowDuct.Cli.Rendering;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Turns output options into <see cref="RenderOptions"/>.</summary>
internal static class RenderBinder
{
    private const int MostDigits = 15;

    internal static RenderOptions Bind(Arguments arguments, CaseBinder binder, bool terminal)
    {
        return new RenderOptions(
            new DisplayText(System(binder), binder.AmbientPressure, ShowIn(arguments)),
            Digits(arguments),
            Colour(binder, terminal),
            arguments.Has("--quiet"),
            arguments.Has("--strict"));
    }

    /// <summary>The unit system of the answer.</summary>
    internal static UnitSystem System(CaseBinder binder) =>
        binder.Choice("--units", UnitSystem.Metric, ("metric", UnitSystem.Metric), ("us", UnitSystem.Us));

    /// <summary>True for JSON, false for text.</summary>
    internal static bool WantsJson(CaseBinder binder) => binder.Choice("--format", false, ("text", false), ("json", true));

    /// <summary>The format of a device's answer.</summary>
    internal static AnswerFormat Format(CaseBinder binder) => binder.Choice(
        "--format", AnswerFormat.Text, ("text", AnswerFormat.Text), ("json", AnswerFormat.Json), ("csv", AnswerFormat.Csv));

    private static bool Colour(CaseBinder binder, bool terminal)
    {
        bool? chosen = binder.Choice<bool?>("--color", null, ("auto", null), ("always", true), ("never", false));
        bool forbidden = !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"));
        return chosen ?? (terminal && !forbidden);
    }

    private static int? Digits(Arguments arguments) =>
        arguments.Value("--digits") is string text ? WholeNumber.Read("--digits", text, 1, MostDigits, 7) : null;

    // "T=degF, p=inH2O(g)": a symbol and a unit of its dimension.
    private static Dictionary<Dimension, UnitReading>? ShowIn(Arguments arguments)
    {
        if (arguments.Value("--show-in") is not string list) return null;
        Dictionary<Dimension, UnitReading> units = [];
        foreach (string piece in list.Split(',', StringSplitOptions.TrimEntries))
        {
            string[] sides = piece.Split('=', StringSplitOptions.TrimEntries);
            if (sides.Length != 2 || !(QuantityCatalogue.TryFindStationQuantity(sides[0], out QuantityRow? row) || QuantityCatalogue.TryFindPerformance(sides[0], out row)))
                throw Usage.Refuse("--show-in", $"{Echo.Ascii(piece)} is not symbol=unit", "write for example --show-in \"T=degF, p=inH2O(g)\"");
            if (!UnitTable.TryFind(sides[1], row.Dimension, out UnitReading unit))
                throw Usage.Refuse("--show-in", UnitTable.Suggest(sides[1], row.Dimension), string.Empty);
            units[row.Dimension] = unit;
        }

        return units;
    }
}
