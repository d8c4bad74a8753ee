using System.Globalization;
using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The states along a nozzle as text table, CSV and JSON: position, area, p, T, V, M, x.</summary>
internal static class PathTable
{
    // As many as a plant drawing or a plot needs.
    private const int CsvDigits = 7;

    private static readonly string[] s_keys = ["p", "T", "V", "M", "x"];

    internal static void Text(TextWriter to, IReadOnlyList<PathPoint> points, Fluid fluid, RenderOptions options)
    {
        var table = new TextTable("path");
        UnitReading length = options.Units.UnitOf(Dimension.Length), area = options.Units.UnitOf(Dimension.Area);
        table.Column("position", length.Spelling);
        table.Column("A", area.Spelling);
        foreach (string key in s_keys)
        {
            UnitReading unit = TextFigures.UnitOf(key, options);
            table.Column(key, unit.Dimension == Dimension.Ratio ? "-" : unit.Spelling);
        }

        int row = 0;
        foreach (PathPoint point in points)
        {
            row++;
            table.Row(
                row.ToString(CultureInfo.InvariantCulture),
                [
                    TextFigures.Number(point.Position, length, options), TextFigures.Number(point.Area, area, options),
                    .. s_keys.Select(key => TextFigures.Number(StationFigureTable.Read(fluid, point.At, key), TextFigures.UnitOf(key, options), options)),
                ]);
        }

        to.WriteLine();
        table.Write(to);
    }

    internal static void Csv(TextWriter to, IReadOnlyList<PathPoint> points, Fluid fluid, RenderOptions options)
    {
        UnitReading length = options.Units.UnitOf(Dimension.Length), area = options.Units.UnitOf(Dimension.Area);
        UnitReading[] units = [length, area, .. s_keys.Select(key => TextFigures.UnitOf(key, options))];
        string[] names = ["position", "A", .. s_keys];
        to.WriteLine(string.Join(',', names.Select((name, i) => units[i].Dimension == Dimension.Ratio ? name : $"{name} [{Basis(units[i])}]")));
        foreach (PathPoint point in points)
        {
            double?[] values = [point.Position, point.Area, .. s_keys.Select(key => StationFigureTable.Read(fluid, point.At, key))];
            to.WriteLine(string.Join(',', values.Select((value, i) => value is double number ? options.Units.Number(number, units[i], options.Digits ?? CsvDigits) : string.Empty)));
        }
    }

    internal static void Json(Utf8JsonWriter json, IReadOnlyList<PathPoint>? points, Fluid fluid)
    {
        if (points is null)
        {
            json.WriteNull("path");
            return;
        }

        json.WriteStartArray("path");
        foreach (PathPoint point in points)
        {
            json.WriteStartObject();
            JsonNumbers.Write(json, "position", point.Position);
            JsonNumbers.Write(json, "A", point.Area);
            foreach (string key in s_keys) JsonNumbers.Write(json, key, StationFigureTable.Read(fluid, point.At, key));
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    // In a heading the basis of a pressure is visible.
    private static string Basis(in UnitReading unit) => unit.Spelling is "bar" or "psi" ? unit.Spelling + "(a)" : unit.Spelling;
}
