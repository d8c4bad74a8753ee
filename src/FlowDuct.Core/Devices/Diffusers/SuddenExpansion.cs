using FlowDuct.Devices.Rating;
using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Diffusers;

/// <summary>A stream that is let into a wider duct at once: mass, momentum with the inlet pressure on the whole face, and energy, on any fluid.</summary>
/// <remarks>The incompressible limit is Borda and Carnot's: Cp = (2/AR)(1 - 1/AR).</remarks>
internal static class SuddenExpansion
{
    /// <summary>The state where the stream fills the duct again; false where none lies in the range of the fluid.</summary>
    internal static bool TryFind(Fluid fluid, in FluidState inlet, double V1, double h0, double areaRatio, out FluidState exit, out double V2)
    {
        (exit, V2) = (default, 0);
        double G1 = V1 / inlet.v, G2 = G1 / areaRatio;
        var excess = new MomentumExcess(fluid, h0, G2, inlet.p + (G1 * V1 / areaRatio));
        double high = inlet.p + (G1 * V1 / areaRatio), low = inlet.p, atHigh = excess.At(high), atLow = excess.At(low);
        if (!(atHigh > 0) || !(atLow <= 0)) return false;
        double p = RootFinder.Find(ref excess, low, high, atLow, atHigh);
        return SubsonicExit.TryFind(fluid, h0, p, G2, out exit, out V2);
    }

    private readonly struct MomentumExcess(Fluid fluid, double h0, double G, double impulse) : IScalarFunction
    {
        public double At(double p) => SubsonicExit.TryFind(fluid, h0, p, G, out _, out double V) ? p + (G * V) - impulse : double.NaN;
    }
}
