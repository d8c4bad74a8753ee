namespace FlowDuct.Fluids.Gases;

/// <summary>By how much a real gas differs from the ideal one at the same pressure and temperature, to the second virial coefficient.</summary>
/// <remarks>
/// From v = R T/p + B(T) follow h = h_ideal + p (B - T B'), s = s_ideal - p B', cp = cp_ideal - p T B'' and
/// w^2 = v^2/[R T/p^2 - (T/cp)(R/p + B')^2], all per mole.
/// </remarks>
internal readonly record struct RealGasEstimate
{
    private RealGasEstimate(double Z, double sound, bool fails) => (this.Z, SoundDeviation, SeriesFails) = (Z, sound, fails);

    /// <summary>Compressibility factor p v/(R T); 0 or less where the estimate makes no gas at all.</summary>
    internal double Z { get; }

    /// <summary>Density of the real gas over that of the ideal one, less 1; 1 where the estimate makes no gas at all.</summary>
    internal double DensityDeviation => Z > 0.5 ? (1 / Z) - 1 : 1;

    /// <summary>Speed of sound of the real gas over that of the ideal one, less 1.</summary>
    internal double SoundDeviation { get; }

    /// <summary>True where the estimate itself is outside its range.</summary>
    internal bool SeriesFails { get; }

    /// <summary>The greatest of the deviations.</summary>
    internal double Worst => Math.Max(Math.Abs(Z - 1), Math.Max(Math.Abs(DensityDeviation), Math.Abs(SoundDeviation)));

    /// <summary>The estimate at a state of a gas.</summary>
    internal static RealGasEstimate Of(SecondVirial virial, double M, in FluidState at)
    {
        const double R = IdealGas.MolarGasConstant;
        double p = at.p, T = at.T;
        Virial b = virial.At(T);
        double Z = 1 + (b.B * p / (R * T));
        double cp = (at.cp * M) - (p * T * b.d2B);
        double rise = R + (p * b.dB);
        double stiffness = (R * T) - (T * rise * rise / cp); // p^2 times -(dv/dp) at constant s
        double real = Z > 0 && cp > 0 && stiffness > 0 ? Z * R * T / Math.Sqrt(stiffness * M) : 2 * at.w;
        return new RealGasEstimate(Z, (real / at.w) - 1, virial.FailsAt(p, T));
    }

    /// <summary>
    /// Greatest mass flux on the isentrope from rest over that of the ideal gas, less 1, to first order in B: at the throat pressure of
    /// the ideal gas the flux is stationary, so that its own change of pressure does not enter.
    /// </summary>
    internal static double CriticalFluxDeviation(SecondVirial virial, double M, in FluidState rest, in FluidState throat)
    {
        const double R = IdealGas.MolarGasConstant;
        Virial b0 = virial.At(rest.T), b = virial.At(throat.T);
        double heat = throat.T * ((throat.p * b.dB) - (rest.p * b0.dB)); // cp dT at the throat, of the same real entropy
        double dT = heat / (throat.cp * M);
        double dv = (dT / throat.T) + (b.B * throat.p / (R * throat.T)); // relative
        double drop = (rest.p * (b0.B - (rest.T * b0.dB))) - heat - (throat.p * (b.B - (throat.T * b.dB)));
        return (drop / (2 * (rest.h - throat.h) * M)) - dv;
    }
}
