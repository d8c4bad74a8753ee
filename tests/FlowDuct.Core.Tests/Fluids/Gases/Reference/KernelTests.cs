using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>The written kernels are the sums of their tables, and their derivatives are those of the sums.</summary>
public class KernelTests
{
    private static readonly Gen<(double x, double y)> s_points = Gen.OneOf(
        Gen.Select(Gen.Double[0.001, 3.2], Gen.Double[0.1, 2]), Gen.Select(Gen.Double[0.9, 1.1], Gen.Double[0.98, 1.02]));

    [Theory]
    [InlineData("nitrogen")]
    [InlineData("carbon-dioxide")]
    [InlineData("air")]
    public void Constants_are_those_of_the_tables(string fluid)
    {
        HelmholtzEquation kernel = Equations.Of(fluid).Equation;
        IReadOnlyDictionary<string, string> row = Row("eos_parameters", fluid), melting = Row("eos_melting", fluid);
        IEnumerable<double> parameters = [.. ((string[])["T_reducing_K", "rho_reducing_mol_per_m3", "R_J_per_molK", "M_kg_per_mol", "T_low_K", "T_high_K"]).Select(column => Equations.Number(row[column]))];
        EquationParameters p = kernel.Parameters;
        Assert.Equal(parameters, (IEnumerable<double>)[p.Treducing, p.rhoReducing, p.Rmolar, p.M, p.Tleast, p.Tmost]);
        Assert.Equal(Equations.Number(row["p_high_MPa"]), p.pMost / 1e6);
        MeltingLine line = kernel.Melting;
        IEnumerable<double> constants = [.. ((string[])["T_triple_K", "p_triple_Pa", "a1", "t1", "a2"]).Select(column => Equations.Number(melting[column]))];
        Assert.Equal(constants, (IEnumerable<double>)[line.Tt, line.pt, line.a1, line.t1, line.a2]);
    }

    // Sums of up to 50 terms, some of them thousands of times the result near the critical point: 1e-11 of one.
    [Theory]
    [InlineData("nitrogen")]
    [InlineData("carbon-dioxide")]
    [InlineData("air")]
    public void The_kernel_is_the_sum_of_the_table(string fluid)
    {
        HelmholtzEquation kernel = Equations.Of(fluid).Equation;
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows =
            ReferenceTable.Read(SourceTree.File($"src/FlowDuct.Core/Fluids/Gases/Coefficients/eos_{fluid.Replace('-', '_')}.csv"));
        s_points.Each(
            (x, y) =>
            {
                kernel.Residual(x, y, out HelmholtzSums sum);
                kernel.Ideal(y, out double ideal, out _, out _);
                double expected = rows.Where(row => row["part"] == "residual").Sum(row => Term(row, x, y));
                Assert.Equal(expected, sum.g, 1e-11 * (1 + Math.Abs(expected)));
                double expectedIdeal = rows.Where(row => row["part"] == "ideal").Sum(row => Term(row, x, y));
                Assert.Equal(expectedIdeal, ideal, 1e-12 * (1 + Math.Abs(expectedIdeal)));
            },
            300);
    }

    // Central differences of g, gx and gy; the error is the square of the step times what a power up to 30 and the bells make of it.
    [Theory]
    [InlineData("nitrogen")]
    [InlineData("carbon-dioxide")]
    [InlineData("air")]
    public void Derivatives_are_those_of_the_sums(string fluid)
    {
        HelmholtzEquation kernel = Equations.Of(fluid).Equation;
        s_points.Each(
            (x, y) =>
            {
                // At the critical point itself the second derivatives have no bound; beside it they change over the width of theta.
                double theta = Math.Max(Math.Abs(y - 1), 0.7 * Math.Pow(Math.Abs(x - 1), 10.0 / 3));
                if (theta < 1e-5) return;
                double step = Math.Clamp(1e-3 * theta, 1e-8, 1e-6), rounding = 1e-12 / step;
                kernel.Residual(x, y, out HelmholtzSums at);
                kernel.Residual(x * (1 - step), y, out HelmholtzSums thinner);
                kernel.Residual(x * (1 + step), y, out HelmholtzSums denser);
                kernel.Residual(x, y * (1 - step), out HelmholtzSums hotter);
                kernel.Residual(x, y * (1 + step), out HelmholtzSums colder);
                double scale = 1 + Math.Abs(at.g) + Math.Abs(at.gxx) + Math.Abs(at.gyy) + Math.Abs(at.gx) + Math.Abs(at.gxy);
                Near(at.gx, (denser.g - thinner.g) / (2 * step), "gx");
                Near(at.gy, (colder.g - hotter.g) / (2 * step), "gy");

                // x d(x g_x)/dx = x g_x + x^2 g_xx, and so for y.
                Near(at.gx + at.gxx, (denser.gx - thinner.gx) / (2 * step), "gxx");
                Near(at.gy + at.gyy, (colder.gy - hotter.gy) / (2 * step), "gyy");
                Near(at.gxy, (colder.gx - hotter.gx) / (2 * step), "gxy");
                kernel.ResidualByDensity(x, y, out double gx, out double gxx);
                Assert.Equal(at.gx, gx, 1e-12 * scale);
                Assert.Equal(at.gxx, gxx, 1e-12 * scale);

                void Near(double analytic, double numeric, string name) =>
                    Assert.True(Math.Abs(analytic - numeric) <= (2e-6 + rounding) * scale, $"{fluid} x={x:R} y={y:R} {name}: {analytic:R}, by differences {numeric:R}");
            },
            500);
    }

