namespace FlowDuct.Flow;

/// <summary>Nodes and weights of Gauss-Legendre quadrature with 16 points on -1 to 1; exact for polynomials up to degree 31.</summary>
/// <remarks>
/// M. Abramowitz and I. A. Stegun, Handbook of Mathematical Functions, 1964, Eq. (25.4.29): the roots of the Legendre polynomial,
/// found here by Newton's method from Bonnet's recursion; check: Table 25.4.
/// </remarks>
internal static class GaussLegendre
{
    /// <summary>How many points.</summary>
    internal const int Points = 16;

    private static readonly double[] s_nodes = Compute(out s_weights);
    private static readonly double[] s_weights;

    /// <summary>Nodes from the greatest to the least.</summary>
    internal static ReadOnlySpan<double> Nodes => s_nodes;

    /// <summary>Weights in the order of the nodes; their sum is 2.</summary>
    internal static ReadOnlySpan<double> Weights => s_weights;

    private static double[] Compute(out double[] weights)
    {
        double[] nodes = new double[Points];
        weights = new double[Points];
        for (int i = 0; i < Points; i++)
        {
            double x = Math.Cos(Math.PI * (i + 0.75) / (Points + 0.5)), slope = 1;
            for (int step = 0; step < 8; step++) x -= Polynomial(x, out slope) / slope;
            (nodes[i], weights[i]) = (x, 2 / ((1 - (x * x)) * slope * slope));
        }

        return nodes;
    }

    // Bonnet's recursion n P(n) = (2n - 1) x P(n-1) - (n - 1) P(n-2).
    private static double Polynomial(double x, out double slope)
    {
        (double before, double now) = (1, x);
        for (int n = 2; n <= Points; n++) (before, now) = (now, ((((2 * n) - 1) * x * now) - ((n - 1) * before)) / n);
        slope = Points * ((x * now) - before) / ((x * x) - 1);
        return now;
    }
}
