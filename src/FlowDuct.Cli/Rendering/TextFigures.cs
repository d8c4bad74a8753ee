using FlowDuct.Devices;
using FlowDuct.Findings;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>Numbers, units and words of the text answers.</summary>
internal static class TextFigures
{
    // Five digits tell 0.01 % of a steam enthalpy; pressures and temperatures of a plant are read no finer.
    internal const int UsualDigits = 5;

    /// <summary>The stations of an answer, in the direction of the flow.</summary>
    internal static IEnumerable<(string Name, StationAnswer At)> StationsOf(DeviceAnswer answer)
    {
        yield return ("inlet", answer.Inlet);
        if (answer.Throat is not null) yield return ("throat", answer.Throat);
        yield return ("exit", answer.Exit);
    }

    internal static UnitReading UnitOf(string stationKey, RenderOptions options) =>
        QuantityCatalogue.TryFindStationQuantity(stationKey, out QuantityRow? row)
            ? UnitOf(row, options)
            : throw new InvalidOperationException($"The catalogue has no {stationKey}.");

    /// <summary>The unit of a quantity: its own where it has one, else that of its dimension.</summary>
    internal static UnitReading UnitOf(QuantityRow row, RenderOptions options) => options.Units.UnitOf(row);

    /// <summary>A number in a unit; a dash where it cannot be known.</summary>
    internal static string Number(double? si, in UnitReading unit, RenderOptions options) =>
        si is double value ? options.Units.Number(value, unit, options.Digits ?? UsualDigits) : "-";

    internal static string SeverityWord(Severity severity) => severity switch
    {
        Severity.Error => "error",
        Severity.Caution => "caution",
        _ => "note",
    };

    /// <summary>Bold red for errors, yellow for cautions; the word alone says the same.</summary>
    internal static string Coloured(string text, Severity severity, RenderOptions options)
    {
        if (!options.Colour || severity == Severity.Note) return text;
        string start = severity == Severity.Error ? "\u001b[1;31m" : "\u001b[33m";
        return start + text + "\u001b[0m";
    }
}
