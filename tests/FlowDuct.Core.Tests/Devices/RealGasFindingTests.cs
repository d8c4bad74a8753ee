using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>The caution that a gas is no ideal one speaks on one side of 1 % and is silent on the other.</summary>
public class RealGasFindingTests
{
    [Theory]
    [InlineData("CO2", "p=1.9 bar, T=300 K", false)] // B = -121.3 cm3/mol by Span, Wagner (1996): 1 % in Z at 2.06 bar
    [InlineData("CO2", "p=2.2 bar, T=300 K", true)]
    [InlineData("air", "p=32 bar, T=300 K", true)] // the speed of sound, not Z, passes 1 %
    [InlineData("air", "p=8 bar, T=300 K", false)]
    [InlineData("N2=0.72,CO2=0.13,H2O=0.15", "p=5 bar, T=800 K", false)]
    [InlineData("N2=0.2,CO2=0.8", "p=10 bar, T=320 K", true)]
    [InlineData("water-vapour", "p=1 bar, T=300 K", true)]
    [InlineData("SF6", "p=20 bar, T=300 K", false)] // no critical constants here: nothing to say
    [InlineData("water", "p=200 bar, T=700 K", false)] // no ideal gas
    public void A_state_is_told_apart_at_one_percent(string fluid, string at, bool speaks) =>
        Assert.Equal(speaks, OfState(fluid, at) is not null);

    [Fact]
    public void It_is_a_caution_with_its_number_limit_and_source()
    {
        Finding finding = OfState("CO2", "p=5 bar, T=300 K")!;
        Assert.Equal(Severity.Caution, finding.Severity);
        Assert.Equal(0.01, finding.Limit);
        Assert.Equal("estimate by C. Tsonopoulos, AIChE J. 20 (1974) 263", finding.Standing);

        // Z = 1 - 121.992e-6 * 5e5 / (8.314463 * 300), with the coefficient of the check table.
        Assert.Equal((1 / (1 - 0.0244541)) - 1, finding.Value!.Value, 1e-5);
        Assert.Equal(
            "carbon-dioxide is taken as an ideal gas; at 5 bar, 26.85 degC its compressibility factor is about 0.976: density +2.5 %, speed of sound -1.4 %",
            finding.Message(DisplayText.Metric));
    }

    [Fact]
    public void Beyond_its_range_the_estimate_says_that_it_is_none()
    {
        Assert.EndsWith("the pressure is too high for this estimate to be trusted", Words("air", "p=200 bar, T=300 K"), StringComparison.Ordinal);
        Assert.EndsWith("it is near condensation or already liquid, and these figures are none of its own", Words("propane", "p=40 bar, T=280 K"), StringComparison.Ordinal);
    }

    [Fact]
    public void A_nozzle_is_told_of_its_choked_flux()
    {
        // Span et al. (2000): 0.70 % more flux at 2 MPa and 300 K; 3 MPa is above 1 %, in the flux.
        Finding finding = OfNozzle("nitrogen", "p0=30 bar, T0=300 K")!;
        Assert.Contains("choked flux +1.", finding.Message(DisplayText.Metric), StringComparison.Ordinal);
        Assert.Null(OfNozzle("nitrogen", "p0=5 bar, T0=300 K"));
    }

    private static string Words(string fluid, string at) => OfState(fluid, at)!.Message(DisplayText.Metric);

    private static Finding? OfState(string fluid, string at) =>
        StateAnswer.Solve(FluidCatalogue.Find(fluid)!, Cases.At(at)).Findings.SingleOrDefault(finding => finding.Code == "real-gas");

    private static Finding? OfNozzle(string fluid, string inlet) => DeviceSolver
        .Solve(Cases.Nozzle(FluidCatalogue.Find(fluid)!, inlet, "p/p0=0.6")).Findings.SingleOrDefault(finding => finding.Code == "real-gas");
}
