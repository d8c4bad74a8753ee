using System.Globalization;
using System.Text.Json;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The states along a nozzle as text table, CSV and JSON.</summary>
/// <param name="Points">The sections.</param>
/// <param name="Columns">What is shown of each.</param>
internal sealed record PathTable(IReadOnlyList<PathPoint> Points, IReadOnlyList<PathColumn> Columns)
{
    // As many as a plant drawing or a plot needs.
    private const int CsvDigits = 7;

    internal void Text(TextWriter to, RenderOptions options)
    {
        var table = new TextTable("path");
        foreach (PathColumn column in Columns) table.Column(column.Name, column.Unit.Dimension == Dimension.Ratio ? "-" : column.Unit.Spelling);
        int row = 0;
        foreach (PathPoint point in Points)
        {
            row++;
            table.Row(row.ToString(CultureInfo.InvariantCulture), [.. Columns.Select(column => TextFigures.Number(column.Read(point), column.Unit, options))]);
        }

        to.WriteLine();
        table.Write(to);
    }

    internal void Csv(TextWriter to, RenderOptions options)
    {
        to.WriteLine(string.Join(',', Columns.Select(column => column.Unit.Dimension == Dimension.Ratio ? column.Name : $"{column.Name} [{Basis(column.Unit)}]")));
        foreach (PathPoint point in Points)
            to.WriteLine(string.Join(',', Columns.Select(column => column.Read(point) is double number ? options.Units.Number(number, column.Unit, options.Digits ?? CsvDigits) : string.Empty)));
    }

    /// <summary>In coherent SI; null where no path is asked for.</summary>
    internal static void Json(Utf8JsonWriter json, PathTable? path)
    {
        if (path is null)
        {
            json.WriteNull("path");
            return;
        }

        json.WriteStartArray("path");
        foreach (PathPoint point in path.Points)
        {
            json.WriteStartObject();
            foreach (PathColumn column in path.Columns) JsonNumbers.Write(json, column.Name, column.Read(point));
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    // In a heading the basis of a pressure is visible.
    private static string Basis(in UnitReading unit) => unit.Spelling is "bar" or "psi" ? unit.Spelling + "(a)" : unit.Spelling;
}
