using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>Refusals of a heading; the file, line and column number are put before them where the file is known.</summary>
internal static class HeadingRefusals
{
    internal static FlowDuctException OpenBracket(string heading) => Refuse(heading, "a bracket is not closed", "write for example inlet.p [barg]");

    internal static FlowDuctException NoQuantity(string heading, string name)
    {
        string? near = Slips.NearestWord(name.Replace('_', '-'), QuantityCatalogue.Options.Select(row => row.Word));
        return Refuse(heading, $"{Echo.Ascii(name)} is no quantity", near is null ? "leave the bracket out to pass the column through" : $"did you mean {near}?");
    }

    internal static FlowDuctException NoStation(string heading, string word)
    {
        string? near = Slips.NearestWord(word, StationWords.All);
        return Refuse(heading, $"{Echo.Ascii(word)} is no station", near is null ? $"write one of {string.Join(", ", StationWords.All)} before the point" : $"did you mean {near}?");
    }

    internal static FlowDuctException NoFigure(string heading, string station, string symbol, StationLists list)
    {
        IEnumerable<string> taken = QuantityCatalogue.StationQuantities.Where(row => row.StationSlot is not null && (row.TakenBy & list) != 0).Select(row => row.Key);
        return Refuse(heading, $"{Echo.Ascii(symbol)} is no quantity that {station} takes", $"write one of {string.Join(", ", taken)}");
    }

    internal static FlowDuctException Unit(string heading, string suggestion) => Refuse(heading, suggestion, string.Empty);

    internal static FlowDuctException NoBasis(string heading, in UnitReading unit) => Refuse(
        heading,
        $"{unit.Spelling} does not say whether it is absolute or gauge",
        $"write [{unit.Spelling}(a)] or [{unit.Spelling}(g)], or add a column pressure-basis");

    internal static FlowDuctException Result(string heading) => Refuse(
        heading, "it names a result, which this run is about to write", "leave result columns of an earlier run out");

    internal static FlowDuctException NoResult(string heading, string name, IEnumerable<string> words) => Refuse(
        heading,
        name.Length == 0 ? "it names no result" : $"{Echo.Ascii(name)} is no result",
        Slips.NearestWord(name, words) is string near ? $"did you mean {near}?" : "write for example exit.T [degC], regime, mass_flow [kg/s]");

    internal static FlowDuctException NotInSheets(string heading) => Refuse(
        heading, "it asks a question that a sheet does not take", "ask it with flowduct nozzle, or give the column another name");

    internal static FlowDuctException Twice(string heading, int first) => Refuse(
        heading, $"column {first} has the same meaning", "leave one of them out");

    internal static FlowDuctException Missing(string name, string example) => new(new Refusal(
        RefusalKind.NotUnderstood, "heading", $"there is no column {name}", $"add it, with cells such as {example}"));

    private static FlowDuctException Refuse(string heading, string reason, string next) =>
        new(new Refusal(RefusalKind.NotUnderstood, $"column \"{Echo.Ascii(heading)}\"", reason, next));
}
