using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Diffusers;
using Xunit;
using Row = System.Collections.Generic.IReadOnlyDictionary<string, string>;

namespace FlowDuct.Core.Tests.Devices.Diffusers;

/// <summary>Published losses, recoveries and limits of diffusers.</summary>
public class DiffuserCorrelationTests
{
    private const double Degree = Math.PI / 180;

    private static double Number(Row row, string column) => double.Parse(row[column], CultureInfo.InvariantCulture);

    // Gibson; Idelchik, Handbook of Hydraulic Resistance; Crane Technical Paper 410: formulas from memory, evaluated apart.
    [Theory]
    [InlineData("K_gibson_on_V1", 20)]
    [InlineData("K_idelchik_expansion_on_V1", 40)]
    [InlineData("K_idelchik_with_friction_f0.02", 40)]
    [InlineData("K_crane_on_V1", 40)]
    public void The_losses_of_cones_follow_the_check_table(string column, int least)
    {
        int rows = 0;
        foreach (Row row in ReferenceTable.Read("flow/diffuser_check.csv").Where(row => row[column].Length > 0))
        {
            double phi = Number(row, "total_angle_deg") * Degree, AR = Number(row, "AR");
            Printed printed = Printed.Parse(row[column]);
            Assert.True(printed.Agrees(Loss(column, phi, AR)), $"{column} at {phi / Degree}, {AR}: {Loss(column, phi, AR)}");
            Assert.False(printed.Agrees(Loss(column, phi * 1.05, AR * 1.05) + 2e-5));
            rows++;
        }

        Assert.True(rows >= least, $"only {rows} rows");
    }

    private static double Loss(string column, double phi, double AR) => column switch
    {
        "K_gibson_on_V1" => ConeLosses.Gibson(phi, AR),
        "K_idelchik_expansion_on_V1" => ConeLosses.Idelchik(phi, AR, 0),
        "K_idelchik_with_friction_f0.02" => ConeLosses.Idelchik(phi, AR, 0.02),
        _ => ConeLosses.Crane(phi, AR),
    };

    // Gibson's own chart of K on (V1 - V2)^2/2, points from memory, to 0.03, where his formula claims to hold.
    [Fact]
    public void Gibsons_formula_runs_through_his_chart()
    {
        Row[] rows = [.. ReferenceTable.Read("flow/diffuser_points.csv").Where(row => row["id"].StartsWith("gib", StringComparison.Ordinal) && Number(row, "x") is >= 7.5 and <= 35)];
        Assert.Equal(5, rows.Length);
        foreach (Row row in rows) Assert.Equal(Number(row, "y"), ConeLosses.Gibson(Number(row, "x") * Degree, 2) / ConeLosses.BordaCarnot(2), 0.03);
    }

    // Runstadler, Dolan and Dean, Diffuser Data Book, Creare TN-186 (1975), six points each, from memory.
    [Theory]
    [InlineData("conical")]
    [InlineData("planar")]
    public void The_best_recovery_meets_the_points_of_its_table(string shape)
    {
        Row[] rows = [.. ReferenceTable.Read("flow/diffuser_points.csv").Where(row => row["y_name"] == "Cp_max" && row["geometry"].StartsWith(shape, StringComparison.Ordinal))];
        Assert.Equal(6, rows.Length);
        foreach (Row row in rows)
        {
            double B = double.Parse(row["conditions"][(row["conditions"].IndexOf('=', StringComparison.Ordinal) + 1)..], CultureInfo.InvariantCulture);
            DiffuserShape of = shape == "conical" ? DiffuserShape.Conical : DiffuserShape.Planar;
            Assert.Equal(Number(row, "y"), BestRecovery.At(of, B)!.Value, 1e-12);
        }

        Assert.Null(BestRecovery.At(DiffuserShape.Conical, 0.019) ?? BestRecovery.At(DiffuserShape.Planar, 0.121) ?? BestRecovery.At(DiffuserShape.Other, 0.05));
    }

    // Fox and Kline, J. Basic Eng. 84 (1962) 303, line a-a: nine points from memory, to 15 %.
    [Fact]
    public void The_stall_line_lies_in_the_band_of_the_chart()
    {
        Row[] rows = [.. ReferenceTable.Read("flow/diffuser_points.csv").Where(row => row["id"].StartsWith("aa", StringComparison.Ordinal))];
        Assert.Equal(9, rows.Length);
        foreach (Row row in rows) Assert.Equal(1, StallLimit.Planar(Number(row, "x")) / Degree / Number(row, "y"), 0.06);
    }

