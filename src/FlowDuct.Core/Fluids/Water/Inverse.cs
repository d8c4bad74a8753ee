namespace FlowDuct.Fluids.Water;

/// <summary>
/// A state from p and one property (h or s): the phase is decided by the property itself against its saturated values, then a
/// guess is polished on the forward equation inside a bracket.
/// </summary>
/// <remarks>
/// Regions follow each other with rising temperature. Where two overlap in the property the cooler one wins; a gap between them is
/// served by the cooler equation past its edge, with a notice. At most 33 mK lie past an edge.
/// </remarks>
internal static class Inverse<TKind>
    where TKind : struct, IInverseKind
{
    private const int MostSteps = 60;
    private const double Closure = 2e-14;

    // Past an edge a cooler equation is asked for millikelvins; the room lets Newton land there.
    private const double Room = 1;

    // Eq. (17) has no value at 1080 K, where tau = 0.5.
    private const double MostT2 = 1079;

    internal static Outcome Solve(double p, double y, out FluidState state)
    {
        state = default;
        if (!(p >= WaterConstants.pLeast)) return Outcome.PressureTooLow;
        if (!(p <= WaterConstants.pMost)) return Outcome.PressureTooHigh;
        if (QuickInverse<TKind>.TrySolve(p, y, out state)) return Outcome.Ok;
        if (!double.IsFinite(y)) return y > 0 ? Outcome.PairTooHigh : Outcome.PairTooLow;
        if (p < SaturationLine.pAtLeastT) return Vapour(p, y, WaterConstants.TLeast, out state);
        return p < WaterConstants.pc ? Subcritical(p, y, out state) : Supercritical(p, y, out state);
    }

    private static Outcome Subcritical(double p, double y, out FluidState state)
    {
        double T = SaturationLine.Temperature(p);
        RegionState vapour = SaturatedPair.VapourAt(p, T);
        if (y > TKind.Of(vapour)) return Vapour(p, y, T, out state);
        RegionState liquid = SaturatedPair.LiquidAt(p, T);
        if (y < TKind.Of(liquid)) return Liquid(p, y, T, out state);
        double x = (y - TKind.Of(liquid)) / (TKind.Of(vapour) - TKind.Of(liquid));
        state = x switch
        {
            <= 0 => liquid.ToSaturated(0, Phase.SaturatedLiquid, NoticesOf.State(p, T)),
            >= 1 => vapour.ToSaturated(1, Phase.SaturatedVapour, NoticesOf.State(p, T)),
            double.NaN => vapour.ToSaturated(1, Phase.SaturatedVapour, NoticesOf.State(p, T)),
            _ => new SaturatedPair(p, T, liquid, vapour).Mix(x),
        };
        return Outcome.Ok;
    }

    private static Outcome Liquid(double p, double y, double Tsat, out FluidState state)
    {
        if (Tsat <= WaterConstants.T13 || y <= TKind.Of(Region1.State(p, WaterConstants.T13)))
            return InRegion1(p, y, Math.Min(Tsat, WaterConstants.T13), Notices.None, out state);
        Outcome outcome = InRegion3(p, y, WaterConstants.T13, Tsat, Phase.Liquid, out state);
        return outcome == Outcome.Ok && state.T < WaterConstants.T13
            ? InRegion1(p, y, WaterConstants.T13, Notices.RegionGap, out state)
            : outcome;
    }

    private static Outcome Vapour(double p, double y, double TLow, out FluidState state)
    {
        if (p <= SaturationLine.pAtT13) return InRegion2(p, y, TLow, out state);
        double edge = Boundaries.TB23(p);
        if (ClearlyBeyond(p, y, edge)) return InRegion2(p, y, edge, out state);
        Outcome outcome = InRegion3(p, y, TLow, edge, Phase.SuperheatedVapour, out state);
        return outcome == Outcome.Ok && state.T > edge ? BeyondRegion3(p, y, edge, ref state) : outcome;
    }

    private static Outcome Supercritical(double p, double y, out FluidState state)
    {
        if (y <= TKind.Of(Region1.State(p, WaterConstants.T13))) return InRegion1(p, y, WaterConstants.T13, Notices.None, out state);
        double edge = Boundaries.TB23(p);
        if (ClearlyBeyond(p, y, edge)) return InRegion2(p, y, edge, out state);
        Outcome outcome = InRegion3(p, y, WaterConstants.T13, edge, Phase.None, out state);
        if (outcome != Outcome.Ok) return outcome;
        if (state.T < WaterConstants.T13) return InRegion1(p, y, WaterConstants.T13, Notices.RegionGap, out state);
        return state.T > edge ? BeyondRegion3(p, y, edge, ref state) : Outcome.Ok;
    }

    // Regions 2 and 3 differ by 134 J/kg and 0.18 J/(kg.K) at most along their edge (R7-97, Table 43).
    private static bool ClearlyBeyond(double p, double y, double edge) =>
        y > TKind.Of(Region2.State(p, edge)) + (0.5 * TKind.Scale);

    // Region 2 where it holds the property, else the gap, which region 3 serves past its edge.
    private static Outcome BeyondRegion3(double p, double y, double edge, ref FluidState state)
    {
        Outcome outcome = InRegion2(p, y, edge, out FluidState hotter);
        if (outcome == Outcome.PairTooLow)
        {
            state = Marked(state, Notices.RegionGap);
            return Outcome.Ok;
        }

        state = hotter;
        return outcome;
    }

    private static Outcome InRegion1(double p, double y, double TTop, Notices notices, out FluidState state)
    {
        RegionState at = default;
        double T = TKind.GuessRegion1(p, y), low = WaterConstants.TLeast - Room, high = TTop + Room;
        for (int i = 0; i < MostSteps; i++)
        {
            T = Math.Clamp(T, low, high);
            at = Region1.State(p, T);
            if (Step(at, y, ref T, ref low, ref high)) break;
        }

        state = at.ToState(Phase.Liquid, notices | NoticesOf.State(p, at.T));
        return at.T < WaterConstants.TLeast - EdgeRounding ? Outcome.PairTooLow : Outcome.Ok;
    }

    private static Outcome InRegion2(double p, double y, double TLow, out FluidState state)
    {
        RegionState at = default;
        double T = TKind.GuessRegion2(p, y), low = TLow - Room, high = MostT2;
        for (int i = 0; i < MostSteps; i++)
        {
            T = Math.Clamp(T, low, high);
            at = Region2.State(p, T);
            if (Step(at, y, ref T, ref low, ref high)) break;
        }

        state = at.ToState(PhaseOfVapour(p, at.T), NoticesOf.State(p, at.T));
        if (at.T < TLow - EdgeRounding) return Outcome.PairTooLow;
        return at.T <= WaterConstants.T25 ? Outcome.Ok : InRegion5(p, y, ref state);
    }

    // What region 2 answered stands where region 5 does not reach down to the property: the gap.
    private static Outcome InRegion5(double p, double y, ref FluidState state)
    {
        if (p > WaterConstants.pMost5) return state.T <= WaterConstants.T25 + EdgeRounding ? Outcome.Ok : Outcome.PairTooHigh;
        RegionState bottom = Region5.State(p, WaterConstants.T25), top = Region5.State(p, WaterConstants.TMost);
        if (y > TKind.Of(top)) return y <= TKind.Of(top) + (Closure * Math.Abs(y)) ? Accept(top, ref state) : Outcome.PairTooHigh;
        if (y < TKind.Of(bottom))
        {
            state = Marked(state, Notices.RegionGap);
            return Outcome.Ok;
        }

        double low = WaterConstants.T25, high = WaterConstants.TMost;
        double T = low + ((high - low) * (y - TKind.Of(bottom)) / (TKind.Of(top) - TKind.Of(bottom)));
        RegionState at = bottom;
        for (int i = 0; i < MostSteps; i++)
        {
            at = Region5.State(p, T);
            if (Step(at, y, ref T, ref low, ref high)) break;
        }

        return Accept(at, ref state);
    }

    private static Outcome Accept(in RegionState at, ref FluidState state)
    {
        state = at.ToState(PhaseOfVapour(at.p, at.T), Notices.None);
        return Outcome.Ok;
    }

    // A millionth of a kelvin past the least temperature is the rounding of the given pair.
    internal const double EdgeRounding = 1e-6;

    /// <summary>One Newton step at constant p inside the bracket; true where the state closes on the property.</summary>
    private static bool Step(in RegionState at, double y, ref double T, ref double low, ref double high)
    {
        double excess = TKind.Of(at) - y;
        if (Math.Abs(excess) <= Closure * Math.Max(Math.Abs(y), TKind.Scale)) return true;
        if (excess > 0) high = T;
        else low = T;
        double next = T - (excess / TKind.ByT(at));
        if (!(next >= low && next <= high)) next = (low + high) / 2;
        bool still = Math.Abs(next - T) <= 2e-16 * T;
        T = next;
        return still;
    }

    private static Outcome InRegion3(double p, double y, double TLow, double THigh, Phase phase, out FluidState state)
    {
        (double rho, double T) = TKind.GuessRegion3(p, y);
        if (!Newton3(p, y, ref rho, ref T, out RegionState at) || !IsOnItsSide(phase, at))
            at = Nested3(p, y, TLow - Room, THigh + Room, phase);
        Phase known = phase == Phase.None ? (at.T > WaterConstants.Tc ? Phase.Supercritical : Phase.Liquid) : phase;
        state = new FluidState(p, at.T, at.v, at.h, at.s, at.cp, at.cv, at.w, 0, known, NoticesOf.State(p, at.T));
        return Outcome.Ok;
    }

    // A liquid lies on the dense side of the critical density, a vapour below the critical temperature on the thin side.
    private static bool IsOnItsSide(Phase phase, in RegionState at) => at.T >= WaterConstants.Tc || phase switch
    {
        Phase.Liquid => 1 / at.v >= WaterConstants.rhoc,
        Phase.SuperheatedVapour => 1 / at.v <= WaterConstants.rhoc,
        _ => true,
    };

    private static bool Newton3(double p, double y, ref double rho, ref double T, out RegionState at)
    {
        at = default;
        double scale = Math.Max(Math.Abs(y), TKind.Scale);
        for (int i = 0; i < 20; i++)
        {
            if (!(rho is > 60 and < 850 && T is > 600 and < 900)) return false;
            at = Region3.State(rho, T, out double prho, out double pT);
            double dp = at.p - p, dy = TKind.Of(at) - y;
            if (Math.Abs(dp) <= 1e-13 * p && Math.Abs(dy) <= 1e-13 * scale) return true;
            double yrho = TKind.ByDensity(at, prho, pT), yT = TKind.ByTAtDensity(at, pT);
            double det = (prho * yT) - (pT * yrho);
            double stepRho = ((dp * yT) - (pT * dy)) / det, stepT = ((prho * dy) - (yrho * dp)) / det;
            if (!double.IsFinite(stepRho) || !double.IsFinite(stepT)) return false;
            rho -= Math.Clamp(stepRho, -0.2 * rho, 0.2 * rho);
            T -= Math.Clamp(stepT, -20, 20);
        }

        return Math.Abs(at.p - p) <= 1e-11 * p && Math.Abs(TKind.Of(at) - y) <= 1e-11 * scale;
    }

    // Bisection in T with the density solved at each: slow and sure.
    private static RegionState Nested3(double p, double y, double low, double high, Phase phase)
    {
        RegionState at = default;
        for (int i = 0; i < MostSteps; i++)
        {
            double T = (low + high) / 2;
            double rho = phase switch
            {
                Phase.Liquid when T < WaterConstants.Tc => Region3Density.Liquid(p, T),
                Phase.SuperheatedVapour when T < WaterConstants.Tc => Region3Density.Vapour(p, T),
                _ => Region3Density.Of(p, T),
            };
            at = Region3.State(rho, T);
            double excess = TKind.Of(at) - y;
            if (Math.Abs(excess) <= Closure * Math.Max(Math.Abs(y), TKind.Scale)) break;
            if (excess > 0) high = T;
            else low = T;
        }

        return at;
    }

    private static Phase PhaseOfVapour(double p, double T) =>
        p > WaterConstants.pc && T > WaterConstants.Tc ? Phase.Supercritical : Phase.SuperheatedVapour;

    private static FluidState Marked(in FluidState at, Notices notice) =>
        new(at.p, at.T, at.v, at.h, at.s, at.cp, at.cv, at.w, at.x, at.Phase, at.Notices | notice);
}
