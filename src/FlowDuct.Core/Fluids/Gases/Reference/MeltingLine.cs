namespace FlowDuct.Fluids.Gases;

/// <summary>The pressure at which a liquid freezes: p = pt (1 + a1 ((T/Tt)^t1 - 1) + a2 (T/Tt - 1)^2), T from the triple point Tt, K, pt, Pa.</summary>
/// <remarks>Equations of the papers of the equations of state, coefficients from memory (eos_melting.csv).</remarks>
internal sealed record MeltingLine(double Tt, double pt, double a1, double t1, double a2)
{
    /// <summary>Melting pressure, Pa, at T, K, not below the triple point.</summary>
    internal double Pressure(double T)
    {
        double rise = (T / Tt) - 1;
        return pt * (1 + (a1 * (t1 == 1 ? rise : Math.Pow(T / Tt, t1) - 1)) + (a2 * rise * rise));
    }

    /// <summary>Melting temperature, K, at p, Pa; that of the triple point below its pressure.</summary>
    internal double Temperature(double p)
    {
        if (p <= pt) return Tt;
        double excess = (p / pt) - 1;
        return a2 == 0
            ? Tt * Math.Pow((excess / a1) + 1, 1 / t1)
            : Tt * (1 + (2 * excess / (a1 + Math.Sqrt((a1 * a1) + (4 * a2 * excess)))));
    }
}