    [Fact]
    public void The_stall_limit_ends_with_its_chart()
    {
        Assert.NotNull(StallLimit.Of(Planar(1.51)));
        Assert.Null(StallLimit.Of(Planar(1.49)));
        Assert.Null(StallLimit.Of(Planar(25.1)));
        Assert.Equal(12, StallLimit.Of(new DiffuserGeometry(DiffuserShape.Conical, 2, 0.1, 0.1))!.Value.Angle / Degree, 1e-12);

        static DiffuserGeometry Planar(double length) => new(DiffuserShape.Planar, 1.2, 0.1, 2 * Math.Atan(0.1 / length));
    }

    // G. Sovran, E. D. Klomp, Fluid Mechanics of Internal Flow (1967) 270, conical chart at inlet blockage 0.02: best at N/R1 4.66 is AR 2.13 (read),
    // at AR 1.8 N/R1 7.85 (from memory). The optimum is flat: a tenth in either moves the recovery by less than 0.005.
    [Fact]
    public void The_best_cone_lies_near_that_of_the_chart()
    {
        BestGeometry atLength = BestGeometry.Of(new DiffuserGeometry(DiffuserShape.Conical, 2, 1, 2 * Math.Atan((Math.Sqrt(2) - 1) / 4.66)), 0.010);
        Assert.Equal(1, atLength.AreaRatio!.Value / 2.13, 0.1);
        BestGeometry atRatio = BestGeometry.Of(new DiffuserGeometry(DiffuserShape.Conical, 1.8, 1, null), 0.010);
        Assert.Equal(1, atRatio.RelativeLength / 7.85, 0.11);
    }

    // The same chart point, Cp 0.60: the estimate says how much worse it may be, and by that the point lies inside.
    [Fact]
    public void The_band_of_an_estimate_holds_the_chart_point()
    {
        DiffuserLoss row = DiffuserLoss.Find("idelchik")!;
        var flow = new DiffuserFlow(new DiffuserGeometry(DiffuserShape.Conical, 2.13, 1, 11.26 * Degree), 0.012, 0.02, 0.1);
        double K = row.At(flow), recovery = DiffuserLoss.Ideal(2.13) - K;
        Assert.InRange(0.60, recovery - row.Worse(K), recovery + row.Better(K));
    }

    // MIL-E-5008B, computed apart.
    [Fact]
    public void The_standard_ram_recovery_follows_its_table()
    {
        Row[] rows = [.. ReferenceTable.Read("flow/nozzle_practice_check.csv").Where(row => row["id"] == "mil-e-5008b")];
        Assert.Equal(11, rows.Length);
        foreach (Row row in rows)
        {
            Printed printed = Printed.Parse(row["value"]);
            Assert.True(printed.Agrees(RamRecovery.At(Number(row, "x"))));
            if (Number(row, "x") > 1) Assert.False(printed.Agrees(RamRecovery.At(Number(row, "x") * 1.001)));
        }
    }

    // Smooth pipe at Re = 1e5: 0.0180; relative roughness 0.001 at Re = 1e6: 0.0199 (L. F. Moody, Trans. ASME 66 (1944) 671, from memory).
    [Theory]
    [InlineData(1e5, 0, 0.0180)]
    [InlineData(1e6, 1e-3, 0.0199)]
    [InlineData(1000, 0, 0.064)]
    public void The_friction_factor_is_that_of_the_chart(double Re, double roughness, double f) => Assert.Equal(f, FrictionFactor.Darcy(Re, roughness), 5.1e-5);

    [Fact]
    public void An_inlet_blockage_holds_the_estimate_to_what_was_measured()
    {
        DiffuserLoss row = DiffuserLoss.Find("idelchik")!;
        var geometry = new DiffuserGeometry(DiffuserShape.Conical, 3, 1, 5 * Degree);
        double free = row.At(new DiffuserFlow(geometry, 0.01, null, 0.1)), blocked = row.At(new DiffuserFlow(geometry, 0.01, 0.12, 0.1));
        Assert.True(DiffuserLoss.Ideal(3) - free > 0.65);
        Assert.Equal(0.65, DiffuserLoss.Ideal(3) - blocked, 1e-12);
        Assert.Equal("inlet blockage", row.CrossedBy(new DiffuserFlow(geometry, 0.01, 0.13, 0.1))!.Value.Argument);
        Assert.Equal("M", row.CrossedBy(new DiffuserFlow(geometry, 0.01, 0.1, 0.71))!.Value.Argument);
        Crossing angle = row.CrossedBy(new DiffuserFlow(geometry with { IncludedAngle = 41 * Degree }, 0.01, 0.1, 0.1))!.Value;
        Assert.Equal(40 * Degree, angle.Limit);
    }
}
