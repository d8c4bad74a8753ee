using FlowDuct.Fluids.Water;

namespace FlowDuct.Fluids.Gases;

/// <summary>
/// Water vapour at low pressure: below the fit of the NASA file, which begins at 373.2 K, the limits of zero density of IAPWS R12-08, Eq. (11), and
/// R15-11, Eq. (16), from the triple point up. At the joint, which belongs to them, the viscosities differ by 0.4 %, the conductivities by 3.6 %.
/// </summary>
/// <param name="warm">The fit above.</param>
internal sealed class VapourTransport(PureTransport warm) : PureTransport
{
    /// <inheritdoc/>
    internal override double Tlow => WaterConstants.Tt;

    /// <inheritdoc/>
    internal override double Thigh => warm.Thigh;

    /// <inheritdoc/>
    internal override void At(double T, out double mu, out double lambda)
    {
        if (T > warm.Tlow)
            warm.At(T, out mu, out lambda);
        else
            (mu, lambda) = (Viscosity.OfDilute(T), 1e-3 * ThermalConductivity.Dilute(T / WaterConstants.Tc));
    }
}
