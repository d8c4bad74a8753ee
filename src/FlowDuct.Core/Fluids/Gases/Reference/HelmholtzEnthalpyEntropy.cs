namespace FlowDuct.Fluids.Gases;

/// <summary>A state from h and s: Newton in density and temperature, else along the isentrope in pressure, where dh = v dp.</summary>
internal static class HelmholtzEnthalpyEntropy
{
    private const int MostQuickSteps = 20;
    private const int MostSteps = 120;
    private const double Closure = 1e-12;

    // What rounding of the property calls leaves of h.
    private const double NoiseFloor = 2e-12;

    internal static Outcome Solve(PhaseBoundary boundary, double h, double s, in FluidState near, out FluidState state)
    {
        state = default;
        if (!double.IsFinite(h) || !double.IsFinite(s)) return h > 0 || s > 0 ? Outcome.PairTooHigh : Outcome.PairTooLow;
        if (near.Phase != Phase.Wet && TryQuick(boundary, h, s, near, out state)) return Outcome.Ok;
        return AlongIsentrope(boundary, h, s, near.Phase == Phase.None ? boundary.pc / 2 : near.p, out state);
    }

    private static bool TryQuick(PhaseBoundary boundary, double h, double s, in FluidState near, out FluidState state)
    {
        state = default;
        HelmholtzEquation of = boundary.Equation;
        (double rho, double T) = (near.Phase == Phase.None ? 0 : near.rho, near.T);
        if (near.Phase == Phase.None) HelmholtzStart.FromEnthalpyAndEntropy(of, h, s, out rho, out T);
        if (!Newton(of, h, s, rho, T, out HelmholtzPoint at) || !boundary.IsClearlyStable(at)) return false;
        if (HelmholtzRange.Check(of, at.p, at.T) != Outcome.Ok) return false;
        state = HelmholtzState.Of(boundary, at.p, at);
        return true;
    }

    private static bool Newton(HelmholtzEquation of, double h, double s, double rho, double T, out HelmholtzPoint at)
    {
        at = default;
        for (int i = 0; i < MostQuickSteps; i++)
        {
            at = of.At(rho, T);
            double dh = h - at.h, ds = s - at.s, det = (at.hrho * at.sT) - (at.hT * at.srho);
            double drho = ((dh * at.sT) - (at.hT * ds)) / det, dT = ((at.hrho * ds) - (dh * at.srho)) / det;
            if (!(Math.Abs(dT) < T && Math.Abs(drho) < 5 * rho)) return false;
            bool still = Math.Abs(drho) <= Closure * rho && Math.Abs(dT) <= Closure * T;
            if (still && Math.Abs(dh) <= Closure * Math.Max(Math.Abs(h), 1e3) && Math.Abs(ds) <= Closure * Math.Max(Math.Abs(s), 1)) return true;
            rho *= Math.Exp(Math.Clamp(drho / rho, -1, 1));
            T *= Math.Exp(Math.Clamp(dT / T, -0.5, 0.5));
        }

        return false;
    }

    private static Outcome AlongIsentrope(PhaseBoundary boundary, double h, double s, double p, out FluidState state)
    {
        (double low, double high) = (HelmholtzRange.LeastPressure, boundary.Equation.Parameters.pMost);
        (Outcome atLow, Outcome atHigh) = (Outcome.PairTooLow, Outcome.PairTooHigh);
        double scale = Math.Max(Math.Abs(h), 1e3), gap = 0;
        state = default;
        for (int i = 0; i < MostSteps && high - low > 4e-16 * high; i++)
        {
            Outcome outcome = HelmholtzInverse<HelmholtzEntropy>.Solve(boundary, p, s, default, out state);
            gap = outcome == Outcome.Ok ? h - state.h : Direction(boundary, outcome, p);
            if (Math.Abs(gap) <= 2e-14 * scale) return Outcome.Ok;
            if (gap > 0) (low, atLow) = (p, outcome);
            else (high, atHigh) = (p, outcome);
            double next = outcome == Outcome.Ok ? Next(p, gap, state) : 0;
            if (Math.Abs(gap) <= NoiseFloor * scale && Math.Abs(next - p) <= 1e-14 * p) return Outcome.Ok;
            p = next > low && next < high ? next : high > 2 * low ? Math.Sqrt(low * high) : (low + high) / 2;
        }

        return Settled(boundary, h, s, low, high, atLow, atHigh, out state);
    }

    // Too cold below the triple-point pressure or between the phases: more pressure. Frozen: less. Too hot: less.
    private static double Direction(PhaseBoundary boundary, Outcome outcome, double p) => outcome switch
    {
        Outcome.BetweenPhases => double.PositiveInfinity,
        Outcome.PairTooLow when p <= boundary.Equation.Melting.pt => double.PositiveInfinity,
        _ => double.NegativeInfinity,
    };

    // A liquid is nearly linear in p, a vapour in ln p.
    private static double Next(double p, double gap, in FluidState at) =>
        at.Phase is Phase.Liquid ? p + (gap / at.v) : p * Math.Exp(Math.Clamp(gap / (p * at.v), -2, 2));

    private static Outcome Settled(PhaseBoundary boundary, double h, double s, double low, double high, Outcome atLow, Outcome atHigh, out FluidState state)
    {
        double most = 10 * NoiseFloor * Math.Max(Math.Abs(h), 1e3);
        Outcome below = HelmholtzInverse<HelmholtzEntropy>.Solve(boundary, low, s, default, out state);
        if (below == Outcome.Ok && Math.Abs(h - state.h) <= most) return Outcome.Ok;
        Outcome above = HelmholtzInverse<HelmholtzEntropy>.Solve(boundary, high, s, default, out FluidState upper);
        if (above == Outcome.Ok && Math.Abs(h - upper.h) <= most)
        {
            state = upper;
            return Outcome.Ok;
        }

        if (atLow != Outcome.Ok) return atLow;
        return atHigh != Outcome.Ok ? Outcome.PairTooHigh : Outcome.NotConverged;
    }
}
