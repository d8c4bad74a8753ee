using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>The dew point of a gas: speaks below it and is silent above.</summary>
public class CondensationFindingTests
{
    [Theory]
    [InlineData("N2=0.9,H2O=0.1", "p=0.353 bar, T=300 K", false)] // saturation at 300 K: 3.53658941 kPa, IAPWS R7-97(2012), Table 35
    [InlineData("N2=0.9,H2O=0.1", "p=0.354 bar, T=300 K", true)]
    [InlineData("N2=0.999,H2O=0.001", "p=0.0894 bar, T=230 K", false)] // sublimation at 230 K: 8.94735 Pa, IAPWS R14-08(2011), Sec. 3
    [InlineData("N2=0.999,H2O=0.001", "p=0.0896 bar, T=230 K", true)]
    [InlineData("H2O", "p=1 bar, T=300 K", true)]
    [InlineData("H2O", "p=300 bar, T=700 K", false)] // above the critical temperature nothing condenses
    [InlineData("air", "p=1 bar, T=250 K", false)]
    public void A_state_is_told_apart_at_the_dew_point(string fluid, string at, bool speaks) => Assert.Equal(
        speaks, StateAnswer.Solve(FluidCatalogue.Find(fluid)!, Cases.At(at)).Findings.Any(finding => finding.Code == "condensation"));

    [Fact]
    public void It_names_both_pressures_at_the_station_where_it_happens()
    {
        DeviceCase c = Cases.Nozzle(FluidCatalogue.Find("N2=0.9,H2O=0.1")!, "p0=5 bar, T0=400 K", "p=1 bar");
        Finding finding = DeviceSolver.Solve(c).Findings.Single(found => found.Code == "condensation");
        Assert.Equal(Severity.Caution, finding.Severity);
        Assert.True(finding.Value > finding.Limit);
        Assert.Contains("it would condense, and the answer keeps it a gas", finding.Message(DisplayText.Metric), StringComparison.Ordinal);
    }
}
