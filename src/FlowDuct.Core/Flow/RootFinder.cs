namespace FlowDuct.Flow;

/// <summary>A bracketed root of a continuous function by inverse quadratic interpolation that falls back to bisection.</summary>
/// <remarks>T. R. Chandrupatla, Advances in Engineering Software 28 (1997) 145-149 (method from memory; written anew here).</remarks>
internal static class RootFinder
{
    // A double holds 53 bits; bisection alone exhausts any bracket of positive numbers in fewer steps than this.
    private const int MostSteps = 200;

    // Two units in the last place of x: the finest bracket that still has a middle.
    private const double RelativeTolerance = 4.5e-16;

    /// <summary>Finds x between a and b, where f changes sign, to the last bits of x.</summary>
    /// <returns>The end of the final bracket at which f is smaller in size.</returns>
    internal static double Find(Func<double, double> f, double a, double b, double fa, double fb)
    {
        var function = new ByDelegate(f);
        return Find(ref function, a, b, fa, fb);
    }

    /// <summary>The same for a function in a struct: no allocation. A value of f as small as <paramref name="enough"/> is a root.</summary>
    /// <returns>The end of the final bracket at which f is smaller in size.</returns>
    internal static double Find<TFunction>(ref TFunction f, double a, double b, double fa, double fb, double enough = 0)
        where TFunction : struct, IScalarFunction
    {
        if (fa == 0) return a;
        double c = a, fc = fa, t = 0.5;
        double best = Math.Abs(fa) < Math.Abs(fb) ? a : b;
        for (int step = 0; step < MostSteps; step++)
        {
            double x = a + (t * (b - a));
            double fx = f.At(x);
            if (Math.Sign(fx) == Math.Sign(fa)) (c, fc) = (a, fa);
            else (c, fc, b, fb) = (b, fb, a, fa);
            (a, fa) = (x, fx);
            best = Math.Abs(fa) < Math.Abs(fb) ? a : b;
            double least = RelativeTolerance * Math.Abs(best) / Math.Abs(b - a);
            if (least > 0.5 || Math.Abs(fx) <= enough || a == b) break;
            t = Math.Clamp(Fraction(a, b, c, fa, fb, fc), least, 1 - least);
        }

        return best;
    }

    private static double Fraction(double a, double b, double c, double fa, double fb, double fc)
    {
        double xi = (a - b) / (c - b);
        double phi = (fa - fb) / (fc - fb);
        bool smooth = 1 - Math.Sqrt(1 - xi) < phi && phi < Math.Sqrt(xi);
        if (!smooth) return 0.5;
        return (fa / (fb - fa) * fc / (fb - fc)) + ((c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb));
    }

    private readonly struct ByDelegate(Func<double, double> f) : IScalarFunction
    {
        public double At(double x) => f(x);
    }
}