    [Theory]
    [InlineData("nitrogen")]
    [InlineData("carbon-dioxide")]
    [InlineData("air")]
    public void Derivatives_of_the_ideal_part_are_those_of_it(string fluid) => Gen.Double[0.07, 2].Select(y => (y, y)).Each(
        (y, _) =>
        {
            const double Step = 1e-5;
            HelmholtzEquation kernel = Equations.Of(fluid).Equation;
            kernel.Ideal(y, out _, out double gy, out double gyy);
            kernel.Ideal(y * (1 - Step), out double low, out double lowY, out _);
            kernel.Ideal(y * (1 + Step), out double high, out double highY, out _);
            Assert.Equal((high - low) / (2 * Step), gy, 1e-8 * (1 + Math.Abs(gy)));
            Assert.Equal((highY - lowY) / (2 * Step), gy + gyy, 1e-8 * (1 + Math.Abs(gyy)));
        },
        200);

    // The terms of the critical region have no bound there: every answer has to be a number all the same.
    [Theory]
    [InlineData(1, 1)]
    [InlineData(1, 1 + 1e-15)]
    [InlineData(1 + 1e-15, 1)]
    [InlineData(1, 0.999999)]
    [InlineData(1 - 1e-9, 1 + 1e-12)]
    [InlineData(1, 1.2)]
    public void The_critical_point_gives_numbers(double x, double y)
    {
        HelmholtzPoint at = Equations.Of("CO2").Equation.At(x * Equations.Of("CO2").Equation.rhoReducing, Equations.Of("CO2").Equation.Treducing / y);
        foreach (double value in (double[])[at.p, at.h, at.s, at.cv, at.prho, at.pT, at.w2]) Assert.True(double.IsFinite(value), $"{value}");
        Assert.True(at.cv > 0 || y > 1.1);
    }

    private static IReadOnlyDictionary<string, string> Row(string table, string fluid) =>
        ReferenceTable.Read(SourceTree.File($"src/FlowDuct.Core/Fluids/Gases/Coefficients/{table}.csv")).Single(row => row["fluid"] == fluid);

    private static double Term(IReadOnlyDictionary<string, string> row, double x, double y)
    {
        double n = Cell("n_or_a1"), t = Cell("t_or_b_or_theta"), d = Cell("d_or_beta"), l = Cell("l");
        double A = Cell("eta_or_A_or_c"), B = Cell("beta_or_B_or_d"), C = Cell("gamma_or_C"), D = Cell("epsilon_or_D"), a = Cell("a2_or_a"), z = (x - 1) * (x - 1);
        return (row["part"], row["type"]) switch
        {
            ("ideal", "lead") => n + (a * y),
            ("ideal", "log_tau") => n * Math.Log(y),
            (_, "power") => n * (row["part"] == "ideal" ? 1 : Math.Pow(x, d)) * Math.Pow(y, t),
            (_, "planck_einstein") => n * Math.Log(1 - Math.Exp(-t * y)),
            (_, "planck_einstein_general") => n * Math.Log(A + (B * Math.Exp(t * y))),
            (_, "power_exp") => n * Math.Pow(x, d) * Math.Pow(y, t) * Math.Exp(-Math.Pow(x, l)),
            (_, "gaussian") => n * Math.Pow(x, d) * Math.Pow(y, t) * Math.Exp((-A * (x - D) * (x - D)) - (B * (y - C) * (y - C))),
            _ => n * x * Math.Exp((-C * z) - (D * (y - 1) * (y - 1))) * Math.Pow(Math.Pow(1 - y + (A * Math.Pow(z, 1 / (2 * d))), 2) + (B * Math.Pow(z, a)), t),
        };

        double Cell(string column) => row[column].Length == 0 ? 0 : Equations.Number(row[column]);
    }
}
