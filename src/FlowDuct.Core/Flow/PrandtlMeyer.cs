using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>How far a supersonic stream turns in a fan without loss (Prandtl and Meyer), on any equation of state.</summary>
/// <remarks>
/// nu = integral of sqrt(M^2 - 1) dV/V along the isentrope at constant total enthalpy; for constant heat capacity NACA Report 1135,
/// 1953, section on Prandtl-Meyer expansions. Where the isentrope meets the saturation line w falls by a step (equilibrium), and
/// the integral is split there: the step itself turns nothing.
/// </remarks>
internal static class PrandtlMeyer
{
    /// <summary>M^2 - 1 of a sonic state as the inverses leave it.</summary>
    internal const double SonicRounding = 1e-9;

    // A panel is halved until both ways agree to this, rad; a step of the equation of state stops at the depth, 1/4096 of the path.
    // The first halving proves nothing: where a fit of cp has a joint, whole and halves may agree by chance.
    private const double Agreement = 1e-12;
    private const int MostHalvings = 12;

    // Either side of the saturation line: far above the closure of the inverses, and 1e-10 rad at most.
    private const double WetSide = 1 - 1e-11;

    // A fan to an unknown pressure is walked in steps of this ratio; below the last one the range has ended.
    private const double Stride = 0.5;
    private const double LeastStride = 1 - 1e-9;

    /// <summary>The angle, rad, by which the stream turns from p1 to p2, Pa: above zero where it expands.</summary>
    /// <returns>False where the stream is not supersonic (or sonic) all the way, or leaves the range of the fluid.</returns>
    internal static bool TryTurning(Fluid fluid, double h0, double s, double p1, double p2, out double nu)
    {
        if (p2 > p1) return Negated(TryTurning(fluid, h0, s, p2, p1, out nu), ref nu);
        bool meets = fluid.TrySaturationOnIsentrope(s, out FluidState edge) && edge.p > p2;
        return meets ? TryAcross(fluid, h0, s, p1, edge.p, p2, out nu) : TrySmooth(fluid, h0, s, p1, p2, out nu);
    }

    // A stream that is choked at the saturation line is supersonic on the wet side only, so a start on the line counts as wet.
    private static bool TryAcross(Fluid fluid, double h0, double s, double p1, double edge, double p2, out double nu)
    {
        double wet = Math.Max(edge * WetSide, p2), above = 0;
        bool found = p1 * WetSide <= edge || TrySmooth(fluid, h0, s, p1, edge, out above);
        found &= TrySmooth(fluid, h0, s, Math.Min(p1, wet), p2, out nu);
        nu += above;
        return found;
    }

    /// <summary>The pressure, Pa, to which a stream at p1 expands when it turns by nu, rad, zero or more.</summary>
    /// <returns>False too where the fluid's range ends before that angle.</returns>
    internal static bool TryPressure(Fluid fluid, double h0, double s, double p1, double nu, out double p2)
    {
        p2 = p1;
        if (!(nu >= 0) || !TryTurning(fluid, h0, s, p1, p1, out _)) return false;
        double stride = Stride, left = nu;
        while (left > 0)
        {
            bool reached = TryTurning(fluid, h0, s, p2, p2 * stride, out double step);
            if (reached && step >= left) return Solve(fluid, h0, s, left, step, stride, ref p2);
            if (reached) (p2, left) = (p2 * stride, left - step);
            else stride = Math.Sqrt(stride);
            if (stride > LeastStride) return false;
        }

        return true;
    }

    private static bool Solve(Fluid fluid, double h0, double s, double left, double step, double stride, ref double p2)
    {
        var excess = new TurningExcess(fluid, h0, s, p2, left);
        double fall = RootFinder.Find(ref excess, 0, -Math.Log(stride), -left, step - left);
        p2 *= Math.Exp(-fall);
        return true;
    }

    // Between two pressures on one side of the saturation line; M rises as the pressure falls, so the ends tell for the path.
    private static bool TrySmooth(Fluid fluid, double h0, double s, double high, double low, out double nu)
    {
        nu = 0;
        if (!(low > 0) || fluid.FromPS(high, s, default, out FluidState top) != Outcome.Ok || !IsSupersonic(h0, top)) return false;
        if (low == high) return true;
        var rate = new TurningRate(fluid, h0, s, TurningRate.SonicLogarithm(h0, top));
        double a = rate.Variable(high), b = rate.Variable(low);
        return rate.TryPanel(a, b, out double whole) && TryHalves(rate, a, b, whole, MostHalvings, out nu)
            && fluid.FromPS(low, s, default, out _) == Outcome.Ok;
    }

    private static bool TryHalves(in TurningRate rate, double a, double b, double whole, int depth, out double nu)
    {
        double middle = (a + b) / 2;
        bool found = rate.TryPanel(a, middle, out double left) & rate.TryPanel(middle, b, out double right);
        nu = left + right;
        if (!found || depth == 0 || (depth < MostHalvings && Math.Abs(nu - whole) <= Agreement)) return found;
        found = TryHalves(rate, a, middle, left, depth - 1, out left) & TryHalves(rate, middle, b, right, depth - 1, out right);
        nu = left + right;
        return found;
    }

    private static bool IsSupersonic(double h0, in FluidState at) => 2 * (h0 - at.h) > at.w * at.w * (1 - SonicRounding);

    private static bool Negated(bool found, ref double nu)
    {
        nu = -nu;
        return found;
    }
}
