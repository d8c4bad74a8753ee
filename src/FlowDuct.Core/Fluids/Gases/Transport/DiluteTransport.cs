namespace FlowDuct.Fluids.Gases;

/// <summary>
/// Dilute-gas part of E. W. Lemmon, R. T. Jacobsen, Int. J. Thermophys. 25 (2004) 21-69: nitrogen, oxygen, argon and air.
/// Uncertainty quoted by the authors, from memory: about 1 % in viscosity, 2 % in conductivity.
/// </summary>
internal sealed class DiluteTransport(double Tlow, double Thigh) : PureTransport
{
    /// <summary>Molar mass, g/mol, as used in the equation.</summary>
    internal required double M { get; init; }

    /// <summary>Lennard-Jones energy over the Boltzmann constant, K.</summary>
    internal required double EpsilonOverK { get; init; }

    /// <summary>Lennard-Jones size, nm.</summary>
    internal required double Sigma { get; init; }

    /// <summary>Coefficient of power 0 in the collision integral.</summary>
    internal required double b0 { get; init; }

    /// <summary>Coefficient of power 1 in the collision integral.</summary>
    internal required double b1 { get; init; }

    /// <summary>Coefficient of power 2 in the collision integral.</summary>
    internal required double b2 { get; init; }

    /// <summary>Coefficient of power 3 in the collision integral.</summary>
    internal required double b3 { get; init; }

    /// <summary>Coefficient of power 4 in the collision integral.</summary>
    internal required double b4 { get; init; }

    /// <summary>Reducing temperature, K.</summary>
    internal required double Treducing { get; init; }

    /// <summary>Factor of the viscosity in the conductivity.</summary>
    internal required double N1 { get; init; }

    /// <summary>Factor of the second term of the conductivity, mW/(m.K).</summary>
    internal required double N2 { get; init; }

    /// <summary>Exponent of the second term.</summary>
    internal required double t2 { get; init; }

    /// <summary>Factor of the third term of the conductivity, mW/(m.K).</summary>
    internal required double N3 { get; init; }

    /// <summary>Exponent of the third term.</summary>
    internal required double t3 { get; init; }

    /// <inheritdoc/>
    internal override double Tlow { get; } = Tlow;

    /// <inheritdoc/>
    internal override double Thigh { get; } = Thigh;

    /// <inheritdoc/>
    internal override void At(double T, out double mu, out double lambda)
    {
        double x = Math.Log(T / EpsilonOverK);
        double lnOmega = b0 + (x * (b1 + (x * (b2 + (x * (b3 + (x * b4)))))));
        double eta = 0.0266958 * Math.Sqrt(M * T) / (Sigma * Sigma) * Math.Exp(-lnOmega);
        double lnTau = Math.Log(Treducing / T);
        mu = 1e-6 * eta;
        lambda = 1e-3 * ((N1 * eta) + (N2 * Math.Exp(t2 * lnTau)) + (N3 * Math.Exp(t3 * lnTau)));
    }
}
