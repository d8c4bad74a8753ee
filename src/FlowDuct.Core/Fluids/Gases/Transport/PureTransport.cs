namespace FlowDuct.Fluids.Gases;

/// <summary>Viscosity and thermal conductivity of a gas at low pressure, functions of temperature alone.</summary>
internal abstract class PureTransport
{
    /// <summary>Least temperature of both fits, K.</summary>
    internal abstract double Tlow { get; }

    /// <summary>Greatest temperature of both fits, K.</summary>
    internal abstract double Thigh { get; }

    /// <summary>Viscosity, Pa.s, and conductivity, W/(m.K), at T, K, inside the fits.</summary>
    internal abstract void At(double T, out double mu, out double lambda);
}
