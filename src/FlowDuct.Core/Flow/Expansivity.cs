using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>How a fluid swells when it is heated at constant pressure.</summary>
internal static class Expansivity
{
    /// <summary>
    /// (dv/dh) at constant pressure, 1/Pa. Single phase: (dv/dT)/cp with (dv/dT)^2 = (v/w)^2 (cp - cv) cp/(cv T), the positive root
    /// (water below 4 degC is the exception). Wet: the straight line between both saturated states.
    /// </summary>
    internal static double VolumeByEnthalpy(Fluid fluid, in FluidState at)
    {
        if (at.HasHeatCapacities) return at.v / at.w * Math.Sqrt(Math.Max(0, at.cp - at.cv) / (at.cp * at.cv * at.T));
        bool paired = fluid.FromPX(at.p, 0, out FluidState liquid) == Outcome.Ok;
        return paired && fluid.FromPX(at.p, 1, out FluidState vapour) == Outcome.Ok ? (vapour.v - liquid.v) / (vapour.h - liquid.h) : 0;
    }
}
