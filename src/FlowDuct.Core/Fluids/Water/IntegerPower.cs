namespace FlowDuct.Fluids.Water;

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
