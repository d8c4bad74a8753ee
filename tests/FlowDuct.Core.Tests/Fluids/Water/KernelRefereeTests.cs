using System.Globalization;
using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>The straight-line kernels against a readable loop over the same tables: the loop is the referee.</summary>
public class KernelRefereeTests
{
    private const int Samples = 1000;

    // Cancelling terms in another order: the difference is measured against the sum of the sizes of the terms.
    private const double Rounding = 2e-14;

    private delegate double[] Kernel(double x, double y);

    // Table, kernel, range of x, range of y, and what x is raised to (4 where the kernel takes the fourth root).
    private static readonly Dictionary<string, (Kernel Kernel, double XLow, double XHigh, double YLow, double YHigh)> s_kernels = new()
    {
        ["region1"] = (Sums(Region1Kernel.Sums), 1.05, 7.1, 1.0, 3.85),
        ["region1, search"] = (Search(Region1Kernel.Search), 1.05, 7.1, 1.0, 3.85),
        ["region2_residual"] = (Sums(Region2Kernel.Sums), 1e-4, 100, 0.003, 1.48),
        ["region2_residual, search"] = (Search(Region2Kernel.Search), 1e-4, 100, 0.003, 1.48),
        ["region2_ideal"] = (Ideal(Region2Kernel.Ideal), 1, 2, 0.5, 2),
        ["region2_metastable_residual"] = (Sums(MetastableKernel.Sums), 1e-3, 10, 0.4, 1.6),
        ["region2_metastable_ideal"] = (Ideal(MetastableKernel.Ideal), 1, 2, 0.9, 2),
        ["region3"] = (Sums(Region3Kernel.Sums), 0.3, 2.4, 0.74, 1.04),
        ["region3, density"] = (Density(Region3Kernel.Search), 0.3, 2.4, 0.74, 1.04),
        ["region5_residual"] = (Sums(Region5Kernel.Sums), 1e-4, 50, 0.44, 0.94),
        ["region5_ideal"] = (Ideal(Region5Kernel.Ideal), 1, 2, 0.44, 0.94),
        ["region1_T_ph"] = (One(BackwardKernels.Region1Tph), 1e-3, 100, 1, 1.67),
        ["region1_T_ps"] = (One(BackwardKernels.Region1Tps), 1e-3, 100, 2, 5.8),
        ["region2a_T_ph"] = (One(BackwardKernels.Region2aTph), 1e-3, 4, -0.9, 0.2),
        ["region2b_T_ph"] = (One(BackwardKernels.Region2bTph), 2, 60, -1.3, -0.5),
        ["region2c_T_ph"] = (One(BackwardKernels.Region2cTph), 31, 125, -0.6, -0.2),
        ["region2a_T_ps, root"] = (One(BackwardKernels.Region2aTps), 0.16, 1.4142, 0.9, 4),
        ["region2b_T_ps"] = (One(BackwardKernels.Region2bTps), 4, 100, -1.5, 2.5),
        ["region2c_T_ps"] = (One(BackwardKernels.Region2cTps), 6, 100, 0.05, 0.3),
        ["region3a_T_ph"] = (One(BackwardKernels.Region3aTph), 0.4, 1.24, 0.05, 0.3),
        ["region3b_T_ph"] = (One(BackwardKernels.Region3bTph), 0.46, 1.3, 0.02, 0.3),
        ["region3a_v_ph"] = (One(BackwardKernels.Region3aVph), 0.29, 1.13, 0.03, 0.3),
        ["region3b_v_ph"] = (One(BackwardKernels.Region3bVph), 0.23, 1.07, 0.02, 0.3),
        ["region3a_T_ps"] = (One(BackwardKernels.Region3aTps), 0.4, 1.24, 0.05, 0.3),
        ["region3b_T_ps"] = (One(BackwardKernels.Region3bTps), 0.92, 1.76, 0.01, 0.2),
        ["region3a_v_ps"] = (One(BackwardKernels.Region3aVps), 0.35, 1.19, 0.02, 0.25),
        ["region3b_v_ps"] = (One(BackwardKernels.Region3bVps), 0.46, 1.3, 0.02, 0.2),
    };

