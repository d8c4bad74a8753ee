namespace FlowDuct.Fluids.Water;

/// <summary>The sum n x^I y^J that every backward equation of the supplementary releases is made of.</summary>
/// <remarks>Whole powers from -12 to 36 cover all their tables; two tables of powers cost less than a power per row.</remarks>
internal static class PowerSum
{
    private const int Least = -12;
    private const int Most = 36;

    internal static double Of(double x, double y, ReadOnlySpan<sbyte> I, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n)
    {
        Span<double> xs = stackalloc double[Most - Least + 1], ys = stackalloc double[Most - Least + 1];
        Fill(xs, x);
        Fill(ys, y);
        double sum = 0;
        for (int i = 0; i < n.Length && i < I.Length && i < J.Length; i++) sum += n[i] * xs[I[i] - Least] * ys[J[i] - Least];
        return sum;
    }

    /// <summary>The same for one variable.</summary>
    internal static double Of(double x, ReadOnlySpan<double> n)
    {
        double sum = n[^1];
        for (int i = n.Length - 2; i >= 0; i--) sum = (sum * x) + n[i];
        return sum;
    }

    // Strides of two keep two chains of products going at once.
    private static void Fill(Span<double> powers, double x)
    {
        double inverse = 1 / x, up = x * x, down = inverse * inverse;
        powers[-Least - 1] = inverse;
        powers[-Least] = 1;
        powers[1 - Least] = x;
        for (int k = 2 - Least; k < powers.Length; k++) powers[k] = powers[k - 2] * up;
        for (int k = -Least - 2; k >= 0; k--) powers[k] = powers[k + 2] * down;
    }
}
