using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>What a rating needs to know of the stream: the fluid and its stagnation state.</summary>
/// <param name="Fluid">The equation of state.</param>
/// <param name="h0">Total specific enthalpy, J/kg.</param>
/// <param name="s">Entropy, J/(kg.K).</param>
/// <param name="p0">Stagnation pressure, Pa.</param>
internal readonly record struct RatingInlet(Fluid Fluid, double h0, double s, double p0);
