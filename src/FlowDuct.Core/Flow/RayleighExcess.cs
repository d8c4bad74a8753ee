using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>
/// How far the equation of state is from the volume that momentum asks for, along the states of one mass flux and total enthalpy
/// (the Rayleigh line): p2 (v(p2, h2) - v2)/(p2 - p1), m3/kg, over the rise of pressure p2 - p1, Pa.
/// </summary>
/// <remarks>
/// The division by the rise removes the root at zero; the factor p2 makes it a straight line for a gas of constant heat capacity.
/// </remarks>
internal readonly struct RayleighExcess(Fluid fluid, in FluidState upstream, double G) : IScalarFunction
{
    private readonly FluidState _upstream = upstream;

    /// <summary>The rise at which all momentum has become pressure, Pa.</summary>
    internal double MostRise => G * G * _upstream.v;

    /// <summary>The limit at no rise: below zero where the stream is supersonic.</summary>
    internal double AtZero => _upstream.p * ((1 / (G * G)) - (_upstream.v / _upstream.w * (_upstream.v / _upstream.w)));

    /// <inheritdoc/>
    public double At(double x) => Evaluate(x, out _, out double gap) switch
    {
        Outcome.Ok => (_upstream.p + x) * gap / x,
        Outcome.PairTooLow => double.NegativeInfinity,
        _ => double.PositiveInfinity,
    };

    /// <summary>The state at a rise, and what is left of the momentum balance as a part of the momentum flux.</summary>
    internal bool TryState(double rise, out FluidState state, out double error)
    {
        bool found = Evaluate(rise, out state, out double gap) == Outcome.Ok;
        error = G * G * gap / (_upstream.p + MostRise);
        return found;
    }

    private Outcome Evaluate(double rise, out FluidState state, out double gap)
    {
        double v2 = _upstream.v - (rise / (G * G));
        double h2 = _upstream.h + (rise * (_upstream.v + v2) / 2);
        Outcome outcome = fluid.FromPH(_upstream.p + rise, h2, _upstream, out state);
        gap = state.v - v2;
        return outcome;
    }
}
