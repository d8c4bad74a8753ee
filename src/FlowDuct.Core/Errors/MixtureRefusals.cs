using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Errors;

/// <summary>The refusals of a composition; each uses what was typed to guess what was meant.</summary>
/// <param name="place">The option as typed.</param>
internal sealed class MixtureRefusals(string place)
{
    private const string Example = "N2=0.72,CO2=0.13,H2O=0.15";
    private const int Digits = 6;

    internal FlowDuctException NotAnItem(string piece)
    {
        if (piece.Length == 0)
            return Refuse("a gas is missing: there is a comma too many", $"write for example {Example}");
        string shown = Echo.Ascii(piece);
        return piece[0] == '='
            ? Refuse($"{shown} has no gas before its equals sign", $"write for example {Example}")
            : Refuse($"{shown} has no equals sign", $"write gas=fraction, for example {Example}");
    }

    internal FlowDuctException DecimalComma(string piece, string next)
    {
        (string first, string second) = (Echo.Ascii(piece), Echo.Ascii(next));
        return Refuse($"{first},{second} has a decimal comma", $"write {first}.{second}");
    }

    internal FlowDuctException UnknownGas(string word, IEnumerable<string> words)
    {
        string? near = word is "steam" or "water" ? "water-vapour" : Slips.NearestWord(word, words);
        return Refuse(
            $"{Echo.Ascii(word)} is not a gas of this version (case matters)",
            near is null ? "flowduct fluids lists the gases with their formulas" : $"did you mean {near}?");
    }

    internal FlowDuctException NotANumber(string word, string problem) =>
        Refuse($"{Echo.Ascii(word)}: {problem}", "a fraction is a number from 0 to 1, or a percentage such as 13%");

    internal FlowDuctException Negative(string piece) => Refuse($"{Echo.Ascii(piece)} is negative", "a fraction is a number from 0 to 1, or a percentage such as 13%");

    internal FlowDuctException AboveOne(string piece, double fraction) => Refuse(
        $"{Echo.Ascii(piece)} is above 1",
        fraction <= 100 ? $"if it is a percentage, write {Echo.Ascii(piece)}%" : "a fraction is a number from 0 to 1, or a percentage such as 13%");

    internal FlowDuctException Twice(Species gas) => Refuse($"{gas.Formula} ({gas.Name}) is given twice", "add its fractions up and write it once");

    internal FlowDuctException SumOff(FractionSum sum)
    {
        string value = NumberFormatter.Shortest(sum.Value, Digits), slack = NumberFormatter.Shortest(sum.Slack, 2);
        return Refuse(
            $"the fractions add up to {value}, and their printed digits let that be 1 within {slack} only",
            sum.Value < 1 ? "name the gas that is missing, or correct a fraction" : "correct a fraction; percentages carry a % sign");
    }

    private FlowDuctException Refuse(string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
