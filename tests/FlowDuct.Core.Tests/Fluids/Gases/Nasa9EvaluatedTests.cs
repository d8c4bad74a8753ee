using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Every gas against values of its record by a separate program, its joints, and other publications of its heat capacity.</summary>
public class Nasa9EvaluatedTests
{
    // The gas constant of the report; the fluids have that of the SI of 2019.
    private const double ReportR = 8.314510;

    // The joints are closed by moving the warmer piece: 0.043 J/mol and 3.0e-6 J/(mol.K) at most (table of continuity).
    private const double JointEnthalpy = 0.044, JointEntropy = 3.1e-6;

    public static TheoryData<string> Species() => [.. Nasa9Records.Words().Select(gas => gas.Formula)];

    [Theory]
    [MemberData(nameof(Species))]
    public void The_printed_fit_gives_the_tabulated_values(string formula)
    {
        IReadOnlyDictionary<string, string>[] rows = RowsOf(formula);
        Assert.Equal(11, rows.Length);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            Reduced at = Printed(formula, Number(row["T_K"]));
            Agrees(row, "cp_J_per_molK", at.cp * ReportR);
            Agrees(row, "h_J_per_mol", at.h * ReportR);
            Agrees(row, "s0_J_per_molK", at.s0 * ReportR);
        }
    }

    [Theory]
    [MemberData(nameof(Species))]
    public void The_fluid_gives_the_tabulated_values(string formula)
    {
        IdealGas gas = GasCatalogue.Find(formula)!;
        double perMole = gas.MolarMass / 1000 * (ReportR / IdealGas.MolarGasConstant);
        Assert.Equal(Outcome.Ok, gas.FromPT(1e5, 298.15, out FluidState reference));
        foreach (IReadOnlyDictionary<string, string> row in RowsOf(formula))
        {
            double T = Number(row["T_K"]);
            Assert.Equal(Outcome.Ok, gas.FromPT(1e5, T, out FluidState at));
            bool joined = T >= 1000;
            Agrees(row, "cp_kJ_per_kgK", at.cp / 1000 * (ReportR / IdealGas.MolarGasConstant));
            Agrees(row, "s0_J_per_molK", at.s * perMole, joined ? JointEntropy : 0);
            Agrees(row, "gamma", at.cp / at.cv);
            Agrees(row, "sound_speed_m_per_s", at.w * Math.Sqrt(ReportR / IdealGas.MolarGasConstant));
            Agrees(row, "h_minus_h298_J_per_mol", (at.h - reference.h) * perMole, joined ? JointEnthalpy : 0);
        }
    }

    [Fact]
    public void Intervals_miss_each_other_by_the_tabulated_jumps()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceTable.Read("gas/nasa9_continuity.csv");
        Assert.Equal(41, rows.Count);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            double T = Number(row["T_break_K"]);
            Species gas = Nasa9Records.Find(row["species"])!;
            Reduced below = new CaloricPiece(gas.Intervals.Single(i => i.Thigh == T)).At(T);
            Reduced above = new CaloricPiece(gas.Intervals.Single(i => i.Tlow == T)).At(T);

            // Differences of nearly equal numbers: the rounding of h/R near 1e5 K and of s0/R near 1e2 is added.
            Agrees(row, "cp_relative_jump", (above.cp / below.cp) - 1, 1e-14);
            Agrees(row, "h_jump_J_per_mol", (above.h - below.h) * ReportR, 1e-9);
            Agrees(row, "s_jump_J_per_molK", (above.s0 - below.s0) * ReportR, 1e-11);
        }
    }

    [Theory]
    [MemberData(nameof(Species))]
    public void Heat_capacity_differs_from_other_publications_as_stated(string formula)
    {
        IReadOnlyDictionary<string, string>[] rows = [.. ReferenceTable.Read("gas/nasa9_cp_check.csv").Where(row => row["species"] == formula)];
        Assert.Equal(4, rows.Length);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            double cp = Printed(formula, Number(row["T_K"])).cp * ReportR;
            Agrees(row, "cp_nasa9", cp);
            foreach (string other in new[] { "TM4513", "JANAF1998", "reference_eos" })
            {
                if (row["cp_" + other].Length == 0) continue;

                // The stated difference has three decimals of a percent, the other value four of a J/(mol.K).
                double rounding = 100 * 0.00005 / cp;
                Agrees(row, $"dev_{other}_percent", 100 * ((cp / Number(row["cp_" + other])) - 1), rounding);
            }
        }
    }

    [Theory]
    [InlineData("N2", 20000)]
    [InlineData("CO2", 20000)]
    [InlineData("NH3", 6000)]
    public void A_gas_ends_where_its_record_ends(string formula, double Thigh)
    {
        IdealGas gas = GasCatalogue.Find(formula)!;
        Assert.Equal(Outcome.Ok, gas.FromPT(1e5, Thigh, out _));
        Assert.Equal(Outcome.TemperatureTooHigh, gas.FromPT(1e5, Math.BitIncrement(Thigh), out _));
    }

    [Theory]
    [InlineData("H2")]
    [InlineData("CO2")]
    [InlineData("CH4")]
    public void A_gas_without_continuation_stops_at_200_K(string formula)
    {
        IdealGas gas = GasCatalogue.Find(formula)!;
        Assert.Equal(Outcome.Ok, gas.FromPT(1e5, 200, out FluidState at));
        Assert.Equal(Notices.None, at.Notices);
        Assert.Equal(Outcome.TemperatureTooLow, gas.FromPT(1e5, Math.BitDecrement(200), out _));
    }

    [Theory]
    [MemberData(nameof(Species))]
    public void Every_inverse_closes_over_the_whole_range(string formula)
    {
        IdealGas gas = GasCatalogue.Find(formula)!;
        double least = Nasa9Records.Find(formula)!.ContinuedDownTo, most = Nasa9Records.Find(formula)!.Intervals[^1].Thigh;
        for (int i = 0; i <= 200; i++)
        {
            double T = least * Math.Pow(most / least, i / 200.0);
            T = Math.Clamp(T, least, most);
            Assert.Equal(Outcome.Ok, gas.FromPT(3e5, T, out FluidState at));
            Assert.Equal(Outcome.Ok, gas.FromPH(3e5, at.h, default, out FluidState ph));
            Assert.Equal(Outcome.Ok, gas.FromPS(3e5, at.s, default, out FluidState ps));
            Assert.Equal(Outcome.Ok, gas.FromHS(at.h, at.s, default, out FluidState hs));
            Assert.Equal(at.h, ph.h, 1e-12 * at.h);
            Assert.Equal(at.s, ps.s, 1e-12 * Math.Abs(at.s));
            Assert.Equal(T, ph.T, 1e-11 * T);
            Assert.Equal(T, ps.T, 1e-11 * T);
            Assert.Equal(3e5, hs.p, 1e-10 * 3e5);
        }
    }

    private static Reduced Printed(string formula, double T)
    {
        Species gas = Nasa9Records.Find(formula)!;
        return new CaloricPiece(gas.Intervals.First(i => T <= i.Thigh)).At(T);
    }

    private static IReadOnlyDictionary<string, string>[] RowsOf(string formula) =>
        [.. ReferenceTable.Read("gas/nasa9_evaluated.csv").Where(row => row["species"] == formula)];

    private static void Agrees(IReadOnlyDictionary<string, string> row, string column, double computed, double allowance = 0)
    {
        Support.Printed printed = Support.Printed.Parse(row[column]);
        Assert.True(printed.Agrees(computed, allowance), string.Create(
            CultureInfo.InvariantCulture, $"{row["species"]} {column}: {computed:R}, the table has {row[column]}"));
    }

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
