using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>Values that the papers of the equations print, and a separate evaluator's.</summary>
public class PublishedValueTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("gas/eos_check_values.csv");

    [Fact]
    public void Every_printed_digit_is_met()
    {
        int printed = 0;
        foreach (IReadOnlyDictionary<string, string> row in s_rows.Where(row => row["published_rho"].Length > 0))
        {
            (HelmholtzFluid fluid, FluidState at) = State(row);
            double M = fluid.Equation.Parameters.M;

            // Carbon dioxide is printed per kilogram, in kJ; the others per mole, in mol/dm3.
            bool byMass = fluid.Name == "carbon-dioxide";
            (double density, double heat) = byMass ? (1, 1e-3) : (1e-3 / M, M);
            Meets(row, "published_rho", at.rho * density);
            Meets(row, "published_cv", at.cv * heat);
            Meets(row, "published_cp", at.cp * heat);
            Meets(row, "published_w", at.w);
            printed += 4;
        }

        Assert.Equal(28, printed);
    }

    // The same tables: h and s, J/mol and J/(mol.K), kJ/kg and kJ/(kg.K) for carbon dioxide.
    [Theory]
    [InlineData("N2", 280, 1e6, "8070.2", "170.41")]
    [InlineData("N2", 500, 1e6, "14569", "187.54")]
    [InlineData("N2", 500, 10e6, "14497", "167.93")]
    [InlineData("CO2", 280, 1e6, "-26.385", "-0.51326")]
    [InlineData("CO2", 500, 1e6, "185.60", "0.04225")]
    [InlineData("CO2", 500, 10e6, "157.01", "-0.4383")]
    [InlineData("Air", 140, 101325, "4028.3", "176.60")] // from memory
    public void Printed_enthalpy_and_entropy_are_met(string gas, double T, double p, string h, string s)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Assert.Equal(Outcome.Ok, fluid.FromPT(p, T, out FluidState at));
        double unit = gas == "CO2" ? 1e-3 : fluid.Equation.Parameters.M;
        Assert.True(Printed.Parse(h).Agrees(at.h * unit), $"{at.h * unit}");
        Assert.True(Printed.Parse(s).Agrees(at.s * unit), $"{at.s * unit}");
        Assert.False(Printed.Parse(h).Agrees(at.h * unit * 1.001));
    }

    [Fact]
    public void A_separate_evaluator_finds_the_same()
    {
        Assert.Equal(36, s_rows.Count);
        foreach (IReadOnlyDictionary<string, string> row in s_rows)
        {
            (HelmholtzFluid fluid, FluidState at) = State(row);
            double M = fluid.Equation.Parameters.M;
            Meets(row, "rho_mol_per_m3", at.rho / M);
            Meets(row, "cv_J_per_molK", at.cv * M);
            Meets(row, "cp_J_per_molK", at.cp * M);
            Meets(row, "w_m_per_s", at.w);
            Meets(row, "h_J_per_mol_paper_state", at.h * M);
            Meets(row, "s_J_per_molK_paper_state", at.s * M);
        }
    }

    // The evaluator's derivatives are numerical: a unit of its last digit in place of half of one.
    private static void Meets(IReadOnlyDictionary<string, string> row, string column, double value)
    {
        var printed = Printed.Parse(row[column]);
        double allowance = column.StartsWith("published", StringComparison.Ordinal) ? 0 : printed.HalfDigit;
        Assert.True(printed.Agrees(value, allowance), $"{row["fluid"]} {row["T_K"]} K {row["p_Pa"]} Pa {column}: {value:R}, the table has {row[column]}");
    }

    private static (HelmholtzFluid Fluid, FluidState At) State(IReadOnlyDictionary<string, string> row)
    {
        HelmholtzFluid fluid = Equations.Of(row["fluid"]);
        Assert.Equal(Outcome.Ok, fluid.FromPT(Equations.Number(row["p_Pa"]), Equations.Number(row["T_K"]), out FluidState at));
        return (fluid, at);
    }
}
