using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>The stagnation state: the one with the total enthalpy h + V^2/2 at the entropy of the stream.</summary>
internal static class Stagnation
{
    /// <summary>Brings a stream of velocity V, m/s, to rest without loss; height is not in it.</summary>
    internal static Outcome Of(Fluid fluid, in FluidState state, double V, out FluidState stagnation)
    {
        stagnation = state;
        return V == 0 ? Outcome.Ok : fluid.FromHS(state.h + (V * V / 2), state.s, Start(state, V), out stagnation);
    }

    // The state again, at the pressure to which a gas of constant isentropic exponent would rise: nearer to the root by two steps.
    private static FluidState Start(in FluidState at, double V)
    {
        double kappa = at.kappa, M = V / at.w;
        if (!(kappa is > 1.01 and < 3) || !(M < 5)) return at;
        double p = at.p * Math.Exp(kappa / (kappa - 1) * Math.Log(1 + ((kappa - 1) / 2 * M * M)));
        return new FluidState(p, at.T, at.v, at.h, at.s, at.cp, at.cv, at.w, at.x, at.Phase, at.Notices);
    }
}
