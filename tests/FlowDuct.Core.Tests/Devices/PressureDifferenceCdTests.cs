using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Nozzles and Venturi tubes in a pipe by ISO 5167.</summary>
public class PressureDifferenceCdTests
{
    private static double Number(IReadOnlyDictionary<string, string> row, string column) => double.Parse(row[column], CultureInfo.InvariantCulture);

    // ISO 5167-3:2003: formulas evaluated apart; nine values are those of its printed table for the ISA 1932 nozzle at beta 0.80.
    [Fact]
    public void The_equations_give_the_values_of_the_check_table()
    {
        int printed = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/dp_devices_check.csv"))
        {
            DischargeCorrelation correlation = DischargeCorrelation.Find(row["id"])!;
            double beta = Number(row, "beta"), Re = row["Re_D"].Trim().Length == 0 ? 1e6 : Number(row, "Re_D"), C = correlation.At(new ThroatFlow(Re / beta, 0.1, beta, 0.9, false));
            Assert.True(Printed.Parse(row["C"]).Agrees(C), $"{row["id"]} at {beta}, {Re}: {C}");
            Assert.False(Printed.Parse(row["C"]).Agrees(correlation.At(new ThroatFlow(Re / (beta * 1.02), 0.1, beta * 1.02, 0.9, false))), $"{row["id"]} at {beta}, {Re} cannot fail");
            if (row["printed_C"].Length == 0) continue;
            Assert.True(Printed.Parse(row["printed_C"]).Agrees(C));
            printed++;
        }

        Assert.Equal(9, printed);
    }

    // ISO 5167-3:2003 and -4:2003, limits of use, from memory: beta, Re_D at beta 0.5, D in mm at a wide throat, share at beta 0.5.
    // The Venturi nozzle has the bore of its throat, 50 mm, as a limit of its own, which a wide throat in the least pipe just meets.
    [Theory]
    [InlineData("iso5167-isa1932", 0.3, 0.8, 2e4, 1e7, 50, 500, 0.008)]
    [InlineData("iso5167-long-radius", 0.2, 0.8, 1e4, 1e7, 50, 630, 0.02)]
    [InlineData("iso5167-venturi-nozzle", 0.316, 0.775, 1.5e5, 2e6, 65, 500, 0.01294)]
    [InlineData("iso5167-venturi-cast", 0.3, 0.75, 2e5, 2e6, 100, 800, 0.007)]
    [InlineData("iso5167-venturi-machined", 0.4, 0.75, 2e5, 1e6, 50, 250, 0.01)]
    [InlineData("iso5167-venturi-welded", 0.4, 0.7, 2e5, 2e6, 200, 1200, 0.015)]
    public void Each_ends_where_the_standard_does(string name, double leastBeta, double greatestBeta, double leastRe, double greatestRe, double leastD, double greatestD, double share)
    {
        DischargeCorrelation row = DischargeCorrelation.Find(name)!;
        double D = (leastD + greatestD) / 2000, widest = Math.Min(greatestBeta, 0.77);
        Ends(leastBeta, greatestBeta, beta => new ThroatFlow(9e5 / beta, D, beta, 0.9, false));
        Ends(leastRe, greatestRe, Re => new ThroatFlow(Re / 0.5, D, 0.5, 0.9, false));
        Ends(leastD / 1000, greatestD / 1000, pipe => new ThroatFlow(9e5 / widest, pipe, widest, 0.9, false));
        Ends(0.75, 1, t => new ThroatFlow(9e5 / 0.5, D, 0.5, t, false));
        Assert.Equal(share, row.UncertaintyAt(new ThroatFlow(1e6, D, 0.5, 0.9, false)), 5e-6);

        void Ends(double least, double greatest, Func<double, ThroatFlow> at)
        {
            Assert.Null(row.CrossedBy(at(least * (1 + 1e-9))) ?? row.CrossedBy(at(greatest * (1 - 1e-9))));
            Assert.Equal(least, row.CrossedBy(at(least * 0.999))!.Value.Limit, 1e-9);
            Assert.Equal(greatest, row.CrossedBy(at(greatest * 1.001))!.Value.Limit, 1e-9 * greatest);
        }
    }

    // ISO 5167-3:2003, expansibility factor of nozzles: qm = C/sqrt(1 - beta^4) eps (pi/4) d^2 sqrt(2 dp rho1). The general solver knows neither
    // eps nor the factor of approach: it balances mass, energy and entropy between the taps.
    [Theory]
    [InlineData(1)]
    [InlineData(0.97)]
    public void The_solver_gives_the_flow_of_the_standard_for_any_coefficient(double C)
    {
        int rows = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/expansibility_check.csv"))
        {
            double beta = Number(row, "beta"), t = Number(row, "p2_p1");
            if (beta == 0 || t == 1) continue;
            const double D = 0.1, p1 = 5e5;
            var gas = new PerfectGas(Number(row, "kappa"), 287);
            DeviceCase c = Metered(gas, p1, 320, D, beta * D, t * p1);
            c.Options.Set((int)CaseOption.DischargeCoefficient, C);
            DeviceAnswer a = DeviceSolver.Solve(c);
            double rho1 = p1 / (287 * 320), d = beta * D, factor = C / Math.Sqrt(1 - Math.Pow(beta, 4)) * Math.PI / 4 * d * d * Math.Sqrt(2 * p1 * (1 - t) * rho1);
            Printed eps = Printed.Parse(row["epsilon"]);
            double found = a.Performance.MassFlow!.Value / factor;
            if (a.Performance.Choked == true) continue;
            Assert.True(eps.Agrees(found), $"kappa {row["kappa"]}, beta {beta}, p2/p1 {t}: {found}, printed {eps.Value}");
            Assert.Equal(C, a.Performance.DischargeCoefficient!.Value, 1e-9);
            rows++;
        }

        Assert.True(rows >= 80, $"only {rows} rows");
    }

