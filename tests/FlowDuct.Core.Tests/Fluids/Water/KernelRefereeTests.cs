using System.Globalization;
using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>The straight-line kernels against a readable loop over the same tables: the loop is the referee.</summary>
public class KernelRefereeTests
{
    private const int Samples = 2000;

    // A sum of cancelling terms in another order: the difference is measured against the sum of the terms' sizes.
    private const double Rounding = 1e-14;

    [Fact]
    public void Region_1_adds_up_as_its_table_does()
    {
        List<Row> rows = Table("region1");
        Gen.Select(Gen.Double[1e-3, 100], Gen.Double[273.15, 623.15]).Each((p, T) =>
        {
            double x = 7.1 - (p / 16.53), y = (1386 / T) - 1.222;
            Region1Kernel.Sums(x, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
            Compare(rows, x, y, [g, gx, gxx, gy, gyy, gxy]);
        }, Samples);
    }

    [Fact]
    public void Region_2_adds_up_as_its_table_does()
    {
        List<Row> rows = Table("region2_residual");
        Gen.Select(Gen.Double[1e-4, 100], Gen.Double[273.15, 1073.15]).Each((x, T) =>
        {
            double y = (540 / T) - 0.5;
            Region2Kernel.Sums(x, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
            Compare(rows, x, y, [g, gx, gxx, gy, gyy, gxy]);
        }, Samples);
    }

    [Fact]
    public void A_coefficient_moved_in_its_ninth_digit_is_noticed()
    {
        List<Row> rows = Table("region1");
        rows[0] = rows[0] with { N = rows[0].N * (1 + 1e-9) };
        Region1Kernel.Sums(5, 1, out double g, out _, out _, out _, out _, out _);
        (double sum, double size) = Sum(rows, 5, 1, _ => 1);
        Assert.True(Math.Abs(g - sum) > Rounding * size);
    }

    private static void Compare(List<Row> rows, double x, double y, double[] kernel)
    {
        Func<Row, double>[] factors =
        [
            _ => 1, row => row.I, row => row.I * (row.I - 1), row => row.J, row => row.J * (row.J - 1), row => row.I * row.J,
        ];
        for (int k = 0; k < factors.Length; k++)
        {
            (double sum, double size) = Sum(rows, x, y, factors[k]);
            Assert.True(Math.Abs(kernel[k] - sum) <= Rounding * size, $"sum {k} at x = {x:R}, y = {y:R}: loop {sum:R}, kernel {kernel[k]:R}");
        }
    }

    private static (double Sum, double Size) Sum(List<Row> rows, double x, double y, Func<Row, double> factor)
    {
        double sum = 0, size = 0;
        foreach (Row row in rows)
        {
            double term = row.N * Math.Pow(x, row.I) * Math.Pow(y, row.J) * factor(row);
            sum += term;
            size += Math.Abs(term);
        }

        return (sum, size);
    }

    private static List<Row> Table(string name) =>
    [
        .. ReferenceTable.Read(SourceTree.File("src/FlowDuct.Core/Fluids/Water/Coefficients/" + name + ".csv"))
            .Select(row => new Row(Number(row["I"]), Number(row["J"]), Number(row["n"]))),
    ];

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    private sealed record Row(double I, double J, double N);
}
