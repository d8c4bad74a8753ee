using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>One column of a datasheet, compiled from its heading: what it gives, where, and in which unit.</summary>
/// <param name="Heading">As it stands in the file.</param>
/// <param name="Kind">What it is for.</param>
internal sealed record SheetColumn(string Heading, ColumnKind Kind)
{
    private const string Expect = "expect", Within = "within", Calc = "calc";

    /// <summary>The station or space whose figure it is; None for a figure of the device and for the rest.</summary>
    internal StationLists List { get; init; }

    /// <summary>The quantity; null for a column without one.</summary>
    internal QuantityRow? Row { get; init; }

    /// <summary>The unit in brackets; null where each cell carries its own.</summary>
    internal UnitReading? Unit { get; init; }

    /// <summary>Which words a choice column takes.</summary>
    internal ChoiceColumn Choice { get; init; }

    /// <summary>The result that an expected figure or a tolerance speaks of: its name, or status or findings; empty for the rest.</summary>
    internal string Stated { get; init; } = string.Empty;

    /// <summary>The same where it is a result of the answer; null for status, findings and the rest.</summary>
    internal ResultColumn? Result { get; init; }

    /// <summary>The unit in the brackets of a tolerance as it stands; null where there is none.</summary>
    internal string? ToleranceUnit { get; init; }

    /// <summary>True where the heading has a pressure unit that may be read as absolute or gauge.</summary>
    internal bool NeedsBasis => Unit is UnitReading unit && Kind == ColumnKind.Figure && List != StationLists.Ambient && PressureBasis.IsOpen(unit) && !PressureBasis.IsAbsoluteByCustom(unit);

    /// <summary>Reads a heading such as "inlet.p [barg]", "throat.d [mm]", "efficiency [%]" or "tag".</summary>
    /// <exception cref="FlowDuctException">A heading with a point or a bracket that names nothing known; kind NotUnderstood.</exception>
    internal static SheetColumn Parse(string heading)
    {
        string name = heading.Trim();
        if (BeginsWith(name, Expect)) return OfExpectation(heading, name[Expect.Length..].Trim());
        if (BeginsWith(name, Within)) return OfTolerance(heading, name[Within.Length..].Trim());
        if (BeginsWith(name, Calc)) throw HeadingRefusals.Result(heading);
        (string bare, string? unit) = SplitUnit(heading, name);
        int point = bare.IndexOf('.', StringComparison.Ordinal);
        return point < 0 ? OfDevice(heading, bare, unit) : AtStation(heading, bare[..point], bare[(point + 1)..], unit);
    }

    // "expected life" is a remark; "expect exit.T" and "expect" alone are ours.
    private static bool BeginsWith(string name, string word) =>
        name.StartsWith(word, StringComparison.Ordinal) && (name.Length == word.Length || name[word.Length] == ' ');

    internal static (string Name, string? Unit) SplitUnit(string heading, string name)
    {
        int bracket = name.IndexOf('[', StringComparison.Ordinal);
        if (bracket < 0) return (name, null);
        if (!name.EndsWith(']')) throw HeadingRefusals.OpenBracket(heading);
        return (name[..bracket].TrimEnd(), name[(bracket + 1)..^1].Trim());
    }

    private static SheetColumn OfExpectation(string heading, string text) => text is "status" or "findings"
        ? new(heading, ColumnKind.Expected) { Stated = text }
        : Stating(heading, ColumnKind.Expected, text, ResultColumn.Parse(heading, text, DisplayText.Metric));

    // A tolerance is an interval: it has a unit of its own, which verify reads.
    private static SheetColumn OfTolerance(string heading, string text)
    {
        (string name, string? unit) = SplitUnit(heading, text);
        return Stating(heading, ColumnKind.Within, name, ResultColumn.Parse(heading, name, DisplayText.Metric)) with { ToleranceUnit = unit };
    }

    private static SheetColumn Stating(string heading, ColumnKind kind, string text, ResultColumn result) =>
        new(heading, kind) { Stated = SplitUnit(heading, text).Name, Result = result };

    private static SheetColumn OfDevice(string heading, string name, string? unit)
    {
        if (QuantityCatalogue.TryFindOption(name, out QuantityRow? option))
            return new SheetColumn(heading, ColumnKind.Figure) { Row = option, Unit = UnitOf(heading, option, unit) };
        if (unit is not null) throw HeadingRefusals.NoQuantity(heading, name);
        string hyphened = name.Replace('_', '-');
        foreach ((ChoiceColumn choice, string word, _) in ChoiceWords.All)
        {
            if (word == hyphened) return new SheetColumn(heading, ColumnKind.Choice) { Choice = choice };
        }

        return hyphened is "find" or "target" or "path" or "wall" ? throw HeadingRefusals.NotInSheets(heading) : new SheetColumn(heading, KindOf(hyphened));
    }

    private static ColumnKind KindOf(string name) => name switch
    {
        "tag" => ColumnKind.Tag,
        "case" => ColumnKind.Case,
        "device" => ColumnKind.Device,
        "fluid" => ColumnKind.Fluid,
        "pressure-basis" => ColumnKind.PressureBasis,
        "reference-state" => ColumnKind.ReferenceState,
        "waiver" => ColumnKind.Waiver,
        _ => ColumnKind.PassThrough,
    };

    private static SheetColumn AtStation(string heading, string station, string symbol, string? unit)
    {
        StationLists list = StationWords.Find(station);
        if (list == StationLists.None) throw HeadingRefusals.NoStation(heading, station);
        if (!QuantityCatalogue.TryFindStationQuantity(symbol, out QuantityRow? row) || row.StationSlot is null || (row.TakenBy & list) == 0)
            throw HeadingRefusals.NoFigure(heading, station, symbol, list);
        return new SheetColumn(heading, ColumnKind.Figure) { List = list, Row = row, Unit = UnitOf(heading, row, unit) };
    }

    private static UnitReading? UnitOf(string heading, QuantityRow row, string? unit)
    {
        // A ratio or a count needs no unit, so its cells are numbers from the start.
        if (unit is null && row.Dimension is not (Dimension.Ratio or Dimension.Count)) return null;
        foreach (Dimension dimension in (Dimension[])[row.Dimension, .. row.AlsoGivenAs])
        {
            if (UnitTable.TryFind(unit ?? "1", dimension, out UnitReading reading)) return reading;
        }

        throw HeadingRefusals.Unit(heading, UnitSuggestion.For(unit!, row));
    }
}
