using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Compositions as typed: what is read, and what is refused with which way out.</summary>
public class GasMixtureParserTests
{
    [Theory]
    [InlineData("N2=0.72,CO2=0.13,H2O=0.15", "N2=0.72,CO2=0.13,H2O=0.15", false)]
    [InlineData(" nitrogen = 79% , oxygen = 21 % ", "N2=0.79,O2=0.21", false)]
    [InlineData("N2=78.08%,O2=20.95%,Ar=0.93%,CO2=0.03%", "N2=0.7808,O2=0.2095,Ar=0.0093,CO2=0.0003", true)]
    [InlineData("N2=1", "N2=1", false)]
    [InlineData("N2=0.333,O2=0.333,Ar=0.333", "N2=0.333,O2=0.333,Ar=0.333", true)]
    [InlineData("Air=9.8e-1,H2O=2e-2", "Air=0.98,H2O=0.02", false)]
    public void A_composition_is_read(string text, string name, bool normalised)
    {
        GasMixture mixture = GasMixtureParser.Parse("--fluid", text, FractionBasis.Mole);
        Assert.Equal(name, mixture.Name);
        Assert.Equal(normalised, mixture.Normalised);
        Assert.Equal(name, FluidCatalogue.Find(text)!.Name);
    }

    [Fact]
    public void Mass_fractions_are_turned_into_mole_fractions()
    {
        GasMixture mixture = GasMixtureParser.Parse("--fluid", "N2=0.5,He=0.5", FractionBasis.Mass);
        Assert.Equal("N2=0.5,He=0.5 by mass", mixture.Name);
        Assert.Equal(4.002602 / (28.0134 + 4.002602), mixture.Components[0].x, 1e-15);
        Assert.Equal(FractionBasis.Mass, mixture.Basis);
    }

    [Theory]
    [InlineData("N2=0.72,CO2=0.13", "the fractions add up to 0.85, and their printed digits let that be 1 within 0.01 only", "name the gas that is missing, or correct a fraction")]
    [InlineData("N2=0.334,O2=0.334,Ar=0.334", "the fractions add up to 1.002, and their printed digits let that be 1 within 0.0015 only", "correct a fraction; percentages carry a % sign")]
    [InlineData("N2=0,72,O2=0,28", "N2=0,72 has a decimal comma", "write N2=0.72")]
    [InlineData("n2=0.79,O2=0.21", "n2 is not a gas of this version (case matters)", "did you mean N2?")]
    [InlineData("nitrogn=1", "nitrogn is not a gas of this version (case matters)", "did you mean nitrogen?")]
    [InlineData("steam=0.1,N2=0.9", "steam is not a gas of this version (case matters)", "did you mean water-vapour?")]
    [InlineData("unobtainium=1", "unobtainium is not a gas of this version (case matters)", "flowduct fluids lists the gases with their formulas")]
    [InlineData("CO2=-0.1,N2=1.1", "CO2=-0.1 is negative", "a fraction is a number from 0 to 1, or a percentage such as 13%")]
    [InlineData("N2=72,CO2=13", "N2=72 is above 1", "if it is a percentage, write N2=72%")]
    [InlineData("N2=720", "N2=720 is above 1", "a fraction is a number from 0 to 1, or a percentage such as 13%")]
    [InlineData("N2=0.5,nitrogen=0.5", "N2 (nitrogen) is given twice", "add its fractions up and write it once")]
    [InlineData("N2=half", "N2: half is not a number; write for example 1.5 or 2e5", "a fraction is a number from 0 to 1, or a percentage such as 13%")]
    [InlineData("N2=", "N2: there is no number", "a fraction is a number from 0 to 1, or a percentage such as 13%")]
    [InlineData("N2=NaN", "N2: NaN is not a finite number", "a fraction is a number from 0 to 1, or a percentage such as 13%")]
    [InlineData("N2=1,", "a gas is missing: there is a comma too many", "write for example N2=0.72,CO2=0.13,H2O=0.15")]
    [InlineData("=1", "=1 has no gas before its equals sign", "write for example N2=0.72,CO2=0.13,H2O=0.15")]
    [InlineData("N2,O2", "N2 has no equals sign", "write gas=fraction, for example N2=0.72,CO2=0.13,H2O=0.15")]
    public void A_slip_is_refused_with_a_way_out(string text, string reason, string next)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => FluidCatalogue.Find(text));
        Assert.Equal(new Refusal(RefusalKind.NotUnderstood, "--fluid", reason, next), refused.Refusal);
    }

    [Fact]
    public void A_fraction_of_zero_is_taken() =>
        Assert.Single(GasMixtureParser.Parse("--fluid", "N2=1.00,Ar=0", FractionBasis.Mole).Components);
}
