namespace FlowDuct.Fluids.Gases;

/// <summary>
/// The fits of the transport data file of NASA TM-4647 (1995). Neighbouring intervals meet within 0.5 %
/// (0.7 % at 5000 K), and a joint belongs to the cooler one; carbon monoxide has the
/// coefficients of nitrogen there, which makes its conductivity 4 % high at 300 K.
/// </summary>
internal sealed class NasaTransport(NasaTransport.Fit[] viscosity, NasaTransport.Fit[] conductivity) : PureTransport
{
    // The file has micropoise and microwatt/(cm.K).
    private const double Micropoise = 1e-7, MicrowattPerCentimetre = 1e-4;

    /// <inheritdoc/>
    internal override double Tlow { get; } = Math.Max(viscosity[0].Tlow, conductivity[0].Tlow);

    /// <inheritdoc/>
    internal override double Thigh { get; } = Math.Min(viscosity[^1].Thigh, conductivity[^1].Thigh);

    /// <inheritdoc/>
    internal override void At(double T, out double mu, out double lambda)
    {
        double lnT = Math.Log(T);
        mu = Micropoise * Value(viscosity, T, lnT);
        lambda = MicrowattPerCentimetre * Value(conductivity, T, lnT);
    }

    private static double Value(Fit[] fits, double T, double lnT)
    {
        int i = 0;
        while (i < fits.Length - 1 && T > fits[i].Thigh)
            i++;
        Fit fit = fits[i];
        return Math.Exp((fit.A * lnT) + ((fit.B + (fit.C / T)) / T) + fit.D);
    }

    /// <summary>One interval: ln(value) = A ln T + B/T + C/T^2 + D.</summary>
    internal readonly record struct Fit(double Tlow, double Thigh, double A, double B, double C, double D);
}
