using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>How much more than theta, rad, an oblique shock at the angle beta, rad, turns a stream of velocity V, m/s.</summary>
internal readonly struct DeflectionExcess(Fluid fluid, in FluidState upstream, double V, double theta) : IScalarFunction
{
    private readonly FluidState _upstream = upstream;

    /// <inheritdoc/>
    public double At(double x) => ObliqueShock.TryAtAngle(fluid, _upstream, V, x, out ObliqueWave wave) ? wave.Theta - theta : -theta;
}
