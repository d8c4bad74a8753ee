namespace FlowDuct.Fluids.Gases;

/// <summary>A state from p and density: at constant density the pressure of one phase rises with T, so Newton inside a bracket.</summary>
internal static class HelmholtzPressureDensity
{
    private const int MostSteps = 100;

    // What a density may pass an end of the range by: rounding.
    private const double EndRounding = 1e-12;

    // What a density may differ by from that of a line of air at the same pressure.
    private const double EdgeRounding = 1e-11;

    internal static Outcome Solve(PhaseBoundary boundary, double p, double rho, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        Outcome outcome = HelmholtzRange.OfPressure(of, p);
        if (outcome != Outcome.Ok) return outcome;
        if (!(rho > 0)) return Outcome.PairTooHigh;
        if (!double.IsFinite(rho)) return Outcome.PairTooLow;
        (double low, double high) = (HelmholtzRange.LeastTemperature(of, p), of.Parameters.Tmost);
        if (p >= boundary.pc) return BesideCritical(boundary, p, rho, low, high, out state);
        if (p < boundary.pLeast) return Between(boundary, p, rho, PhaseSide.Vapour, low, high, out state);
        if (!boundary.TryAtPressure(p, out HelmholtzPair pair)) return Outcome.NotConverged;
        if (rho > pair.Liquid.rho) return Between(boundary, p, rho, PhaseSide.Liquid, low, pair.Liquid.T, out state);
        if (rho < pair.Vapour.rho) return Between(boundary, p, rho, PhaseSide.Vapour, pair.Vapour.T, high, out state);
        double x = ((1 / rho) - pair.Liquid.v) / (pair.Vapour.v - pair.Liquid.v);
        if (!boundary.IsPure) return OnEdge(boundary, p, rho, pair, out state);
        state = HelmholtzState.Saturated(boundary, pair, double.IsNaN(x) ? 1 : Math.Clamp(x, 0, 1));
        return Outcome.Ok;
    }

    // A mixture has states on its two lines only; rounding may put one of them just inside.
    private static Outcome OnEdge(PhaseBoundary boundary, double p, double rho, in HelmholtzPair pair, out FluidState state)
    {
        bool vapour = rho <= pair.Vapour.rho * (1 + EdgeRounding), liquid = rho >= pair.Liquid.rho * (1 - EdgeRounding);
        state = vapour ? HelmholtzState.Of(boundary, p, pair.Vapour, PhaseSide.Vapour) : liquid ? HelmholtzState.Of(boundary, p, pair.Liquid, PhaseSide.Liquid) : default;
        return vapour || liquid ? Outcome.Ok : Outcome.BetweenPhases;
    }

    // The critical isotherm parts the dense states from the thin ones: at constant density p rises with T.
    private static Outcome BesideCritical(PhaseBoundary boundary, double p, double rho, double low, double high, out FluidState state)
    {
        double Tc = boundary.Tc;
        bool dense = low < Tc && boundary.Equation.Pressure(rho, Tc, out _) > p;
        return dense
            ? Between(boundary, p, rho, PhaseSide.Liquid, low, Tc, out state)
            : Between(boundary, p, rho, PhaseSide.OnePhase, Math.Max(low, Tc), high, out state);
    }

    // The line of constant density may leave the stable states at its cold end, so the search starts from the hot one.
    private static Outcome Between(PhaseBoundary boundary, double p, double rho, PhaseSide side, double low, double high, out FluidState state)
    {
        HelmholtzEquation of = boundary.Equation;
        bool coldEnd = low > boundary.Tc || low == HelmholtzRange.LeastTemperature(of, p), hotEnd = high == of.Parameters.Tmost;
        double densest = coldEnd ? HelmholtzDensity.Of(boundary, p, low, side) : double.PositiveInfinity;
        if (rho >= densest * (1 - EndRounding)) return End(boundary, p, rho, densest, low, side, Outcome.PairTooLow, out state);
        double thinnest = hotEnd ? HelmholtzDensity.Of(boundary, p, high, side) : 0;
        if (rho <= thinnest * (1 + EndRounding)) return End(boundary, p, rho, thinnest, high, side, Outcome.PairTooHigh, out state);
        HelmholtzPoint at = of.At(rho, high);
        double T = high;
        for (int i = 0; i < MostSteps; i++)
        {
            if (at.p > p) high = T;
            else low = T;
            double next = T - ((at.p - p) / at.pT);
            if (!(next >= low && next <= high)) next = (low + high) / 2;
            if (Math.Abs(next - T) <= 2e-16 * T) break;
            T = next;
            at = of.At(rho, T);
        }

        state = HelmholtzState.Of(boundary, p, at, side);
        return Outcome.Ok;
    }

    private static Outcome End(PhaseBoundary boundary, double p, double rho, double end, double T, PhaseSide side, Outcome otherwise, out FluidState state)
    {
        bool within = Math.Abs(rho - end) <= EndRounding * end;
        state = within ? HelmholtzState.Of(boundary, p, boundary.Equation.At(rho, T), side) : default;
        return within ? Outcome.Ok : otherwise;
    }
}
