using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>
/// The rate of turning along the isentrope s of the total enthalpy h0: d(nu) = sqrt(M^2 - 1) dV/V with V dV = -v dp, in the variable
/// t = sqrt(L - ln p). Where ln p = L is the sonic point the rate is smooth there, because M^2 - 1 grows as t^2.
/// </summary>
internal readonly struct TurningRate(Fluid fluid, double h0, double s, double L)
{
    /// <summary>ln p of the sonic point: from M^2 - 1 at a state, exact to the first order near M = 1.</summary>
    /// <remarks>d(V^2 - w^2)/d(ln p) = -2 p v G with G = 1 + (w/v)(dw/dp), here (k + 1)/2 with k = w^2/(p v).</remarks>
    internal static double SonicLogarithm(double h0, in FluidState at)
    {
        double w2 = at.w * at.w, excess = (2 * (h0 - at.h)) - w2, pv = at.p * at.v;
        return Math.Log(at.p) + Math.Max(0, excess / (w2 + pv));
    }

    /// <summary>The variable at a pressure, Pa.</summary>
    internal double Variable(double p) => Math.Sqrt(Math.Max(0, L - Math.Log(p)));

    /// <summary>The integral from a to b of the variable, rad, by one rule of <see cref="GaussLegendre"/>.</summary>
    internal bool TryPanel(double a, double b, out double sum)
    {
        sum = 0;
        double middle = (a + b) / 2, half = (b - a) / 2;
        for (int i = 0; i < GaussLegendre.Points; i++)
        {
            if (!TryRate(middle + (half * GaussLegendre.Nodes[i]), out double rate)) return false;
            sum += half * GaussLegendre.Weights[i] * rate;
        }

        return true;
    }

    private bool TryRate(double t, out double rate)
    {
        double p = Math.Exp(L - (t * t));
        bool found = fluid.FromPS(p, s, default, out FluidState at) == Outcome.Ok;
        double V2 = 2 * (h0 - at.h), slip = (V2 / (at.w * at.w)) - 1;
        rate = found && slip > 0 ? Math.Sqrt(slip) * p * at.v / V2 * 2 * t : 0;
        return found && slip > -PrandtlMeyer.SonicRounding;
    }
}
