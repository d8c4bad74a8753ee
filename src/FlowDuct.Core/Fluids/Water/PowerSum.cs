using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace FlowDuct.Fluids.Water;

/// <summary>The sum n x^I y^J that every backward equation of the supplementary releases is made of.</summary>
/// <remarks>Whole powers from -12 to 36 cover all their tables; two tables of powers cost less than a power per row.</remarks>
internal static class PowerSum
{
    private const int Zero = 12;

    // Fours of powers: -12 to 39.
    private const int Length = 52;

    internal static double Of(double x, double y, ReadOnlySpan<sbyte> I, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n)
    {
        Span<double> xs = stackalloc double[Length], ys = stackalloc double[Length];
        Fill(xs, x);
        Fill(ys, y);

        // Two sums, so that an addition need not wait for the one before.
        double even = 0, odd = 0;
        int i = 0;
        for (; i + 1 < n.Length; i += 2)
        {
            even += n[i] * xs[I[i] + Zero] * ys[J[i] + Zero];
            odd += n[i + 1] * xs[I[i + 1] + Zero] * ys[J[i + 1] + Zero];
        }

        return i < n.Length ? even + odd + (n[i] * xs[I[i] + Zero] * ys[J[i] + Zero]) : even + odd;
    }

    /// <summary>The sum n x^i over i = 0, 1, 2 and so on.</summary>
    internal static double Of(double x, ReadOnlySpan<double> n)
    {
        double sum = n[^1];
        for (int i = n.Length - 2; i >= 0; i--) sum = (sum * x) + n[i];
        return sum;
    }

    private static void Fill(Span<double> powers, double x)
    {
        Span<Vector256<double>> fours = MemoryMarshal.Cast<double, Vector256<double>>(powers);
        double x2 = x * x, y = 1 / x, y2 = y * y;
        Vector256<double> up = Vector256.Create(x2 * x2), down = Vector256.Create(y2 * y2);
        Vector256<double> four = fours[3] = Vector256.Create(1, x, x2, x2 * x);
        for (int k = 4; k < fours.Length; k++) fours[k] = four *= up;
        four = fours[2] = Vector256.Create(y2 * y2, y2 * y, y2, y);
        for (int k = 1; k >= 0; k--) fours[k] = four *= down;
    }
}
