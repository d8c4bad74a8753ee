using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>The choked throat of real gases: the critical-flow function C* of ISO 9300 against a separate program, and the size of its departure.</summary>
public class CriticalFlowTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("flow/critical_flow_function.csv");

    [Fact]
    public void Every_row_of_the_table_is_met()
    {
        Assert.Equal(107, s_rows.Count);
        foreach (IReadOnlyDictionary<string, string> row in s_rows)
        {
            HelmholtzFluid fluid = Equations.Of(row["gas"]);
            (FluidState rest, FluidState throat, double V) = Throat(fluid, Equations.Number(row["p0_Pa"]), Equations.Number(row["T0_K"]));
            double R = fluid.Equation.R, G = V / throat.v;
            Meets(row, "C_star", G * Math.Sqrt(R * rest.T) / rest.p);
            Meets(row, "T_star_over_T0", throat.T / rest.T);
            Meets(row, "p_star_over_p0", throat.p / rest.p);
            Meets(row, "throat_speed_m_per_s", V);
            Meets(row, "mass_flux_kg_per_m2s", G);
            Meets(row, "Z0", rest.p * rest.v / (R * rest.T));
        }
    }

    // From the table: nitrogen at 300 K passes 3.23 % more at 100 bar than at 1 bar, carbon dioxide at 350 K 8.5 % more at 50 bar.
    [Theory]
    [InlineData("N2", 300, 1e5, 10e6, 1.0323)]
    [InlineData("CO2", 350, 1e5, 5e6, 1.085)]
    public void Real_gases_pass_more_than_ideal_ones(string gas, double T0, double low, double high, double ratio)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        double Function(double p0)
        {
            (FluidState rest, FluidState throat, double V) = Throat(fluid, p0, T0);
            return V / throat.v * Math.Sqrt(fluid.Equation.R * rest.T) / rest.p;
        }

        Assert.Equal(ratio, Function(high) / Function(low), 5e-4);
    }

    // The estimate by the second virial coefficient has to be of the size of what the equation itself gives: within a fifth up to its limit of trust,
    // and 1.5e-3 of Z, which the third coefficient is worth near the Boyle temperature, where the second one vanishes.
    [Theory]
    [InlineData("N2", 300, 2e6)]
    [InlineData("N2", 260, 2e6)]
    [InlineData("CO2", 350, 1e6)]
    [InlineData("CO2", 400, 2e6)]
    [InlineData("Air", 290, 2e6)]
    public void The_virial_estimate_is_of_the_size_of_the_departure(string gas, double T, double p)
    {
        HelmholtzFluid real = Equations.Of(gas);
        IdealGas ideal = GasCatalogue.Find(gas)!;
        Assert.Equal(Outcome.Ok, ideal.FromPT(p, T, out FluidState at));
        Assert.Equal(Outcome.Ok, real.FromPT(p, T, out FluidState genuine));
        RealGasEstimate estimate = RealGasEstimate.Of(ideal.Virial!, ideal.MolarMass / 1000, at);
        Assert.False(estimate.SeriesFails);
        double departure = genuine.p * genuine.v / (real.Equation.R * T);
        Assert.Equal(1 - departure, 1 - estimate.Z, (0.2 * Math.Abs(1 - departure)) + 1.5e-3);
        (FluidState rest, FluidState throat, double V) = Throat(real, p, T);
        Assert.True(Choking.TryFind(ideal, at.h, at.s, p, out FluidState thin, out _));
        double ratio = V / throat.v * Math.Sqrt(real.Equation.R) / (Energy.Velocity(at.h, thin.h) / thin.v * Math.Sqrt(ideal.R));
        Assert.Equal(ratio - 1, RealGasEstimate.CriticalFluxDeviation(ideal.Virial!, ideal.MolarMass / 1000, at, thin), (0.3 * Math.Abs(ratio - 1)) + 1e-3);
        Assert.True(rest.p > throat.p);
    }

    private static (FluidState AtRest, FluidState Throat, double V) Throat(HelmholtzFluid fluid, double p0, double T0)
    {
        Assert.Equal(Outcome.Ok, fluid.FromPT(p0, T0, out FluidState rest));
        Assert.True(Choking.TryFind(fluid, rest.h, rest.s, p0, out FluidState throat, out bool atKink));
        Assert.False(atKink);
        return (rest, throat, Energy.Velocity(rest.h, throat.h));
    }

    // Half a unit of the last digit of the table; the flux has nine digits, and the other solver may be off by one of the last.
    private static void Meets(IReadOnlyDictionary<string, string> row, string column, double value) => Assert.True(
        Printed.Parse(row[column]).Agrees(value, column == "mass_flux_kg_per_m2s" ? Printed.Parse(row[column]).HalfDigit : 0),
        string.Create(CultureInfo.InvariantCulture, $"{row["gas"]} {row["T0_K"]} K {row["p0_Pa"]} Pa {column}: {value:R}, the table has {row[column]}"));
}
