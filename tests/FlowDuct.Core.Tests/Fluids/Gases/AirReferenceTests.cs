using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Air against values from outside: the NASA record evaluated elsewhere, and an equation of another laboratory.</summary>
public class AirReferenceTests
{
    // The reference values carry the gas constant of the fits, 8.314510 J/(mol.K); exactly this factor leads to ours.
    private const double PerMole = 8.314510 / IdealGas.MolarGasConstant;

    private static readonly IdealGas Air = GasCatalogue.Air;

    public static TheoryData<string, string, string> Evaluated { get; } = Read();

    [Theory]
    [MemberData(nameof(Evaluated))]
    public void Air_agrees_with_the_nasa_record(string T, string column, string printed) =>
        Assert.True(Agrees(T, column, printed, nudge: 0), $"{column} at {T} K is {Computed(T, column)}, table {printed}");

    [Theory]
    [MemberData(nameof(Evaluated))]
    public void A_value_moved_by_two_of_its_last_digits_is_noticed(string T, string column, string printed)
    {
        // Above 1000 K h and s carry the moved joint (see Allowance), so that the nudge has to exceed it.
        double nudge = (4 * Printed.Parse(printed).HalfDigit) + (2 * Allowance(T, column));
        Assert.False(Agrees(T, column, printed, nudge));
        Assert.False(Agrees(T, column, printed, -nudge));
    }

    [Theory]
    [InlineData(60)]
    [InlineData(100)]
    [InlineData(150)]
    [InlineData(200)]
    [InlineData(250)]
    [InlineData(300)]
    [InlineData(400)]
    [InlineData(600)]
    [InlineData(873)]
    [InlineData(1200)]
    [InlineData(1600)]
    [InlineData(2000)]
    public void Air_agrees_with_the_ideal_part_of_the_reference_equation(double T)
    {
        // Independent of the NASA record. The two differ by up to 1.8e-4 in cp and by 0.08 J/mol in h(298.15 K) - h(0 K);
        // allowed: 2e-4 of cp, 4e-4 of h, 8e-4 R in s(T) - s(300 K). This holds below 200 K too, where cp is held.
        FluidState state = At(T);
        Assert.Equal(1, AirIdealPart.Cp(T) / (state.cp / Air.R), 2e-4);
        Assert.Equal(1, AirIdealPart.H(T) / (state.h / Air.R), 4e-4);
        Assert.Equal(AirIdealPart.S(T) - AirIdealPart.S(300), (state.s - At(300).s) / Air.R, 8e-4);
    }

    [Fact]
    public void Gas_constant_of_air_is_the_exact_molar_one_over_the_reports_molar_mass() =>
        Assert.Equal(287.050901051400, Air.R, 1e-11); // 8314.46261815324 / 28.9651159 in decimal arithmetic

    private static bool Agrees(string T, string column, string printed, double nudge)
    {
        Printed table = Printed.Parse(printed);
        return new Printed(table.Value + nudge, table.HalfDigit).Agrees(Computed(T, column), Allowance(T, column));
    }

    // Above the joint the printed fit jumps by 0.0002 J/mol and 5.758e-7 J/(mol.K), which FlowDuct closes; the jump is itself
    // known to half of its last digit.
    private static double Allowance(string T, string column) => Number(T) <= 1000 ? 0 : column switch
    {
        "h_minus_h298_J_per_mol" => 0.00025,
        "s0_J_per_molK" => 5.8e-7,
        _ => 0,
    };

    private static double Computed(string T, string column)
    {
        FluidState state = At(Number(T));
        double molar = Air.MolarMass / 1000 * PerMole;
        return column switch
        {
            "cp_J_per_molK" => state.cp * molar,
            "h_minus_h298_J_per_mol" => (state.h - At(298.15).h) * molar,
            "s0_J_per_molK" => state.s * molar,
            "gamma" => state.cp / state.cv,
            "sound_speed_m_per_s" => state.w * Math.Sqrt(PerMole),
            _ => throw new ArgumentException(column),
        };
    }

    private static FluidState At(double T)
    {
        Assert.Equal(Outcome.Ok, Air.FromPT(1e5, T, out FluidState state));
        return state;
    }

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);

    private static TheoryData<string, string, string> Read()
    {
        string[] columns = ["cp_J_per_molK", "h_minus_h298_J_per_mol", "s0_J_per_molK", "gamma", "sound_speed_m_per_s"];
        TheoryData<string, string, string> data = [];
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("gas/nasa9_air_evaluated.csv"))
        {
            foreach (string column in columns)
                data.Add(row["T_K"], column, row[column]);
        }

        return data;
    }
}
