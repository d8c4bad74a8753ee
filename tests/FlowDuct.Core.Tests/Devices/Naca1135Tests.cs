using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Nozzles and diffusers on a gas of constant heat capacity against NACA Report 1135, 1953 (ratio of specific heats 1.4).</summary>
public class Naca1135Tests
{
    private const double R = 287.05;
    private const double P0 = 1e6;
    private const double T0 = 400;

    public static TheoryData<double, double, double, double, double> Isentropic()
    {
        var rows = new TheoryData<double, double, double, double, double>();
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/isentropic_g14.csv"))
            rows.Add(Number(row, "M"), Number(row, "p_pt"), Number(row, "rho_rhot"), Number(row, "T_Tt"), Number(row, "A_Astar"));
        return rows;
    }

    // Twelve printed digits of the ratios; near M = 1 the flow is flat in p, so M keeps fewer.
    [Theory]
    [MemberData(nameof(Isentropic))]
    public void A_nozzle_from_rest_follows_the_isentropic_table(double M, double pRatio, double rhoRatio, double TRatio, double areaRatio)
    {
        DeviceAnswer answer = DeviceSolver.Solve(Nozzle(pRatio * P0));
        double velocity = M * Math.Sqrt(1.4 * R * T0 * TRatio);
        Assert.Equal(velocity, answer.Exit.Velocity!.Value, velocity * Tolerance(M));
        Assert.Equal(T0 * TRatio, answer.Exit.State.T, T0 * TRatio * 1e-11);
        Assert.Equal(P0 / (R * T0) * rhoRatio, answer.Exit.State.rho, P0 / (R * T0) * rhoRatio * 1e-11);
        Assert.Equal(M, answer.Exit.Mach!.Value, M * Tolerance(M));
        if (M > 1.01) Assert.Equal(areaRatio, answer.Performance.ThroatAreaRatio!.Value, areaRatio * 1e-10);
        Assert.Equal(0, answer.Performance.EntropyRise!.Value, 1e-9);
    }

    [Theory]
    [MemberData(nameof(Isentropic))]
    public void A_nudged_row_is_missed(double M, double pRatio, double rhoRatio, double TRatio, double areaRatio)
    {
        DeviceAnswer answer = DeviceSolver.Solve(Nozzle(pRatio * P0 * 0.9999));
        Assert.True(Math.Abs(answer.Exit.State.rho / (P0 / (R * T0) * rhoRatio) - 1) > 1e-5, $"{M} {TRatio} {areaRatio}");
    }

    public static TheoryData<double, double, double, double> Critical()
    {
        var rows = new TheoryData<double, double, double, double>();
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/critical_ratios_by_gamma.csv"))
            rows.Add(Exact(Number(row, "gamma")), Number(row, "p_star_over_pt"), Number(row, "T_star_over_Tt"), Number(row, "G_star_sqrt_RTt_over_pt"));
        return rows;
    }

    [Theory]
    [MemberData(nameof(Critical))]
    public void Choking_follows_the_critical_ratios(double gamma, double pRatio, double TRatio, double flux)
    {
        DeviceAnswer answer = DeviceSolver.Solve(Cases.Exact(
            DeviceKind.Nozzle,
            new PerfectGas(gamma, R),
            [(StationSymbol.StagnationPressure, P0), (StationSymbol.StagnationTemperature, T0)],
            [(StationSymbol.Pressure, 0.1 * P0)]));
        Assert.Equal(pRatio, answer.Performance.CriticalPressureRatio!.Value, 1e-11);
        Assert.Equal(TRatio, answer.Throat!.State.T / T0, 1e-11);
        Assert.Equal(flux, answer.Throat.Flux!.Value * Math.Sqrt(R * T0) / P0, 1e-11);
        Assert.Equal("fully-expanded", answer.Performance.Regime);
        Assert.True(answer.Performance.Choked);
    }

    // NACA 1135: pt/p at M = 0.6 is 1/0.7840 and at M = 0.3 it is 1/0.9395, so the lossless recovery follows from the table alone.
    [Fact]
    public void A_lossless_diffuser_recovers_what_the_table_says()
    {
        (double p1, double T1) = (0.784004, 0.932836);
        DeviceAnswer answer = DeviceSolver.Solve(Cases.Exact(
            DeviceKind.Diffuser,
            new PerfectGas(1.4, R),
            [(StationSymbol.Pressure, p1 * P0), (StationSymbol.Temperature, T1 * T0), (StationSymbol.Mach, 0.6)],
            [(StationSymbol.Mach, 0.3)],
            (CaseOption.Efficiency, 1)));
        Assert.Equal(0.939470, answer.Exit.State.p / P0, 2e-6);
        Assert.Equal((0.939470 - p1) / (1 - p1), answer.Performance.Recovery!.Value, 1e-5);

        // A/A* of the table: 1.1882 at 0.6, 2.0351 at 0.3.
        Assert.Equal(2.0351 / 1.1882, answer.Performance.AreaRatio!.Value, 1e-4);
        Assert.Equal(1, answer.Performance.Effectiveness!.Value, 1e-9);
        Assert.Equal(0, answer.Performance.LossCoefficient!.Value, 1e-9);
    }

    private static DeviceCase Nozzle(double p2) => Cases.Exact(
        DeviceKind.Nozzle,
        new PerfectGas(1.4, R),
        [(StationSymbol.StagnationPressure, P0), (StationSymbol.StagnationTemperature, T0)],
        [(StationSymbol.Pressure, p2)]);

    // V comes from a difference of enthalpies: at M = 0.01 the twelve printed digits of p/pt leave seven of V.
    private static double Tolerance(double M) => M < 0.2 ? 1e-7 : 1e-10;

    // 4/3 and 5/3 stand in the table to nine decimals; the ratios beside them belong to the exact values.
    private static double Exact(double gamma) => Math.Abs((gamma * 3) - Math.Round(gamma * 3)) < 1e-8 ? Math.Round(gamma * 3) / 3 : gamma;

    private static double Number(IReadOnlyDictionary<string, string> row, string column) =>
        double.Parse(row[column], CultureInfo.InvariantCulture);
}
