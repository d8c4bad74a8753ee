namespace FlowDuct.Fluids.Gases;

/// <summary>A state from p and density: at constant density the pressure of one phase rises with T, so Newton inside a bracket.</summary>
internal static class HelmholtzPressureDensity
{
    private const int MostSteps = 100;

    // What a pressure may pass an end of the range by: rounding, in a liquid many times that of the pressure itself.
    private const double EndRounding = 1e-12;

    internal static Outcome Solve(PhaseBoundary boundary, double p, double rho, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        Outcome outcome = HelmholtzRange.OfPressure(of, p);
        if (outcome != Outcome.Ok) return outcome;
        if (!(rho > 0)) return Outcome.PairTooHigh;
        if (!double.IsFinite(rho)) return Outcome.PairTooLow;
        (double low, double high) = (HelmholtzRange.LeastTemperature(of, p), of.Parameters.Tmost);
        if (p < boundary.pLeast || p >= boundary.pc) return Between(boundary, p, rho, PhaseSide.OnePhase, low, high, out state);
        if (!boundary.TryAtPressure(p, out HelmholtzPair pair)) return Outcome.NotConverged;
        if (rho > pair.Liquid.rho) return Between(boundary, p, rho, PhaseSide.Liquid, low, pair.Liquid.T, out state);
        if (rho < pair.Vapour.rho) return Between(boundary, p, rho, PhaseSide.Vapour, pair.Vapour.T, high, out state);
        double x = ((1 / rho) - pair.Liquid.v) / (pair.Vapour.v - pair.Liquid.v);
        if (x is > 0 and < 1 && !boundary.IsPure) return Outcome.BetweenPhases;
        state = HelmholtzState.Saturated(boundary, pair, double.IsNaN(x) ? 1 : Math.Clamp(x, 0, 1));
        return Outcome.Ok;
    }

    private static Outcome Between(PhaseBoundary boundary, double p, double rho, PhaseSide side, double low, double high, out FluidState state)
    {
        HelmholtzEquation of = boundary.Equation;
        HelmholtzPoint bottom = of.At(rho, low), top = of.At(rho, high);
        if (bottom.p >= p) return End(boundary, p, bottom, side, Outcome.PairTooLow, out state);
        if (top.p <= p) return End(boundary, p, top, side, Outcome.PairTooHigh, out state);
        double T = low + ((high - low) * (p - bottom.p) / (top.p - bottom.p));
        HelmholtzPoint at = bottom;
        for (int i = 0; i < MostSteps; i++)
        {
            at = of.At(rho, T);
            if (at.p > p) high = T;
            else low = T;
            double next = T - ((at.p - p) / at.pT);
            if (!(next > low && next < high)) next = (low + high) / 2;
            if (Math.Abs(next - T) <= 2e-16 * T) break;
            T = next;
        }

        state = HelmholtzState.Of(boundary, p, at, side);
        return Outcome.Ok;
    }

    // Of a pressure that differs from the given one by rounding.
    private static Outcome End(PhaseBoundary boundary, double p, in HelmholtzPoint at, PhaseSide side, Outcome otherwise, out FluidState state)
    {
        bool within = Math.Abs(at.p - p) <= EndRounding * Math.Max(p, at.rho * at.prho);
        state = within ? HelmholtzState.Of(boundary, p, at, side) : default;
        return within ? Outcome.Ok : otherwise;
    }
}
