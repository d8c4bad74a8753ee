using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>How much more than nu, rad, a stream at p1, Pa, turns when ln p falls by x.</summary>
internal readonly struct TurningExcess(Fluid fluid, double h0, double s, double p1, double nu) : IScalarFunction
{
    /// <inheritdoc/>
    public double At(double x) => PrandtlMeyer.TryTurning(fluid, h0, s, p1, p1 * Math.Exp(-x), out double turned) ? turned - nu : -nu;
}
