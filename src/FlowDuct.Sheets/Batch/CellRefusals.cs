using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>Refusals of one cell or of a row; the row goes out with them and the sheet goes on.</summary>
internal static class CellRefusals
{
    internal static FlowDuctException NoDevice(string text) => text.Length == 0
        ? Refuse("device", "it is empty", "write nozzle, diffuser, venturi or state")
        : NotOneOf("device", text, ["nozzle", "diffuser", "venturi", "state"]);

    internal static FlowDuctException NoFluid(string text) => text.Length == 0
        ? Refuse("fluid", "it is empty", "write for example steam")
        : Refuse(
            "fluid",
            $"{Echo.Ascii(text)} is not a fluid of this version",
            Slips.NearestWord(text, Fluids.FluidCatalogue.Words) is string near ? $"did you mean {near}?" : "flowduct fluids lists them");

    internal static FlowDuctException IdleFractions(string fluid) => Refuse(
        "fractions", $"{fluid} is no mixture and has no fractions", "leave the cell empty, or give a composition such as N2=0.72,CO2=0.13,H2O=0.15");

    internal static FlowDuctException OneEquation(Fluids.Fluid fluid) => Refuse(
        "equation-of-state", $"{fluid.Name} has one equation of state here, {fluid.Source}", "leave the cell empty");

    internal static FlowDuctException NoReferenceEquation(string name) => Refuse(
        "equation-of-state",
        $"{Echo.Ascii(name)} has no reference equation of state here",
        $"leave the cell empty for an ideal gas; {string.Join(", ", Fluids.Gases.ReferenceEquations.Names)} have one");

    internal static FlowDuctException NotOneOf(string heading, string text, string[] words) => Refuse(
        heading,
        $"{Echo.Ascii(text)} is not one of {string.Join(", ", words)}",
        Slips.NearestWord(text, words) is string near ? $"did you mean {near}?" : string.Empty);

    internal static FlowDuctException NoBasis(string heading, string text) => Refuse(
        heading, $"{Echo.Ascii(text)} does not say whether it is absolute or gauge", $"write for example {Echo.Ascii(text)}(a) or {Echo.Ascii(text)}(g)");

    internal static FlowDuctException AbsoluteBesideGauge(string heading, string unit) => Refuse(
        heading, $"{unit} is absolute, and the pressure-basis of this row is gauge", $"write [{unit}(a)] or [{unit}(g)] in the heading");

    internal static FlowDuctException DecimalPoint(string heading, string text) => Refuse(
        heading, $"{Echo.Ascii(text)} has a decimal point, and this sheet was declared to have decimal commas", "write a comma, or leave --decimal out");

    internal static FlowDuctException NotOfDevice(string heading, SheetDevice device) => Refuse(
        heading, $"a {DeviceWord(device)} does not take it", "leave the cell empty");

    internal static FlowDuctException KeyTwice(string key, long first) => Refuse(
        "tag", $"{Echo.Ascii(key)} stands in row {first} already", "tag and case together name a row; number the cases of a tag");

    private static string DeviceWord(SheetDevice device) => device switch
    {
        SheetDevice.Nozzle => "nozzle",
        SheetDevice.Diffuser => "diffuser",
        SheetDevice.Venturi => "venturi",
        _ => "property question (device state)",
    };

    private static FlowDuctException Refuse(string place, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
