namespace FlowDuct.Fluids.Gases;

/// <summary>
/// Perry's Chemical Engineers' Handbook, 8th ed. (2008), Tables 2-312 and 2-314: for the gases that the NASA file does not have.
/// The fits turn wild outside their ranges.
/// </summary>
internal sealed class HandbookTransport(HandbookTransport.Fit[] viscosity, HandbookTransport.Fit[] conductivity) : PureTransport
{
    /// <inheritdoc/>
    internal override double Tlow { get; } = Math.Max(viscosity[0].Tlow, conductivity[0].Tlow);

    /// <inheritdoc/>
    internal override double Thigh { get; } = Math.Min(viscosity[0].Thigh, conductivity[0].Thigh);

    /// <inheritdoc/>
    internal override void At(double T, out double mu, out double lambda) => (mu, lambda) = (viscosity[0].At(T), conductivity[0].At(T));

    /// <summary>C1 T^C2/(1 + C3/T + C4/T^2), SI.</summary>
    internal readonly record struct Fit(double Tlow, double Thigh, double C1, double C2, double C3, double C4)
    {
        internal double At(double T) => C1 * Math.Pow(T, C2) / (1 + ((C3 + (C4 / T)) / T));
    }
}
