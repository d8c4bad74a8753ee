using FlowDuct.Flow;

namespace FlowDuct.Fluids.Gases;

/// <summary>A state from p and one property (h or s): Newton in density and temperature, with saturation and brackets as the safety net.</summary>
internal static class HelmholtzInverse<TKind>
    where TKind : struct, IHelmholtzKind
{
    private const int MostQuickSteps = 20;

    // Relative; a step this small is followed by one below the last digit.
    private const double Closure = 1e-12;

    // What a property may pass an end of the range by: rounding, times the sums it comes from.
    private const double EndRounding = 1e-11;

    // What it may pass a line of air by.
    private const double EdgeRounding = 2e-13;

    // Of temperature: what polishing may move.
    private const double Polish = 1e-7;

    // Half-width of the loop in density at the edge of the band (SaturatedBoundary): 0.9 % for carbon dioxide.
    private const double Sliver = 0.02;

    internal static Outcome Solve(PhaseBoundary boundary, double p, double y, in FluidState near, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        Outcome outcome = HelmholtzRange.OfPressure(of, p);
        if (outcome != Outcome.Ok) return outcome;
        if (!double.IsFinite(y)) return y > 0 ? Outcome.PairTooHigh : Outcome.PairTooLow;
        if (near.Phase != Phase.Wet && TryQuick(boundary, p, y, near, out state)) return Outcome.Ok;
        if (p >= boundary.pLeast && p < boundary.pc) return AcrossSaturation(boundary, p, y, out state);
        PhaseSide side = p < boundary.pLeast ? PhaseSide.Vapour : PhaseSide.OnePhase;
        return Between(boundary, p, y, side, HelmholtzRange.LeastTemperature(of, p), of.Parameters.Tmost, out state);
    }

    // Accepts only what is one phase beyond doubt.
    private static bool TryQuick(PhaseBoundary boundary, double p, double y, in FluidState near, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        double T = near.T, rho = near.Phase == Phase.None ? 0 : near.rho;
        if (near.Phase == Phase.None) HelmholtzStart.FromPressure<TKind>(of, p, y, out rho, out T);
        if (!Newton(of, p, y, rho, T, out HelmholtzPoint at)) return false;
        if (!(at.T <= of.Parameters.Tmost && at.T >= HelmholtzRange.LeastTemperature(of, p)) || !boundary.IsClearlyStable(at)) return false;
        state = HelmholtzState.Of(boundary, p, at);
        return true;
    }

    private static Outcome AcrossSaturation(PhaseBoundary boundary, double p, double y, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        if (!boundary.TryAtPressure(p, out HelmholtzPair pair)) return Outcome.NotConverged;
        if (pair.IsCritical && TryMerged(boundary, p, y, pair.Vapour, out state)) return Outcome.Ok;
        double liquid = TKind.Of(pair.Liquid), vapour = TKind.Of(pair.Vapour);
        if (y > vapour) return Outside(boundary, p, y, pair.Vapour, PhaseSide.Vapour, pair.Vapour.T, of.Parameters.Tmost, out state);
        if (y < liquid) return Outside(boundary, p, y, pair.Liquid, PhaseSide.Liquid, HelmholtzRange.LeastTemperature(of, p), pair.Liquid.T, out state);
        double x = (y - liquid) / (vapour - liquid);
        if (!boundary.IsPure) return OnEdge(boundary, p, y, pair, out state);
        state = HelmholtzState.Saturated(boundary, pair, double.IsNaN(x) ? 1 : Math.Clamp(x, 0, 1));
        return Outcome.Ok;
    }

    // A mixture has states on its two lines only; rounding may put one of them just inside.
    private static Outcome OnEdge(PhaseBoundary boundary, double p, double y, in HelmholtzPair pair, out FluidState state)
    {
        double slack = EdgeRounding * Math.Max(Math.Abs(y), TKind.Scale);
        bool vapour = TKind.Of(pair.Vapour) - y <= slack, liquid = y - TKind.Of(pair.Liquid) <= slack;
        state = vapour ? HelmholtzState.Of(boundary, p, pair.Vapour, PhaseSide.Vapour) : liquid ? HelmholtzState.Of(boundary, p, pair.Liquid, PhaseSide.Liquid) : default;
        return vapour || liquid ? Outcome.Ok : Outcome.BetweenPhases;
    }

    // Where the phases are taken as one, the equation goes on through the sliver of its loop that is left.
    private static bool TryMerged(PhaseBoundary boundary, double p, double y, in HelmholtzPoint critical, out FluidState state)
    {
        bool found = Newton(boundary.Equation, p, y, critical.rho, critical.T, out HelmholtzPoint at)
            && (at.prho > 0 || Math.Abs(at.rho - critical.rho) < Sliver * critical.rho);
        state = found ? HelmholtzState.Of(boundary, p, at) : default;
        return found;
    }

    // Beside saturation: Newton from the saturated state, accepted where it stays on its side.
    private static Outcome Outside(PhaseBoundary boundary, double p, double y, in HelmholtzPoint edge, PhaseSide side, double Tlow, double Thigh, out FluidState state)
    {
        bool liquid = side == PhaseSide.Liquid;
        if (Newton(boundary.Equation, p, y, edge.rho, edge.T, out HelmholtzPoint at)
            && at.T >= Tlow && at.T <= Thigh && at.prho > 0 && (liquid ? at.rho >= edge.rho : at.rho <= edge.rho))
        {
            state = HelmholtzState.Of(boundary, p, at, side);
            return Outcome.Ok;
        }

        return Between(boundary, p, y, side, Tlow, Thigh, out state);
    }

    // p and h or s of a thin gas are straight lines in the logarithms, those of a dense fluid in density and temperature themselves.
    private static bool Newton(HelmholtzEquation of, double p, double y, double rho, double T, out HelmholtzPoint at)
    {
        at = default;
        double scale = Math.Max(Math.Abs(y), TKind.Scale);
        for (int i = 0; i < MostQuickSteps; i++)
        {
            at = of.At(rho, T);
            bool thin = at.p > 0 && rho < of.rhoReducing;
            double dp = thin ? at.p * Math.Log(p / at.p) : p - at.p, dy = y - TKind.Of(at);
            double yrho = TKind.ByDensity(at), yT = TKind.ByTemperature(at), det = (at.prho * yT) - (at.pT * yrho);
            double dT = ((at.prho * dy) - (dp * yrho)) / det, drho = ((dp * yT) - (at.pT * dy)) / det;
            if (!(Math.Abs(dT) < T && Math.Abs(drho) < 3 * rho)) return false;
            if (Math.Abs(drho) <= Closure * rho && Math.Abs(dT) <= Closure * T && Math.Abs(dy) <= Closure * scale) return true;
            rho = thin ? rho * Math.Exp(Math.Clamp(drho / rho, -1, 1)) : Math.Max(rho + drho, rho / 2);
            T = thin ? T * Math.Exp(Math.Clamp(dT / T, -0.5, 0.5)) : Math.Max(T + dT, T / 2);
        }

        return false;
    }

    // At constant p h and s rise with T: a bracketed search in T, the density solved at each.
    private static Outcome Between(PhaseBoundary boundary, double p, double y, PhaseSide side, double low, double high, out FluidState state)
    {
        double scale = Math.Max(Math.Abs(y), TKind.Scale), slack = EndRounding * scale;
        HelmholtzPoint bottom = At(boundary, p, low, side), top = At(boundary, p, high, side);
        (double atLow, double atHigh) = (TKind.Of(bottom) - y, TKind.Of(top) - y);
        if (atLow >= 0) return End(boundary, p, bottom, side, atLow <= slack, Outcome.PairTooLow, out state);
        if (atHigh <= 0) return End(boundary, p, top, side, atHigh >= -slack, Outcome.PairTooHigh, out state);
        var excess = new Excess(boundary, p, y, side);
        HelmholtzPoint at = At(boundary, p, RootFinder.Find(ref excess, low, high, atLow, atHigh, 1e-15 * scale), side);

        // Beside the critical point a temperature keeps too few digits to fix a state; density and temperature together do.
        if (Newton(boundary.Equation, p, y, at.rho, at.T, out HelmholtzPoint polished) && Math.Abs(polished.T - at.T) <= Polish * at.T) at = polished;
        state = HelmholtzState.Of(boundary, p, at, side);
        return Outcome.Ok;
    }

    private readonly struct Excess(PhaseBoundary boundary, double p, double y, PhaseSide side) : IScalarFunction
    {
        public double At(double T) => TKind.Of(HelmholtzInverse<TKind>.At(boundary, p, T, side)) - y;
    }

    private static HelmholtzPoint At(PhaseBoundary boundary, double p, double T, PhaseSide side)
    {
        if (side == PhaseSide.OnePhase && T < boundary.Tc) side = boundary.SideOf(p, T);
        return boundary.Equation.At(HelmholtzDensity.Of(boundary, p, T, side), T);
    }

    private static Outcome End(PhaseBoundary boundary, double p, in HelmholtzPoint at, PhaseSide side, bool within, Outcome otherwise, out FluidState state)
    {
        state = within ? HelmholtzState.Of(boundary, p, at, side) : default;
        return within ? Outcome.Ok : otherwise;
    }
}
