using FlowDuct.Errors;
using FlowDuct.Fluids.Gases.Coefficients;
using FlowDuct.Quantities;

namespace FlowDuct.Fluids.Gases;

/// <summary>Reads a composition such as "N2=0.72,CO2=0.13,H2O=0.15" or "nitrogen=79%, oxygen=21%".</summary>
internal static class GasMixtureParser
{
    /// <summary>True of a text that means a composition, not a name.</summary>
    internal static bool IsMixture(string text) => text.Contains('=', StringComparison.Ordinal) || text.Contains(',', StringComparison.Ordinal);

    /// <summary>Reads a composition.</summary>
    /// <param name="place">The option as typed, for messages.</param>
    /// <param name="text">The composition.</param>
    /// <param name="basis">What the fractions count.</param>
    /// <exception cref="FlowDuctException">The text is refused; kind NotUnderstood.</exception>
    internal static GasMixture Parse(string place, string text, FractionBasis basis)
    {
        MixtureRefusals refusals = new(place);
        string[] pieces = text.Split(',', StringSplitOptions.TrimEntries);
        List<GasFraction> given = new(pieces.Length);
        for (int i = 0; i < pieces.Length; i++)
        {
            RequireNoDecimalComma(refusals, pieces, i);
            GasFraction gas = ReadItem(refusals, pieces[i]);
            if (given.Exists(earlier => earlier.Species.Formula == gas.Species.Formula))
                throw refusals.Twice(gas.Species);
            given.Add(gas);
        }

        FractionSum sum = new(given);
        return sum.Holds ? GasMixture.Of(given, basis) : throw refusals.SumOff(sum);
    }

    private static void RequireNoDecimalComma(MixtureRefusals refusals, string[] pieces, int i)
    {
        if (i + 1 >= pieces.Length)
            return;
        (string piece, string next) = (pieces[i], pieces[i + 1]);
        bool endsInNumber = piece.Contains('=', StringComparison.Ordinal) && char.IsAsciiDigit(piece[^1]);
        if (endsInNumber && next.Length > 0 && char.IsAsciiDigit(next[0]) && !next.Contains('=', StringComparison.Ordinal))
            throw refusals.DecimalComma(piece, next);
    }

    private static GasFraction ReadItem(MixtureRefusals refusals, string piece)
    {
        int equals = piece.IndexOf('=', StringComparison.Ordinal);
        if (equals <= 0)
            throw refusals.NotAnItem(piece);
        string word = piece[..equals].TrimEnd();
        Species species = Nasa9Records.Find(word) ?? throw refusals.UnknownGas(word, Words());
        PrintedNumber fraction = ReadFraction(refusals, word, piece[(equals + 1)..].TrimStart());
        if (fraction.Value < 0)
            throw refusals.Negative(piece);
        return fraction.Value <= 1 ? new GasFraction(species, fraction.Value, fraction.HalfPlace) : throw refusals.AboveOne(piece, fraction.Value);
    }

    private static PrintedNumber ReadFraction(MixtureRefusals refusals, string word, string text)
    {
        bool percent = text.EndsWith('%');
        string digits = percent ? text[..^1].TrimEnd() : text;
        if (!NumberParser.TryParse(digits, out PrintedNumber number, out string problem))
            throw refusals.NotANumber(word, problem);
        return percent ? new PrintedNumber(number.Value / 100, number.HalfPlace / 100) : number;
    }

    private static IEnumerable<string> Words() => Nasa9Records.Words().SelectMany(gas => new[] { gas.Name, gas.Formula });
}
