using FlowDuct.Fluids.Gases.Coefficients;
using FlowDuct.Quantities;

namespace FlowDuct.Fluids.Gases;

/// <summary>A mixture of ideal gases that keeps its composition.</summary>
public sealed class GasMixture
{
    // As many as a composition is ever printed with, and few enough to hide binary rounding.
    private const int Digits = 12;

    private const string HumidAirName = "humid-air";

    private const string HumidAirFormulation =
        "NASA/TP-2002-211556 (2002), records Air, H2O, ideal-gas mixture; saturation of pure water by IAPWS R7-97(2012), below 0.01 degC over ice by R14-08(2011), no enhancement factor";

    private readonly GasComponent[] components;

    private GasMixture(IReadOnlyList<GasFraction> given, FractionBasis basis, double sum, bool normalised, string? name = null)
    {
        (Basis, Sum, Normalised) = (basis, sum, normalised);
        components = [.. Moles(given, basis)];
        Name = name ?? NameOf(given, basis);
        Gas = new IdealGas(this);
    }

    /// <summary>The composition as it was given, by formulas; "by mass" follows where mass fractions were given.</summary>
    public string Name { get; }

    /// <summary>What the given fractions counted.</summary>
    public FractionBasis Basis { get; }

    /// <summary>The sum of the given fractions.</summary>
    public double Sum { get; }

    /// <summary>True where the sum was not 1 and the fractions were divided by it.</summary>
    public bool Normalised { get; }

    /// <summary>The mixture as a fluid.</summary>
    public IdealGas Gas { get; }

    /// <summary>The gases with their mole fractions, which add up to 1; gases of no fraction are left out.</summary>
    internal IReadOnlyList<GasComponent> Components => components;

    /// <summary>True of air with water vapour, by the name of humid-air.</summary>
    internal bool IsHumidAir => Name == HumidAirName;

    /// <summary>Dry air, the record of the report.</summary>
    internal static Species DryAir { get; } = Nasa9Records.Air();

    /// <summary>
    /// Water vapour, its heat capacity held below the fit as far down as that of air: it falls by 0.15 % from 200 K to 100 K (JANAF 1998, from memory).
    /// </summary>
    internal static Species Water { get; } = Nasa9Records.Find("H2O")! with { ContinuedDownTo = DryAir.ContinuedDownTo };

    /// <summary>The formulation, the basis of the fractions and whether they were normalised, in words.</summary>
    internal string Formulation => IsHumidAir ? HumidAirFormulation :
        $"NASA/TP-2002-211556 (2002), records {string.Join(", ", components.Select(gas => gas.Species.Formula))}, ideal-gas mixture by {BasisWord(Basis)} fraction{NormalisedWords}";

    private string NormalisedWords => Normalised ? $"; the fractions add up to {NumberFormatter.Shortest(Sum, Digits)} and are normalised to 1" : string.Empty;

    /// <summary>A mixture of given fractions.</summary>
    /// <exception cref="ArgumentException">No fraction, a negative one, a gas twice, or a sum that the printed digits do not let be 1.</exception>
    internal static GasMixture Of(IReadOnlyList<GasFraction> given, FractionBasis basis)
    {
        FractionSum sum = new(given);
        if (given.Any(gas => !(gas.Fraction >= 0)) || given.DistinctBy(gas => gas.Species.Formula).Count() != given.Count || !sum.Holds)
            throw new ArgumentException("Fractions are not negative, each gas stands once, and together they are 1.", nameof(given));
        return new GasMixture(given, basis, sum.Value, sum.IsOff);
    }

    /// <summary>Air with a mole fraction of water vapour, 0 to 1.</summary>
    internal static GasMixture HumidAir(double x) =>
        new([new GasFraction(DryAir, 1 - x), new GasFraction(Water, x)], FractionBasis.Mole, 1, false, HumidAirName);

    /// <summary>The word of a basis: mole or mass.</summary>
    internal static string BasisWord(FractionBasis basis) => basis == FractionBasis.Mass ? "mass" : "mole";

    private static IEnumerable<GasComponent> Moles(IReadOnlyList<GasFraction> given, FractionBasis basis)
    {
        double total = given.Sum(Amount);
        return given.Where(gas => gas.Fraction > 0).Select(gas => new GasComponent(gas.Species, Amount(gas) / total));

        double Amount(GasFraction gas) => basis == FractionBasis.Mass ? gas.Fraction / gas.Species.MolarMass : gas.Fraction;
    }

    private static string NameOf(IReadOnlyList<GasFraction> given, FractionBasis basis)
    {
        IEnumerable<string> parts = given.Select(gas => $"{gas.Species.Formula}={NumberFormatter.Shortest(gas.Fraction, Digits)}");
        return string.Join(',', parts) + (basis == FractionBasis.Mass ? " by mass" : string.Empty);
    }
}
