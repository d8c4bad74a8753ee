using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>
/// States of constant total enthalpy along an expansion with loss: from a start at the entropy of the stream, each drop of enthalpy is a fixed
/// part of the isentropic one. From rest that part is the efficiency; from a throat it is the efficiency of the divergence alone.
/// </summary>
/// <param name="Fluid">The equation of state.</param>
/// <param name="h0">Total specific enthalpy, J/kg.</param>
/// <param name="hStart">Enthalpy where the loss begins, J/kg.</param>
/// <param name="s">Entropy of the isentropic expansion, J/(kg.K).</param>
/// <param name="Efficiency">The part.</param>
internal readonly record struct LossPath(Fluid Fluid, double h0, double hStart, double s, double Efficiency)
{
    /// <summary>State and velocity at a pressure, Pa.</summary>
    internal Outcome At(double p, in FluidState near, out FluidState state, out double V)
    {
        Outcome outcome = Fluid.FromPS(p, s, near, out state);
        if (outcome == Outcome.Ok && Efficiency != 1)
        {
            FluidState ideal = state;
            outcome = Fluid.FromPH(p, hStart - (Efficiency * (hStart - ideal.h)), ideal, out state);
        }

        V = outcome == Outcome.Ok ? Energy.Velocity(h0, state.h) : 0;
        return outcome;
    }
}
