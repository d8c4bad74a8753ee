using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>The pressure on a path at which it carries a mass flux: Newton in ln p inside a bracket.</summary>
internal static class FluxRoot
{
    private const int MostSteps = 100;

    // Of the flux: what the closure of the property calls leaves.
    private const double Closure = 1e-13;

    // A Newton step that gains less than this is no such step.
    private const double Halved = 0.5;

    // Saturated states step where the regions of IAPWS-IF97 meet, at 623.15 K, by up to 4 J/kg: a flux inside that step has no state, and its edge
    // stands for it.
    private const double RegionEdge = 623.15;
    private const double RegionStep = 6;

    // A slow stream is a small difference of large enthalpies.
    private static double Rounding(double h0, double V) => 1e-9 + (1e-13 * Math.Max(Math.Abs(h0), 1e5) / (V * V));

    /// <summary>Finds the state between two pressures, Pa, of which the flux lies above the target at one and below it at the other.</summary>
    internal static bool TryFind(LossPath path, double target, double pMore, double pLess, double start, out FluidState state, out double V)
    {
        double more = Math.Log(pMore), less = Math.Log(pLess), x = Math.Log(start);
        state = default;
        V = 0;
        double before = double.PositiveInfinity;
        for (int i = 0; i < MostSteps; i++)
        {
            if (!(x > Math.Min(more, less) && x < Math.Max(more, less))) x = (more + less) / 2;
            Outcome outcome = path.At(Math.Exp(x), state, out FluidState at, out double speed);
            double flux = outcome == Outcome.Ok ? speed / at.v : 0, excess = (flux / target) - 1;
            if (outcome == Outcome.Ok) (state, V) = (at, speed);
            if (Math.Abs(excess) <= Closure) return true;
            if (excess > 0) more = x;
            else less = x;
            if (Math.Abs(more - less) <= 4e-16 * Math.Abs(x)) return Math.Abs(excess) < Rounding(path.h0, V) + (Math.Abs(state.T - RegionEdge) < 1e-6 ? RegionStep / (V * V) : 0);

            // On an isentrope d ln G = p v (1/w^2 - 1/V^2) d ln p; a loss bends it little, but near the greatest flux enough to turn its sign.
            double slope = outcome == Outcome.Ok && speed > 0 ? at.p * at.v * ((1 / (at.w * at.w)) - (1 / (speed * speed))) : 0;
            double next = x - (Math.Log(flux / target) / slope);
            bool slow = Math.Abs(excess) > Halved * before;
            before = Math.Abs(excess);
            x = double.IsFinite(next) && !slow ? next : (more + less) / 2;
        }

        return false;
    }
}
