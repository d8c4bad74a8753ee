namespace FlowDuct.Fluids.Water;

/// <summary>The ideal-gas sum of a Gibbs equation, without its ln(pi): sum n tau^J and its scaled derivatives.</summary>
internal static class IdealPart
{
    internal static void Sums(double tau, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n, out double g, out double gt, out double gtt)
    {
        g = gt = gtt = 0;
        for (int i = 0; i < n.Length; i++)
        {
            double term = n[i] * IntegerPower.Of(tau, J[i]);
            g += term;
            gt += J[i] * term;
            gtt += J[i] * (J[i] - 1) * term;
        }
    }
}

/// <summary>Whole powers by squaring: exact to the last bits and the same on every platform.</summary>
internal static class IntegerPower
{
    internal static double Of(double x, int power)
    {
        if (power < 0) return 1 / Of(x, -power);
        double result = 1;
        for (int rest = power; rest > 0; rest >>= 1)
        {
            if ((rest & 1) != 0) result *= x;
            x *= x;
        }

        return result;
    }
}
