using CsCheck;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Laws of mixtures of ideal gases, and the record "Air" against the mixture that its comment prints.</summary>
public class GasMixtureTests
{
    private static readonly string[] Words = [.. Nasa9Records.Words().Select(gas => gas.Formula)];
    private static readonly Gen<string> AnyGas = Gen.Int[0, Words.Length - 1].Select(i => Words[i]);
    private static readonly Gen<(string First, string Second)> AnyPair = Gen.Select(AnyGas, AnyGas).Where(pair => pair.Item1 != pair.Item2);

    // Mole fractions in the comment of the record "Air", NASA/TP-2002-211556 (2002).
    private static readonly IdealGas AirByParts = Of(FractionBasis.Mole, ("N2", 0.78084), ("O2", 0.209476), ("Ar", 0.009365), ("CO2", 0.000319)).Gas;

    public static TheoryData<string> Formulas() => [.. Nasa9Records.Words().Select(gas => gas.Formula)];

    [Theory]
    [MemberData(nameof(Formulas))]
    public void A_mixture_of_one_is_the_pure_gas_to_the_bit(string formula)
    {
        IdealGas pure = GasCatalogue.Find(formula)!, mixed = Of(FractionBasis.Mass, (formula, 1)).Gas;
        Gen.Double[200, 6000].Sample(T => State(pure, 3e5, T).Equals(State(mixed, 3e5, T)), iter: 50);
        Assert.Equal(pure.RangeText, mixed.RangeText);
    }

    [Fact]
    public void Mole_and_mass_input_agree() => Gen.Select(AnyPair, Gen.Double[0.01, 0.99], Gen.Double[200, 6000]).Sample((pair, x, T) =>
    {
        double m1 = x * Nasa9Records.Find(pair.First)!.MolarMass, m2 = (1 - x) * Nasa9Records.Find(pair.Second)!.MolarMass;
        FluidState mole = State(Of(FractionBasis.Mole, (pair.First, x), (pair.Second, 1 - x)).Gas, 2e5, T);
        FluidState mass = State(Of(FractionBasis.Mass, (pair.First, m1 / (m1 + m2)), (pair.Second, 1 - (m1 / (m1 + m2)))).Gas, 2e5, T);
        return Near(mole.h, mass.h, 1e-12) && Near(mole.s, mass.s, 1e-12) && Near(mole.cp, mass.cp, 1e-12) && Near(mole.rho, mass.rho, 1e-12);
    });

    [Fact]
    public void Properties_per_mole_add_by_mole_fraction_and_entropy_gains_by_mixing() =>
        Gen.Select(AnyPair, Gen.Double[0.01, 0.99], Gen.Double[200, 6000]).Sample((pair, x, T) =>
        {
            if (pair.First == "Air" || pair.Second == "Air") return true; // told below
            IdealGas first = GasCatalogue.Find(pair.First)!, second = GasCatalogue.Find(pair.Second)!;
            IdealGas mixed = Of(FractionBasis.Mole, (pair.First, x), (pair.Second, 1 - x)).Gas;

            // Gibbs: each gas at its own partial pressure, which is the total pressure times its mole fraction.
            FluidState a = State(first, 4e5 * x, T), b = State(second, 4e5 * (1 - x), T), m = State(mixed, 4e5, T);
            return Near(mixed.MolarMass, Mix(first.MolarMass, second.MolarMass), 1e-14)
                && Near(m.h * mixed.MolarMass, Mix(a.h * first.MolarMass, b.h * second.MolarMass), 1e-12)
                && Near(m.cp * mixed.MolarMass, Mix(a.cp * first.MolarMass, b.cp * second.MolarMass), 1e-12)
                && Near(m.s * mixed.MolarMass, Mix(a.s * first.MolarMass, b.s * second.MolarMass), 1e-11);

            double Mix(double one, double two) => (x * one) + ((1 - x) * two);
        });

