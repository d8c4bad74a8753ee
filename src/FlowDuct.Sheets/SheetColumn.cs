using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>One column of a datasheet, compiled from its heading: which station or option it gives, and in which unit.</summary>
/// <param name="Heading">As it stands in the file.</param>
/// <param name="Station">The station before the point; null for an option or a column that passes through.</param>
/// <param name="Row">The quantity; null for a column that passes through untouched.</param>
/// <param name="Unit">The unit in brackets; null where each cell carries its own.</param>
internal sealed record SheetColumn(string Heading, Station? Station, QuantityRow? Row, UnitReading? Unit)
{
    /// <summary>Reads a heading such as "inlet.p [barg]", "throat.d [mm]", "efficiency [%]" or "tag".</summary>
    /// <exception cref="FlowDuctException">A heading with a point or a bracket that names nothing known; kind NotUnderstood.</exception>
    internal static SheetColumn Parse(string heading)
    {
        string name = heading.Trim();
        string? unit = null;
        int bracket = name.IndexOf('[', StringComparison.Ordinal);
        if (bracket >= 0)
        {
            if (!name.EndsWith(']')) throw Refuse(heading, "a bracket is not closed", "write for example inlet.p [barg]");
            (name, unit) = (name[..bracket].TrimEnd(), name[(bracket + 1)..^1].Trim());
        }

        int point = name.IndexOf('.', StringComparison.Ordinal);
        if (point >= 0) return AtStation(heading, name[..point], name[(point + 1)..], unit);
        if (QuantityCatalogue.TryFindOption(name, out QuantityRow? option)) return new SheetColumn(heading, null, option, UnitOf(heading, option, unit));
        return unit is null ? new SheetColumn(heading, null, null, null) : throw Refuse(heading, $"{Echo.Ascii(name)} is no quantity", "leave the bracket out to pass the column through");
    }

    private static SheetColumn AtStation(string heading, string station, string symbol, string? unit)
    {
        Station? known = station switch
        {
            "inlet" => Quantities.Station.Inlet,
            "throat" => Quantities.Station.Throat,
            "exit" => Quantities.Station.Exit,
            "ambient" => Quantities.Station.Ambient,
            "at" => Quantities.Station.At,
            _ => null,
        };
        if (known is null) throw Refuse(heading, $"{Echo.Ascii(station)} is no station", "write inlet, throat, exit, ambient or at before the point");
        return QuantityCatalogue.TryFindStationQuantity(symbol, out QuantityRow? row) && row.StationSlot is not null
            ? new SheetColumn(heading, known, row, UnitOf(heading, row, unit))
            : throw Refuse(heading, $"{Echo.Ascii(symbol)} is no quantity that a station takes", "write for example inlet.p [barg]");
    }

    private static UnitReading? UnitOf(string heading, QuantityRow row, string? unit)
    {
        if (unit is null) return null;
        return UnitTable.TryFind(unit, row.Dimension, out UnitReading reading) ? reading : throw Refuse(heading, UnitTable.Suggest(unit, row.Dimension), string.Empty);
    }

    private static FlowDuctException Refuse(string heading, string reason, string next) =>
        new(new Refusal(RefusalKind.NotUnderstood, $"column \"{Echo.Ascii(heading)}\"", reason, next));
}
