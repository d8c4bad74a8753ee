namespace FlowDuct.Fluids.Gases;

/// <summary>What one walk over a Helmholtz energy yields at a density and a temperature, SI.</summary>
/// <remarks>The relations of a Helmholtz energy to properties: R. Span, W. Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509, Table 3.</remarks>
internal readonly struct HelmholtzPoint
{
    internal readonly double rho;
    internal readonly double T;
    internal readonly double p;
    internal readonly double h;
    internal readonly double s;
    internal readonly double cv;

    /// <summary>(dp/drho) at constant T, J/kg; not above zero where the phase is unstable.</summary>
    internal readonly double prho;

    /// <summary>(dp/dT) at constant density, Pa/K.</summary>
    internal readonly double pT;

    internal HelmholtzPoint(double rho, double T, double R, double g0, double gy0, double gyy0, in HelmholtzSums r)
    {
        double RT = R * T, gy = gy0 + r.gy;
        (this.rho, this.T) = (rho, T);
        p = rho * RT * (1 + r.gx);
        h = RT * (1 + gy + r.gx);
        s = R * (gy - g0 - r.g);
        cv = -R * (gyy0 + r.gyy);
        prho = RT * (1 + (2 * r.gx) + r.gxx);
        pT = rho * R * (1 + r.gx - r.gxy);
    }

    /// <summary>Specific volume, m3/kg.</summary>
    internal double v => 1 / rho;

    /// <summary>Specific Helmholtz energy, J/kg.</summary>
    internal double a => h - (p / rho) - (T * s);

    /// <summary>Heat capacity at constant pressure, J/(kg.K).</summary>
    internal double cp => cv + (T * pT * pT / (rho * rho * prho));

    /// <summary>Square of the speed of sound, m2/s2; finite at the critical point too.</summary>
    internal double w2 => prho + (T * pT * pT / (rho * rho * cv));

    /// <summary>(dh/drho) at constant T.</summary>
    internal double hrho => (prho / rho) - (T * pT / (rho * rho));

    /// <summary>(dh/dT) at constant density.</summary>
    internal double hT => cv + (pT / rho);

    /// <summary>(ds/drho) at constant T.</summary>
    internal double srho => -pT / (rho * rho);

    /// <summary>(ds/dT) at constant density.</summary>
    internal double sT => cv / T;

    /// <summary>The state of one phase at exactly the pressure p, Pa, that was asked for.</summary>
    internal FluidState ToState(double p, Phase phase, Notices notices, double x = 0) =>
        new(p, T, v, h, s, prho > 0 ? cp : 0, cv, Math.Sqrt(w2), x, phase, notices);
}
