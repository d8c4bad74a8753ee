using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>Saturation solved on the equations of state: the Maxwell criterion itself, Clapeyron's equation, and what the papers print.</summary>
public class SaturationTests
{
    // Triple and critical points as the papers print them (from memory): nitrogen 63.151 K, 12.5198 kPa (from this equation), 126.192 K, 3.3958 MPa,
    // 313.3 kg/m3; carbon dioxide 216.592 K, 0.51795 MPa (measured; the equation gives 0.517964), 304.1282 K, 7.3773 MPa, 467.6 kg/m3.
    [Theory]
    [InlineData("N2", "3.3958", "313.3", "0.0125198", 0)]
    [InlineData("CO2", "7.3773", "467.6", "0.51795", 1e-5)]
    public void Critical_and_triple_points_are_those_of_the_papers(string gas, string pc, string rhoc, string pt, double allowance)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Assert.True(fluid.TryCriticalPoint(out double Tc, out double p));
        Assert.True(Printed.Parse(pc).Agrees(p / 1e6), $"{p}");
        Assert.True(Printed.Parse(rhoc).Agrees(fluid.Equation.rhoReducing), $"{fluid.Equation.rhoReducing}");
        Assert.True(fluid.TrySaturationPressure(fluid.Equation.Parameters.Tleast, out double least));
        Assert.True(Printed.Parse(pt).Agrees(least / 1e6, allowance), $"{least}");

