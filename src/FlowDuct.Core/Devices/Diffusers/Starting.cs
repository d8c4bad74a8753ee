using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Diffusers;

/// <summary>How far a supersonic inlet may contract, as throat over inlet area.</summary>
/// <remarks>
/// A. Kantrowitz and C. duP. Donaldson, NACA ACR L5D20 (1945), here on any equation of state: behind a normal shock at the inlet the throat
/// must still pass the whole flow. Below the isentropic limit no supersonic stream passes it at all.
/// </remarks>
/// <param name="SelfStarting">Least throat through which the stream starts by itself.</param>
/// <param name="Isentropic">Least throat that a started stream passes.</param>
internal readonly record struct Starting(double SelfStarting, double Isentropic)
{
    /// <summary>The limits of an inlet; null where it is not supersonic, or its states leave the range of the fluid.</summary>
    internal static Starting? Of(Fluid fluid, Inlet inlet)
    {
        if (!InletShock.IsNeeded(inlet) || inlet.Station.Stagnation is not FluidState rest) return null;
        double G = inlet.V / inlet.State.v;
        bool known = NormalShock.TryFind(fluid, inlet.State, inlet.V, out FluidState behind, out double V2)
            & Stagnation.Of(fluid, behind, V2, out FluidState lower) == Outcome.Ok;
        return known && Flux(fluid, rest) is double free && Flux(fluid, lower) is double shocked ? new Starting(G / shocked, G / free) : null;
    }

    private static double? Flux(Fluid fluid, in FluidState rest) =>
        Choking.TryFind(fluid, rest.h, rest.s, rest.p, out FluidState throat, out _) ? Energy.Velocity(rest.h, throat.h) / throat.v : null;
}
