namespace FlowDuct.Fluids.Gases;

/// <summary>The sum of n theta^t of an auxiliary equation along saturation, theta = 1 - T/Tc.</summary>
internal sealed class PowerLine(double[] n, double[] t)
{
    /// <summary>The sum at theta, from 0 to 1.</summary>
    internal double At(double theta)
    {
        double sum = 0, root = Math.Sqrt(theta);
        for (int i = 0; i < n.Length; i++) sum += n[i] * Power(theta, root, t[i]);
        return sum;
    }

    /// <summary>The sum of n t theta^(t - 1) at theta above 0.</summary>
    internal double Slope(double theta)
    {
        double sum = 0, root = Math.Sqrt(theta);
        for (int i = 0; i < n.Length; i++) sum += n[i] * t[i] * Power(theta, root, t[i]);
        return sum / theta;
    }

    // Pressures have whole powers and halves only.
    private static double Power(double theta, double root, double t)
    {
        double rest = t - Math.Floor(t);
        if (rest is not (0 or 0.5)) return Math.Pow(theta, t);
        double power = rest == 0 ? 1 : root;
        for (int i = 1; i <= t; i++) power *= theta;
        return power;
    }
}
