using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Findings;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Discharge coefficients of critical-flow throats by ISO 9300.</summary>
public class CriticalFlowCdTests
{
    private static readonly Dictionary<string, string> s_names = new()
    {
        ["cfn_tor_normal"] = "iso9300-toroidal",
        ["cfn_tor_accurate"] = "iso9300-toroidal-accurate",
        ["cfn_cyl"] = "iso9300-cylindrical",
    };

    [Fact]
    public void The_equations_give_the_values_of_the_check_table()
    {
        int rows = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/critical_nozzle_cd_check.csv"))
        {
            CriticalFlowCd correlation = (CriticalFlowCd)DischargeCorrelation.Find(s_names[row["id"]])!;
            double Re = double.Parse(row["Re"], CultureInfo.InvariantCulture);
            Assert.True(Printed.Parse(row["Cd"]).Agrees(correlation.At(Re)), $"{row["id"]} at {Re}");
            Assert.False(Printed.Parse(row["Cd"]).Agrees(correlation.At(Re * 1.01)));
            rows++;
        }

        Assert.True(rows >= 25, $"only {rows} rows");
    }

    [Theory]
    [InlineData("iso9300-toroidal", 2.1e4, 3.2e7)]
    [InlineData("iso9300-toroidal-accurate", 2.1e4, 1.4e6)]
    [InlineData("iso9300-cylindrical", 3.5e5, 1.1e7)]
    public void Each_holds_inside_its_range_only(string name, double least, double greatest)
    {
        CriticalFlowCd correlation = (CriticalFlowCd)DischargeCorrelation.Find(name)!;
        Assert.Null(At(least) ?? At(greatest));
        Assert.Equal(least, At(least * 0.999)!.Value.Limit);
        Assert.Equal(greatest, At(greatest * 1.001)!.Value.Limit);

        Crossing? At(double Re) => correlation.CrossedBy(new ThroatFlow(Re, 0, 0, 0.1, true));
    }

    // The coefficient belongs to the Reynolds number of the flow that it gives.
    [Fact]
    public void A_named_coefficient_closes_on_its_own_flow()
    {
        CriticalFlowCd row = (CriticalFlowCd)DischargeCorrelation.Find("iso9300-toroidal")!;
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(WaterFluid.Instance, "p0=9 bar, T0=230 degC", "d=18 mm", "", "p=1 bar") with { DischargeCorrelation = row });
        Assert.Equal(row.At(a.Performance.ReynoldsThroat!.Value), a.Performance.DischargeCoefficient!.Value, 1e-10);
        Assert.DoesNotContain(a.Findings, f => f.Code == "extrapolated");
        DeviceAnswer small = DeviceSolver.Solve(Cases.Rated(WaterFluid.Instance, "p0=1.2 bar, T0=230 degC", "d=0.5 mm", "", "p=0.1 bar") with { DischargeCorrelation = row });
        Assert.Contains(small.Findings, f => f is { Code: "extrapolated", Severity: Severity.Caution });
    }
}
