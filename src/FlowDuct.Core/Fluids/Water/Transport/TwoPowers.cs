namespace FlowDuct.Fluids.Water;

/// <summary>A short sum of n x^I y^J, walked row by row.</summary>
internal static class TwoPowers
{
    internal static double Sum(double x, double y, ReadOnlySpan<sbyte> I, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n)
    {
        double sum = 0;
        for (int i = 0; i < n.Length; i++) sum += n[i] * IntegerPower.Of(x, I[i]) * IntegerPower.Of(y, J[i]);
        return sum;
    }
}
