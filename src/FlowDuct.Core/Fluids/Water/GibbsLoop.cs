namespace FlowDuct.Fluids.Water;

/// <summary>A short Gibbs equation of ideal and residual part, walked row by row: region 5 and the metastable vapour.</summary>
internal static class GibbsLoop
{
    /// <summary>State from p and T with pi = p/MPa, tau, and y = tau - shift in the residual part.</summary>
    internal static RegionState State(
        double p, double T, double tau, double shift, ReadOnlySpan<sbyte> idealJ, ReadOnlySpan<double> idealN,
        ReadOnlySpan<sbyte> I, ReadOnlySpan<sbyte> J, ReadOnlySpan<double> n)
    {
        double pi = p * 1e-6, y = tau - shift, g = 0, gx = 0, gxx = 0, gy = 0, gyy = 0, gxy = 0;
        for (int i = 0; i < n.Length; i++)
        {
            double term = n[i] * IntegerPower.Of(pi, I[i]) * IntegerPower.Of(y, J[i]);
            g += term;
            gx += I[i] * term;
            gxx += I[i] * (I[i] - 1) * term;
            gy += J[i] * term;
            gyy += J[i] * (J[i] - 1) * term;
            gxy += I[i] * J[i] * term;
        }

        IdealPart.Sums(tau, idealJ, idealN, out double ideal, out double it, out double itt);
        double ty = tau / y;
        return RegionState.FromGibbs(p, T, Math.Log(pi) + ideal + g, 1 + gx, gxx - 1, it + (ty * gy), itt + (ty * ty * gyy), ty * gxy);
    }
}
