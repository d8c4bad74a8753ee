using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>The stagnation state: the one with the total enthalpy h + V^2/2 at the entropy of the stream.</summary>
internal static class Stagnation
{
    /// <summary>Brings a stream of velocity V, m/s, to rest without loss; height is not in it.</summary>
    internal static Outcome Of(Fluid fluid, in FluidState state, double V, out FluidState stagnation)
    {
        stagnation = state;
        return V == 0 ? Outcome.Ok : fluid.FromHS(state.h + (V * V / 2), state.s, state, out stagnation);
    }
}