    [Fact]
    public void Air_by_parts_is_the_record_of_air()
    {
        // The record has ten printed digits, of which sums of terms that nearly cancel leave eight. The report prints the molar mass of
        // air to 1e-7 g/mol, those of its parts to 1e-4 g/mol.
        Assert.Equal(28.9651159, AirByParts.MolarMass, 0.0001);
        for (double T = 250; T <= 2000; T += 12.5)
        {
            FluidState parts = State(AirByParts, 1e5, T), record = State(GasCatalogue.Air, 1e5, T);
            Assert.Equal(record.cp, parts.cp, 1e-8 * record.cp);
        }
    }

    [Fact]
    public void Entropy_of_air_by_parts_holds_the_mixing_that_its_record_holds()
    {
        // s0(298.15 K) of the record follows from its parts: ten digits of b2 leave 1e-5 J/(mol.K); without mixing 4.7 lack.
        FluidState parts = State(AirByParts, 1e5, 298.15), record = State(GasCatalogue.Air, 1e5, 298.15);
        Assert.Equal(record.s * GasCatalogue.Air.MolarMass / 1000, parts.s * AirByParts.MolarMass / 1000, 1e-5);
    }

    [Fact]
    public void Nitrogen_beside_air_is_not_told_apart_from_that_in_the_air()
    {
        // Half air, half nitrogen is also a mixture of four gases.
        FluidState beside = State(Of(FractionBasis.Mole, ("Air", 0.5), ("N2", 0.5)).Gas, 1e5, 300);
        FluidState four = State(
            Of(FractionBasis.Mole, ("N2", 0.5 + (0.5 * 0.78084)), ("O2", 0.5 * 0.209476), ("Ar", 0.5 * 0.009365), ("CO2", 0.5 * 0.000319)).Gas, 1e5, 300);
        Assert.Equal(four.s, beside.s, 0.05);
        FluidState apart = State(Of(FractionBasis.Mole, ("Air", 0.5), ("He", 0.5)).Gas, 1e5, 300);
        Assert.True(apart.s > beside.s);
    }

    [Theory]
    [InlineData("N2", "O2", 50, 20000)]
    [InlineData("N2", "H2O", 200, 6000)]
    [InlineData("Ar", "CH4", 200, 6000)]
    [InlineData("Air", "He", 50, 6000)]
    public void The_range_is_the_one_that_all_gases_share(string first, string second, double Tlow, double Thigh)
    {
        IdealGas gas = Of(FractionBasis.Mole, (first, 0.6), (second, 0.4)).Gas;
        Assert.Equal(Outcome.Ok, gas.FromPT(1e5, Tlow, out FluidState coldest));
        Assert.Equal(Tlow < 200 ? Notices.Extrapolated : Notices.None, coldest.Notices);
        Assert.Equal(Outcome.Ok, gas.FromPT(1e5, Thigh, out _));
        Assert.Equal(Outcome.TemperatureTooLow, gas.FromPT(1e5, Math.BitDecrement(Tlow), out _));
        Assert.Equal(Outcome.TemperatureTooHigh, gas.FromPT(1e5, Math.BitIncrement(Thigh), out _));
    }

    [Fact]
    public void Gases_of_no_fraction_do_not_narrow_the_range() =>
        Assert.Equal(GasCatalogue.Find("N2")!.RangeText, Of(FractionBasis.Mole, ("N2", 1), ("H2O", 0)).Gas.RangeText);

