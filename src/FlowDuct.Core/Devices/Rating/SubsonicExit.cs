using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>The state at a pressure that carries a mass flux at a total enthalpy.</summary>
internal static class SubsonicExit
{
    private const double Closure = 1e-15;

    /// <summary>Finds it: h + (G v)^2/2 = h0 has one root in h, since v rises with h at constant p.</summary>
    internal static bool TryFind(Fluid fluid, double h0, double p, double G, out FluidState state, out double V)
    {
        (state, V) = (default, 0);
        var excess = new EnergyExcess(fluid, h0, p, G);
        double atTop = excess.At(h0);
        if (!(atTop > 0)) return false;
        double low = h0 - atTop, atLow = excess.At(low);
        if (!double.IsFinite(atLow)) return false;
        double h = atLow < 0 ? RootFinder.Find(ref excess, low, h0, atLow, atTop, Closure * Math.Max(Math.Abs(h0), 1e5)) : low;
        if (fluid.FromPH(p, h, default, out state) != Outcome.Ok) return false;
        V = G * state.v;
        return true;
    }

    private readonly struct EnergyExcess(Fluid fluid, double h0, double p, double G) : IScalarFunction
    {
        public double At(double h)
        {
            if (fluid.FromPH(p, h, default, out FluidState at) != Outcome.Ok) return double.NegativeInfinity;
            double V = G * at.v;
            return h + (V * V / 2) - h0;
        }
    }
}
