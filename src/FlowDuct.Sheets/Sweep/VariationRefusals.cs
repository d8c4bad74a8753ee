using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Sweep;

/// <summary>Refusals of a variation.</summary>
internal static class VariationRefusals
{
    private const string Example = "write for example --vary \"inlet.p=4..12 bar by 0.5 bar\"";

    internal static FlowDuctException NoEquals(string text) => Refuse($"{Echo.Ascii(text)} is not name=values", Example);

    internal static FlowDuctException NoValues(string name) => Refuse($"{Echo.Ascii(name)} has no values", Example);

    internal static FlowDuctException NoStation(string name) => Refuse($"{Echo.Ascii(name)} names no station", $"write one of {string.Join(", ", StationWords.All)} before the point");

    internal static FlowDuctException NoFigure(string name, StationLists list)
    {
        IEnumerable<string> taken = QuantityCatalogue.StationQuantities.Where(row => row.StationSlot is not null && (row.TakenBy & list) != 0).Select(row => row.Key);
        return Refuse($"{Echo.Ascii(name)} is no figure that can be given there", $"write one of {string.Join(", ", taken)} behind the point");
    }

    internal static FlowDuctException NotAnInput(string name, IEnumerable<string> known) => Refuse(
        $"{Echo.Ascii(name)} is no input of this device", Slips.NearestWord(name, known) is string near ? $"did you mean {near}?" : Example);

    internal static FlowDuctException WordsOnly(string name) => Refuse($"{Echo.Ascii(name)} takes words, and words have no range", $"list them: --vary \"{Echo.Ascii(name)}=...,...\"");

    internal static FlowDuctException NoNumber(string name, string text) => Refuse($"{Echo.Ascii(name)}: {Echo.Ascii(text)} begins with no number", Example);

    internal static FlowDuctException TwoUnits(string name, string first, string second) => Refuse(
        $"{Echo.Ascii(name)}: the ends have the units {Echo.Ascii(first)} and {Echo.Ascii(second)}", "give both ends in one unit");

    internal static FlowDuctException NoUnit(string name, QuantityRow row) => Refuse($"{Echo.Ascii(name)}: the last value has no unit", $"write it behind that value, such as {row.DisplayUnit(UnitSystem.Metric)}");

    internal static FlowDuctException Unit(string name, string suggestion) => Refuse($"{Echo.Ascii(name)}: {suggestion}", string.Empty);

    internal static FlowDuctException NoRule(string name) => Refuse(
        $"{Echo.Ascii(name)}: the range does not say its points", "write behind it for example: by 0.5 bar, in 11 points, or in 11 points log");

    internal static FlowDuctException NoStep(string name, string text) => Refuse($"{Echo.Ascii(name)}: the step {Echo.Ascii(text)} is not above 0", "write a size; the ends give the direction");

    internal static FlowDuctException NoLog(string name) => Refuse(
        $"{Echo.Ascii(name)}: log needs ends above 0 on a scale that begins at zero", "write for example bar(a) for a gauge unit, K for degC");

    internal static FlowDuctException TooMany(string name, int most) => Refuse($"{Echo.Ascii(name)}: the range has more than {most} points", "take a longer step");

    private static FlowDuctException Refuse(string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, "--vary", reason, next));
}