        // The first and the second derivative of pressure by density vanish there.
        HelmholtzEquation of = fluid.Equation;
        double RT = of.R * Tc;
        Assert.InRange(Math.Abs(of.At(of.rhoReducing, Tc).prho) / RT, 0, 1e-9);
        Assert.InRange(Math.Abs(of.At(1.001 * of.rhoReducing, Tc).prho - of.At(0.999 * of.rhoReducing, Tc).prho) / RT, 0, 1e-4);
    }

    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void Both_phases_have_one_pressure_and_one_Gibbs_energy(string gas) => Temperatures(gas).Each(
        (T, _) =>
        {
            var boundary = (SaturatedBoundary)Equations.Of(gas).Boundary;
            Assert.True(boundary.TryAtTemperature(T, out HelmholtzPair pair), $"{T:R}");
            (HelmholtzPoint l, HelmholtzPoint v) = (pair.Liquid, pair.Vapour);

            // A cold liquid keeps p to the rounding of rho dp/drho.
            Assert.InRange(Math.Abs(l.p - pair.p), 0, (1e-11 * pair.p) + (1e-14 * l.rho * l.prho));
            Assert.InRange(Math.Abs(v.p - pair.p), 0, 1e-11 * pair.p);
            Assert.InRange(Math.Abs(l.h - (T * l.s) - v.h + (T * v.s)), 0, 1e-11 * boundary.Equation.R * T);
            Assert.True(l.rho > v.rho && l.prho > 0 && v.prho > 0);

            Assert.True(boundary.TryAtPressure(pair.p, out HelmholtzPair back));
            Assert.Equal(T, back.T, 1e-11 * T);
        },
        1000);

    // A central difference of 1e-4 in T: the error is its square times what the third derivative makes of it.
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void The_slope_is_that_of_Clapeyron(string gas) => Gen.Double[0, 0.99].Select(u => (u, u)).Each(
        (u, _) =>
        {
            HelmholtzFluid fluid = Equations.Of(gas);
            double low = fluid.Equation.Parameters.Tleast * 1.001, T = low + (u * (fluid.Boundary.Tc - low)), step = 1e-4 * T;
            Assert.True(((SaturatedBoundary)fluid.Boundary).TryAtTemperature(T, out HelmholtzPair pair));
            Assert.True(fluid.TrySaturationPressure(T - step, out double below) & fluid.TrySaturationPressure(T + step, out double above));
            Assert.Equal(1, (above - below) / (2 * step) / pair.Slope, 1e-5);
        },
        200);

    // The papers fit their auxiliary equations to the equation of state within 0.02 % in pressure; close to Tc the densities part.
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void The_estimates_of_the_papers_agree_with_it(string gas) => Gen.Double[0, 0.98].Select(u => (u, u)).Each(
        (u, _) =>
        {
            var boundary = (SaturatedBoundary)Equations.Of(gas).Boundary;
            HelmholtzEquation of = boundary.Equation;
            double T = of.Parameters.Tleast + (u * (of.Treducing - of.Parameters.Tleast));
            Assert.True(boundary.TryAtTemperature(T, out HelmholtzPair pair));
            Assert.Equal(1, HelmholtzSaturation.EstimatePressure(of, boundary.pc, T) / pair.p, 2e-4);
            Assert.Equal(1, HelmholtzSaturation.EstimateLiquid(of, T) / pair.Liquid.rho, 4e-4);
            Assert.Equal(1, HelmholtzSaturation.EstimateVapour(of, T) / pair.Vapour.rho, 4e-4);
        },
        200);

    // Dew densities are an equation of their own in the paper, fitted to measurements as the pressures are: 0.5 % up to 125 K.
    [Fact]
    public void The_dew_line_of_air_is_where_the_equation_has_its_density()
    {
        HelmholtzFluid air = ReferenceEquations.Air;
        var lines = (AirBoundary)air.Boundary;
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceTable.Read("gas/eos_air_dew_density.csv");
        for (double T = 65; T <= 125; T += 5)
        {
            double theta = 1 - (T / air.Boundary.Tc);
            double expected = air.Equation.rhoReducing * Math.Exp(rows.Sum(row => Equations.Number(row["n"]) * Math.Pow(theta, Equations.Number(row["t"]))));
            Assert.Equal(Outcome.Ok, air.FromPT(lines.DewPressure(T), T, out FluidState at));
            Assert.Equal(1, at.rho / expected, 0.005);
        }
    }

    // Bubble pressure of air at 59.75 K: 5.265 kPa; melting line of carbon dioxide at 800 MPa: 327.673 K (both from memory of the papers).
    [Fact]
    public void The_cold_ends_are_those_of_the_papers()
    {
        Assert.True(Printed.Parse("5.265").Agrees(((AirBoundary)ReferenceEquations.Air.Boundary).BubblePressure(59.75) / 1e3));
        Assert.True(Printed.Parse("327.673").Agrees(ReferenceEquations.CarbonDioxide.Equation.Melting.Temperature(800e6)));
        foreach (HelmholtzFluid fluid in Equations.All)
        {
            MeltingLine line = fluid.Equation.Melting;
            Assert.Equal(1, line.Pressure(line.Temperature(3e8)) / 3e8, 1e-11);
            Assert.Equal(line.Tt, line.Temperature(line.pt / 2));
        }
    }

    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void An_isentrope_meets_the_line_where_its_entropy_is_saturated(string gas) => Temperatures(gas).Each(
        (T, u) =>
        {
            HelmholtzFluid fluid = Equations.Of(gas);
            fluid.FromTX(T, u < 0.5 ? 0 : 1, out FluidState at);
            Assert.True(fluid.TrySaturationOnIsentrope(at.s, out FluidState met), $"{T:R}");
            Assert.Equal(at.Phase, met.Phase);

            // A part of 1e-6 below the critical temperature, Helmholtz energies rounded at 1e-16 leave the two densities 1e-7.
            bool beside = T > 0.999 * fluid.Boundary.Tc;
            Assert.Equal(at.s, met.s, (beside ? 5e-8 : 1e-11) * Math.Max(Math.Abs(at.s), 1));
            if (!beside) Assert.Equal(T, met.T, 1e-9 * T);
        },
        300);

    [Fact]
    public void An_isentrope_that_misses_the_line_is_told_so()
    {
        HelmholtzFluid fluid = ReferenceEquations.Nitrogen;
        fluid.FromTX(63.151, 1, out FluidState driest);
        Assert.False(fluid.TrySaturationOnIsentrope(driest.s + 1, out _));
        Assert.False(ReferenceEquations.Air.TrySaturationOnIsentrope(4000, out _));
        Assert.Equal(Outcome.NoSaturation, ReferenceEquations.Air.FromPX(1e5, 0.5, out _));
        Assert.Equal(Outcome.QualityOutsideRange, fluid.FromPX(1e5, 1.1, out _));
        Assert.Equal(Outcome.NoSaturation, fluid.FromPX(4e6, 0.5, out _));
        Assert.Equal(Outcome.NoSaturation, fluid.FromTX(130, 0.5, out _));
    }

    // To a part of 1e-6 below the critical temperature, as likely close to it as far from it.
    private static Gen<(double T, double u)> Temperatures(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        double Tc = fluid.Boundary.Tc, widest = Math.Log(1 - (fluid.Equation.Parameters.Tleast / Tc));
        return Gen.Select(Gen.Double[Math.Log(1e-6), widest - 1e-9], Gen.Double[0, 1]).Select((t, u) => (Tc * (1 - Math.Exp(t)), u));
    }
}
