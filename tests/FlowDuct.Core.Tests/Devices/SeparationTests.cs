using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Rating;
using FlowDuct.Findings;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Separation in overexpanded nozzles: published criteria, formulas from memory.</summary>
public class SeparationTests
{
    // Schmucker, NASA TM-77396 (1984); Kalt and Badal, J. Spacecraft Rockets 2 (1965) 447.
    [Theory]
    [InlineData("schmucker", 5)]
    [InlineData("kalt-badal", 5)]
    public void The_criteria_follow_the_check_table(string id, int expected)
    {
        Func<double, double?> criterion = id == "schmucker" ? SeparationCriteria.Schmucker : SeparationCriteria.KaltBadal;
        int rows = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/nozzle_practice_check.csv").Where(row => row["id"] == id))
        {
            double x = double.Parse(row["x"], CultureInfo.InvariantCulture);
            Printed value = Printed.Parse(row["value"]);
            Assert.True(value.Agrees(criterion(x)!.Value));
            Assert.False(value.Agrees((criterion(x * 0.999) ?? criterion(x * 1.001))!.Value));
            rows++;
        }

        Assert.Equal(expected, rows);
    }

    // pi/3 is 1.0471975512.
    [Theory]
    [InlineData(3, 0.3490658504)]
    [InlineData(4, 0.2617993878)]
    public void Stark_divides_a_third_of_pi_by_the_Mach_number(double M, double ratio) => Assert.Equal(ratio, SeparationCriteria.Stark(M)!.Value, 5e-11);

    // At M = 3, p0/pa = 50 the table above gives 0.37448 and 0.30487, Stark 0.34907, Summerfield 0.35 to 0.40.
    [Fact]
    public void The_band_runs_over_the_criteria_that_hold()
    {
        Assert.Equal(0.30487003, SeparationCriteria.Band(3, 50).Least, 5e-9);
        Assert.Equal(0.40, SeparationCriteria.Band(3, 50).Greatest);
        Assert.Equal(0.52217754, SeparationCriteria.Band(2, 50).Greatest, 5e-9);
        Assert.Equal(new Interval(0.35, 0.40), SeparationCriteria.Band(1.2, 5));
    }

    [Theory]
    [InlineData(1.74, 5.01, 0)]
    [InlineData(2.39, 4.51, 1)]
    [InlineData(9.99, 200.1, 2)]
    public void Outside_its_range_a_criterion_says_nothing(double below, double above, int which)
    {
        Func<double, double?> criterion = ((Func<double, double?>[])[SeparationCriteria.Schmucker, SeparationCriteria.Stark, SeparationCriteria.KaltBadal])[which];
        Assert.Null(criterion(below) ?? criterion(above));
        Assert.NotNull(criterion(below + 0.02));
        Assert.NotNull(criterion(above - 0.2));
    }

    // At the place found the wall pressure is the greatest of the criteria at the Mach number there.
    [Fact]
    public void The_place_is_where_the_first_criterion_is_met()
    {
        DeviceAnswer a = Overexpanded("p=1 bar");
        Separation found = Separation.Of(a)!.Value;
        double area = found.AreaRatio!.Value;
        Assert.InRange(area, 1, a.Performance.ThroatAreaRatio!.Value);
        DeviceAnswer matched = DeviceSolver.Solve(Cases.Rated(
            GasCatalogue.Air, "p0=10 bar, T0=400 K", "A=100 mm2", "A=" + (100 * area).ToString("R", CultureInfo.InvariantCulture) + " mm2", "p=0.1 bar", (CaseOption.Efficiency, "0.95")));
        double M = matched.Exit.Mach!.Value, wall = matched.Exit.State.p / 1e5;

        // The loss of the shorter divergence is a little other, which moves its pressure in the third digit.
        Assert.Equal(SeparationCriteria.Band(M, 10).Greatest, wall, 5e-3);
        Finding finding = Assert.Single(a.Findings, f => f.Code == "overexpanded-separation");
        Assert.Equal(Severity.Caution, finding.Severity);
    }

    [Fact]
    public void Little_overexpansion_is_a_note()
    {
        Finding finding = Assert.Single(Overexpanded("p=0.16 bar").Findings, f => f.Code == "overexpanded-separation");
        Assert.Equal(Severity.Note, finding.Severity);
    }

    private static DeviceAnswer Overexpanded(string back) => DeviceSolver.Solve(Cases.Rated(
        GasCatalogue.Air, "p0=10 bar, T0=400 K", "A=100 mm2", "A=800 mm2", back, (CaseOption.Efficiency, "0.95")));
}
