using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Air against the air table of the handbooks, which engineers lay beside an answer first.</summary>
public class AirTableTests
{
    private static readonly IdealGas Air = GasCatalogue.Air;

    public static TheoryData<double, double, double, double, double> Rows { get; } = Read();

    // The table rests on older spectroscopic data: its enthalpies lie a nearly constant 0.2 to 0.45 kJ/kg above the record's.
    [Theory]
    [MemberData(nameof(Rows))]
    public void Enthalpy_and_internal_energy_agree_within_0_15_percent(double T, double h, double u, double s0, double pr)
    {
        FluidState at = At(T);
        Assert.Equal(1, at.h / (h * 1e3), 1.5e-3);
        Assert.Equal(1, at.u / (u * 1e3), 1.5e-3);
        Assert.False(Math.Abs((At(T * 1.003).h / (h * 1e3)) - 1) <= 1.5e-3, $"0.3 % warmer passes too ({s0}, {pr})");
    }

    // p_r is exp(s0/R): its scale is arbitrary, hence ratios to the row of 300 K; a thousandth of it is R/1000 in s0.
    [Theory]
    [MemberData(nameof(Rows))]
    public void Relative_pressure_and_entropy_agree_within_a_thousandth(double T, double h, double u, double s0, double pr)
    {
        double rise = At(T).s - At(300).s;
        Assert.Equal(1, Math.Exp(rise / Air.R) / (pr / 1.3860), 1e-3);
        Assert.Equal((s0 - 1.70203) * 1e3, rise, 0.5);
        Assert.False(Math.Abs((Math.Exp((At(T * 1.001).s - At(300).s) / Air.R) / (pr / 1.3860)) - 1) <= 1e-3, $"0.1 % warmer passes too ({h}, {u})");
    }

    [Fact]
    public void The_table_is_whole() => Assert.Equal(46, Rows.Count);

    private static FluidState At(double T)
    {
        Assert.Equal(Outcome.Ok, Air.FromPT(1e5, T, out FluidState state));
        return state;
    }

    private static TheoryData<double, double, double, double, double> Read()
    {
        var rows = new TheoryData<double, double, double, double, double>();
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("gas/air_table.csv"))
            rows.Add(Number(row["T_K"]), Number(row["h_kJ_per_kg"]), Number(row["u_kJ_per_kg"]), Number(row["s0_kJ_per_kgK"]), Number(row["p_r"]));
        return rows;
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