    // Cold water is all but incompressible: eps = 1 to a part in 1e4 of the compression by 25 kPa.
    [Fact]
    public void Water_flows_as_the_incompressible_equation_says()
    {
        DeviceAnswer a = Solve(WaterFluid.Instance, "p=6 bar, T=40 degC, d=100 mm", "iso5167-isa1932");
        double C = a.Performance.DischargeCoefficient!.Value, rho = a.Inlet.State.rho, d = 0.06;
        double expected = C / Math.Sqrt(1 - Math.Pow(0.6, 4)) * Math.PI / 4 * d * d * Math.Sqrt(2 * 25e3 * rho);
        Assert.Equal(expected, a.Performance.MassFlow!.Value, 2e-5 * expected);
        Assert.DoesNotContain(a.Findings, f => f.Code == "extrapolated");
    }

    [Fact]
    public void The_coefficient_belongs_to_the_Reynolds_number_of_its_own_flow()
    {
        DeviceAnswer a = Solve(AirFluid, "p=6 bar, T=40 degC, d=100 mm", "iso5167-long-radius");
        ThroatFlow throat = ThroatFlow.Of(a)!.Value;
        Assert.Equal(0.6, throat.beta, 1e-12);
        Assert.Equal(DischargeCorrelation.Find("iso5167-long-radius")!.At(throat), a.Performance.DischargeCoefficient!.Value, 1e-9);
    }

    [Fact]
    public void A_measured_flow_implies_the_coefficient_that_gives_it()
    {
        DeviceCase c = Metered(AirFluid, 6e5, 313.15, 0.1, 0.06, 5.7e5);
        c.Options.Set((int)CaseOption.DischargeCoefficient, 0.965);
        double flow = DeviceSolver.Solve(c).Performance.MassFlow!.Value;
        DeviceCase measured = Metered(AirFluid, 6e5, 313.15, 0.1, 0.06, 5.7e5);
        measured.Options.Set((int)CaseOption.Flow, flow);
        Assert.Equal(0.965, DeviceSolver.Solve(measured).Performance.DischargeCoefficient!.Value, 1e-9);
        double rho = DeviceSolver.Solve(c).Inlet.State.rho;
        measured.Options.Set((int)CaseOption.Flow, flow / rho);
        Assert.Equal(0.965, DeviceSolver.Solve(measured with { FlowIsVolume = true }).Performance.DischargeCoefficient!.Value, 1e-9);
    }

    [Theory]
    [InlineData("p=6 bar, T=40 degC, d=100 mm", "d=90 mm", "dp=25 kPa")]
    [InlineData("p=6 bar, T=40 degC, d=100 mm", "d=60 mm", "dp=2 bar")]
    [InlineData("p=6 bar, T=40 degC, d=40 mm", "d=24 mm", "dp=25 kPa")]
    [InlineData("p=6 bar, T=40 degC, d=100 mm", "d=60 mm", "dp=5 bar")]
    public void A_throat_outside_the_limits_is_said_to_be(string inlet, string throat, string back)
    {
        DeviceAnswer a = DeviceSolver.Solve(Cases.Rated(AirFluid, inlet, throat, "", back) with { DischargeCorrelation = DischargeCorrelation.Find("iso5167-isa1932") });
        Assert.Contains(a.Findings, f => f is { Code: "extrapolated", Severity: Severity.Caution });
    }

    [Theory]
    [InlineData("p0=6 bar, T0=40 degC", "d=60 mm", "")]
    [InlineData("p=6 bar, T=40 degC", "d=60 mm", "")]
    [InlineData("p=6 bar, T=40 degC, d=100 mm", "d=60 mm", "d=80 mm")]
    [InlineData("p=6 bar, T=40 degC, d=100 mm", "d=30 mm, n=4", "")]
    public void Without_its_pipe_the_standard_says_nothing(string inlet, string throat, string exit)
    {
        DeviceCase c = Cases.Rated(AirFluid, inlet, throat, exit, "p=5.75 bar") with { DischargeCorrelation = DischargeCorrelation.Find("iso5167-isa1932") };
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => DeviceSolver.Solve(c));
        Assert.Contains("ISO 5167", refused.Refusal.Reason, StringComparison.Ordinal);
    }

    private static Fluid AirFluid => GasCatalogue.Air;

    private static DeviceAnswer Solve(Fluid fluid, string inlet, string name) =>
        DeviceSolver.Solve(Cases.Rated(fluid, inlet, "d=60 mm", "", "dp=25 kPa") with { DischargeCorrelation = DischargeCorrelation.Find(name) });

    private static DeviceCase Metered(Fluid fluid, double p1, double T1, double D, double d, double p2)
    {
        var c = new DeviceCase { Device = DeviceKind.Nozzle, Fluid = fluid };
        c.Inlet.Set((int)StationSymbol.Pressure, p1);
        c.Inlet.Set((int)StationSymbol.Temperature, T1);
        c.Inlet.Set((int)StationSymbol.Diameter, D);
        c.Throat.Set((int)StationSymbol.Diameter, d);
        c.Back.Set((int)StationSymbol.Pressure, p2);
        return c;
    }
}