    [Fact]
    public void Different_breaks_are_all_kept()
    {
        // No two records of the table break at different temperatures; a record cut in two must mix like the whole one.
        Species whole = Nasa9Records.Find("CO2")!;
        Nasa9Interval cold = whole.Intervals[0];
        Species cut = whole with { Intervals = [cold with { Thigh = 700 }, cold with { Tlow = 700 }, .. whole.Intervals.Skip(1)] };
        Species nitrogen = Nasa9Records.Find("N2")!;
        IdealGas expected = GasMixture.Of([new(nitrogen, 0.5), new(whole, 0.5)], FractionBasis.Mole).Gas;
        IdealGas actual = GasMixture.Of([new(nitrogen, 0.5), new(cut, 0.5)], FractionBasis.Mole).Gas;
        Assert.Equal(4, MixedRecord.Of("cut", [new(nitrogen, 0.5), new(cut, 0.5)]).Intervals.Length);
        Gen.Double[200, 6000].Sample(T => Near(State(expected, 1e5, T).h, State(actual, 1e5, T).h, 1e-13), iter: 200);
    }

    [Fact]
    public void Inverses_of_a_mixture_close() => Gen.Select(AnyPair, Gen.Double[0.01, 0.99], Gen.Double[200, 6000]).Sample((pair, x, T) =>
    {
        IdealGas gas = Of(FractionBasis.Mole, (pair.First, x), (pair.Second, 1 - x)).Gas;
        FluidState at = State(gas, 7e5, T);
        return gas.FromPH(7e5, at.h, default, out FluidState ph) == Outcome.Ok && Near(ph.T, T, 1e-11)
            && gas.FromPS(7e5, at.s, default, out FluidState ps) == Outcome.Ok && Near(ps.T, T, 1e-11)
            && gas.FromHS(at.h, at.s, default, out FluidState hs) == Outcome.Ok && Near(hs.p, 7e5, 1e-10);
    });

    [Fact]
    public void A_sum_inside_the_printed_digits_is_normalised_and_said()
    {
        GasMixture mixture = GasMixture.Of(
            [new(Nasa9Records.Nitrogen(), 0.78, 0.005), new(Nasa9Records.Oxygen(), 0.21, 0.005), new(Nasa9Records.Argon(), 0.009, 0.0005)], FractionBasis.Mole);
        Assert.True(mixture.Normalised);
        Assert.Equal(0.999, mixture.Sum, 1e-15);
        Assert.Equal(1, mixture.Components.Sum(gas => gas.x), 1e-15);
        Assert.Equal(0.78 / 0.999, mixture.Components[0].x, 1e-15);
        Assert.Equal("N2=0.78,O2=0.21,Ar=0.009", mixture.Name);
        Assert.Equal(
            "NASA/TP-2002-211556 (2002), records N2, O2, Ar, ideal-gas mixture by mole fraction; the fractions add up to 0.999 and are normalised to 1",
            mixture.Gas.Formulation);
        Assert.False(Of(FractionBasis.Mole, ("N2", 0.7), ("O2", 0.1), ("Ar", 0.2)).Normalised); // 1 but for binary rounding
    }

    [Theory]
    [InlineData(0.5, 0.4)]
    [InlineData(1.5, -0.5)]
    [InlineData(double.NaN, 0.5)]
    public void Fractions_that_are_none_are_refused(double first, double second) =>
        Assert.Throws<ArgumentException>(() => Of(FractionBasis.Mole, ("N2", first), ("O2", second)));

    [Fact]
    public void A_gas_twice_or_none_at_all_is_refused()
    {
        Assert.Throws<ArgumentException>(() => Of(FractionBasis.Mole, ("N2", 0.5), ("nitrogen", 0.5)));
        Assert.Throws<ArgumentException>(() => Of(FractionBasis.Mole));
    }

    private static GasMixture Of(FractionBasis basis, params (string Word, double Fraction)[] parts) =>
        GasMixture.Of([.. parts.Select(part => new GasFraction(Nasa9Records.Find(part.Word)!, part.Fraction))], basis);

    private static FluidState State(IdealGas gas, double p, double T)
    {
        Assert.Equal(Outcome.Ok, gas.FromPT(p, T, out FluidState state));
        return state;
    }

    private static bool Near(double a, double b, double relative) => Math.Abs(a - b) <= relative * Math.Abs(b);
}
