using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>
/// The volume of the equation of state at p2 and at the enthalpy that a shock to p2 and v2 leaves, less v2, m3/kg, over v2:
/// h2 = h1 + (p2 - p1)(v1 + v2)/2 (Rankine and Hugoniot). It falls with v2, in a straight line for constant heat capacity.
/// </summary>
internal readonly struct HugoniotExcess(Fluid fluid, in FluidState upstream, double p2) : IScalarFunction
{
    // Of the volume: as for the balances of a normal shock.
    private const double Closure = 1e-11;

    private readonly FluidState _upstream = upstream;

    /// <summary>The state behind a shock of any angle from a state to the greater pressure p2, Pa.</summary>
    internal static bool TryVolume(Fluid fluid, in FluidState upstream, double p2, out FluidState behind)
    {
        behind = default;
        var excess = new HugoniotExcess(fluid, upstream, p2);
        double atZero = excess.At(0), atMost = excess.At(upstream.v);
        if (!(atZero > 0 && atMost < 0)) return false;
        double v2 = RootFinder.Find(ref excess, 0, upstream.v, atZero, atMost);
        return excess.Evaluate(v2, out behind) == Outcome.Ok && Math.Abs(behind.v - v2) <= Closure * v2 && behind.v < upstream.v;
    }

    /// <inheritdoc/>
    public double At(double x) => Evaluate(x, out FluidState behind) switch
    {
        Outcome.Ok => behind.v - x,
        Outcome.PairTooLow => double.PositiveInfinity,
        _ => double.NegativeInfinity,
    };

    private Outcome Evaluate(double v2, out FluidState behind) =>
        fluid.FromPH(p2, _upstream.h + ((p2 - _upstream.p) * (_upstream.v + v2) / 2), _upstream, out behind);
}
