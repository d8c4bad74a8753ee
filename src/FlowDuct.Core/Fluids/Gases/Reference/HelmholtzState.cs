namespace FlowDuct.Fluids.Gases;

/// <summary>States in the words of the devices: phase and notices.</summary>
internal static class HelmholtzState
{
    // Within this part of the critical point heat capacities and compressibility change manifold: the reach that water has (1 K, 1 %).
    private const double NearT = 0.0016;
    private const double NearP = 0.01;

    /// <summary>The state of one phase at the pressure p, Pa, that was asked for.</summary>
    internal static FluidState Of(PhaseBoundary boundary, double p, in HelmholtzPoint at, PhaseSide side = PhaseSide.OnePhase) =>
        at.ToState(p, PhaseOf(boundary, p, at, side), NoticesOf(boundary, p, at.T));

    /// <summary>On the saturation line or between its two sides.</summary>
    internal static FluidState Saturated(PhaseBoundary boundary, in HelmholtzPair pair, double x)
    {
        Notices notices = NoticesOf(boundary, pair.p, pair.T);
        return x switch
        {
            0 => pair.Liquid.ToState(pair.p, Phase.SaturatedLiquid, notices, 0),
            1 => pair.Vapour.ToState(pair.p, Phase.SaturatedVapour, notices, 1),
            _ => pair.Mix(x, notices),
        };
    }

    private static Phase PhaseOf(PhaseBoundary boundary, double p, in HelmholtzPoint at, PhaseSide side)
    {
        if (at.T > boundary.Tc) return p > boundary.pc ? Phase.Supercritical : Phase.Gas;
        bool liquid = side == PhaseSide.Liquid || (side == PhaseSide.OnePhase && at.rho > boundary.Equation.rhoReducing);
        return liquid || p >= boundary.pc ? Phase.Liquid : Phase.SuperheatedVapour;
    }

    private static Notices NoticesOf(PhaseBoundary boundary, double p, double T) =>
        Math.Abs(T - boundary.Tc) < NearT * boundary.Tc && Math.Abs(p - boundary.pc) < NearP * boundary.pc ? Notices.NearCritical : Notices.None;
}