    public static TheoryData<string> Names { get; } = [.. s_kernels.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_kernel_adds_up_as_its_table_does(string name)
    {
        List<Row> rows = Table(name);
        (Kernel kernel, double xLow, double xHigh, double yLow, double yHigh) = s_kernels[name];
        Gen.Select(Gen.Double[xLow, xHigh], Gen.Double[yLow, yHigh]).Each((x, y) => Compare(name, rows, x, y, kernel(x, y)), Samples);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_coefficient_moved_in_its_ninth_digit_is_noticed(string name)
    {
        List<Row> rows = Table(name);
        (Kernel kernel, double xLow, double xHigh, double yLow, double yHigh) = s_kernels[name];
        double x = (xLow + xHigh) / 2, y = (yLow + yHigh) / 2;
        int largest = Enumerable.Range(0, rows.Count).MaxBy(i => Math.Abs(Term(rows[i], x, y) * Factors(name, kernel(x, y).Length)[0](rows[i])));
        rows[largest] = rows[largest] with { N = rows[largest].N * (1 + 1e-9) };
        (double sum, double size) = Sum(rows, x, y, Factors(name, kernel(x, y).Length)[0]);
        Assert.True(Math.Abs(kernel(x, y)[0] - sum) > Rounding * size);
    }

    [Fact]
    public void Every_table_that_has_a_kernel_is_refereed() => Assert.Equal(
        Directory.GetFiles(Path.GetDirectoryName(PathOf("region1"))!, "region*.csv").Select(file => Path.GetFileNameWithoutExtension(file))
            .Where(name => name is not "region4" && !name.EndsWith("_hs", StringComparison.Ordinal) && !name.StartsWith("region3_", StringComparison.Ordinal)).Order(),
        s_kernels.Keys.Select(TableOf).Distinct().Order());

    private static void Compare(string name, List<Row> rows, double x, double y, double[] kernel)
    {
        Func<Row, double>[] factors = Factors(name, kernel.Length);
        for (int k = 0; k < factors.Length; k++)
        {
            (double sum, double size) = Sum(rows, x, y, factors[k]);
            Assert.True(Math.Abs(kernel[k] - sum) <= Rounding * size, $"sum {k} at x = {x:R}, y = {y:R}: loop {sum:R}, kernel {kernel[k]:R}");
        }
    }

    // What each sum multiplies its terms by: the value, then the scaled derivatives.
    private static Func<Row, double>[] Factors(string name, int count) => count switch
    {
        1 => [_ => 1],
        2 => [row => row.I, row => row.I * (row.I - 1)],
        3 => [_ => 1, row => row.J, row => row.J * (row.J - 1)],
        6 => [_ => 1, row => row.I, row => row.I * (row.I - 1), row => row.J, row => row.J * (row.J - 1), row => row.I * row.J],
        _ => throw new ArgumentOutOfRangeException(nameof(count), count, name),
    };

    private static (double Sum, double Size) Sum(List<Row> rows, double x, double y, Func<Row, double> factor)
    {
        double sum = 0, size = 0;
        foreach (Row row in rows)
        {
            double term = Term(row, x, y) * factor(row);
            sum += term;
            size += Math.Abs(term);
        }

        return (sum, size);
    }

    private static double Term(Row row, double x, double y) => row.N * Math.Pow(x, row.I) * Math.Pow(y, row.J);

    private static List<Row> Table(string name)
    {
        double root = name.EndsWith("root", StringComparison.Ordinal) ? 4 : 1;

        // The first row of region 3 multiplies a logarithm and stands outside the kernel.
        int skip = TableOf(name) == "region3" ? 1 : 0;
        return
        [
            .. ReferenceTable.Read(PathOf(TableOf(name))).Skip(skip).Select(row => new Row(root * Number(row, "I"), Number(row, "J"), Number(row, "n"))),
        ];
    }

    private static string TableOf(string name) => name.Split(',')[0];

    private static string PathOf(string table) => SourceTree.File("src/FlowDuct.Core/Fluids/Water/Coefficients/" + table + ".csv");

    private static double Number(IReadOnlyDictionary<string, string> row, string column) =>
        row.TryGetValue(column, out string? text) ? double.Parse(text, CultureInfo.InvariantCulture) : 0;

    private delegate void SumsCall(double x, double y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);

    private delegate void SearchCall(double x, double y, out double g, out double gy, out double gyy);

    private delegate void DensityCall(double x, double y, out double gx, out double gxx);

    private delegate void IdealCall(double y, out double g, out double gy, out double gyy);

    private static Kernel Sums(SumsCall call) => (x, y) =>
    {
        call(x, y, out double g, out double gx, out double gxx, out double gy, out double gyy, out double gxy);
        return [g, gx, gxx, gy, gyy, gxy];
    };

    private static Kernel Search(SearchCall call) => (x, y) =>
    {
        call(x, y, out double g, out double gy, out double gyy);
        return [g, gy, gyy];
    };

    private static Kernel Density(DensityCall call) => (x, y) =>
    {
        call(x, y, out double gx, out double gxx);
        return [gx, gxx];
    };

    private static Kernel Ideal(IdealCall call) => (_, y) =>
    {
        call(y, out double g, out double gy, out double gyy);
        return [g, gy, gyy];
    };

    private static Kernel One(Func<double, double, double> call) => (x, y) => [call(x, y)];

    private sealed record Row(double I, double J, double N);
}
