using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Air with variable heat capacity (NASA/TP-2002-211556), worked by an independent solver from the same polynomials.</summary>
public class AirNozzleTests
{
    public static TheoryData<double, string, double> Rows()
    {
        var rows = new TheoryData<double, string, double>();
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/variable_cp_expansion_check.csv").Where(row => row["gas"] == "Air"))
        {
            foreach (string column in row.Keys.Where(key => key is not ("gas" or "T0_K" or "molar_mass_g_per_mol" or "gamma_at_T0" or "C_star" or "A_over_Astar_at_M2")))
                rows.Add(double.Parse(row["T0_K"], CultureInfo.InvariantCulture), column, double.Parse(row[column], CultureInfo.InvariantCulture));
        }

        return rows;
    }

    // Nine printed digits of ratios, six decimals of the rest.
    [Theory]
    [MemberData(nameof(Rows))]
    public void Choking_and_expansion_to_a_fifth_match(double T0, string column, double printed)
    {
        DeviceAnswer a = Solve(T0, 0.2e6);
        double computed = column switch
        {
            "p_star_over_p0" => a.Performance.CriticalPressureRatio!.Value,
            "T_star_over_T0" => a.Throat!.State.T / T0,
            "G_star_at_1MPa_kg_per_m2s" => a.Throat!.Flux!.Value,
            "T_exit_p0_1MPa_to_0.2MPa_K" => a.Exit.State.T,
            "v_exit_m_per_s" => a.Exit.Velocity!.Value,
            "M_exit" => a.Exit.Mach!.Value,
            "G_exit_kg_per_m2s" => a.Exit.Flux!.Value,
            _ => throw new ArgumentOutOfRangeException(nameof(column), column, "a column that nobody checks"),
        };
        double half = column is "p_star_over_p0" or "T_star_over_T0" ? 5.1e-10 : column == "M_exit" ? 5.1e-9 : 5.1e-7;
        Assert.Equal(printed, computed, half);
    }

    [Fact]
    public void The_comparison_can_fail() =>
        Assert.NotEqual(Solve(400, 0.2e6).Exit.State.T, Solve(400, 0.200001e6).Exit.State.T, 1e-6);

    private static DeviceAnswer Solve(double T0, double p2) => DeviceSolver.Solve(Cases.Exact(
        DeviceKind.Nozzle,
        GasCatalogue.Air,
        [(StationSymbol.StagnationPressure, 1e6), (StationSymbol.StagnationTemperature, T0)],
        [(StationSymbol.Pressure, p2)]));
}
