namespace FlowDuct.Fluids.Gases;

/// <summary>
/// A reduced Helmholtz energy a/(R T) = ln(delta) + ideal part(tau) + residual part(delta, tau), delta = rho/rho_reducing,
/// tau = T_reducing/T, and the auxiliary equations that its paper prints beside it.
/// </summary>
internal abstract class HelmholtzEquation
{
    private protected HelmholtzEquation(
        EquationParameters parameters, MeltingLine melting, PowerLine? saturation = null, PowerLine? liquid = null, PowerLine? vapour = null,
        PowerLine? vapourOverT = null, PowerLine? bubble = null, PowerLine? dew = null)
    {
        (Parameters, Melting, Saturation, Liquid, Vapour, Bubble, Dew) = (parameters, melting, saturation, liquid, vapour ?? vapourOverT, bubble, dew);
        VapourIsOverT = vapourOverT is not null;
        R = parameters.Rmolar / parameters.M;
        rhoReducing = parameters.rhoReducing * parameters.M;
    }

    internal EquationParameters Parameters { get; }

    internal MeltingLine Melting { get; }

    /// <summary>ln(p/pc) T/Tc of saturation, an estimate; null for air.</summary>
    internal PowerLine? Saturation { get; }

    /// <summary>ln(rho/rhoc) of the saturated liquid, an estimate; null for air.</summary>
    internal PowerLine? Liquid { get; }

    /// <summary>ln(rho/rhoc) of the saturated vapour, an estimate; null for air.</summary>
    internal PowerLine? Vapour { get; }

    /// <summary>True where that sum is one of ln(rho/rhoc) T/Tc.</summary>
    internal bool VapourIsOverT { get; }

    /// <summary>ln(p/pj) T/Tj of the bubble line of air; null for the others.</summary>
    internal PowerLine? Bubble { get; }

    /// <summary>ln(p/pj) T/Tj of the dew line of air; null for the others.</summary>
    internal PowerLine? Dew { get; }

    /// <summary>Specific gas constant of the equation, J/(kg.K).</summary>
    internal double R { get; }

    /// <summary>Reducing density, kg/m3.</summary>
    internal double rhoReducing { get; }

    /// <summary>Reducing temperature, K; the critical one of nitrogen and carbon dioxide.</summary>
    internal double Treducing => Parameters.Treducing;

    /// <summary>The residual part with its scaled derivatives at x = delta, y = tau.</summary>
    internal abstract void Residual(double x, double y, out HelmholtzSums sum);

    /// <summary>The scaled derivatives of the residual part by density alone: what pressure and its slope need.</summary>
    internal abstract void ResidualByDensity(double x, double y, out double gx, out double gxx);

    /// <summary>The ideal part without ln(delta) and its scaled derivatives: g, tau g_tau, tau^2 g_tautau.</summary>
    internal abstract void Ideal(double y, out double g, out double gy, out double gyy);

    /// <summary>Pressure, Pa, at rho, kg/m3, and T, K, with (dp/drho) at constant T.</summary>
    internal double Pressure(double rho, double T, out double slope)
    {
        ResidualByDensity(rho / rhoReducing, Treducing / T, out double gx, out double gxx);
        double RT = R * T;
        slope = RT * (1 + (2 * gx) + gxx);
        return rho * RT * (1 + gx);
    }

    /// <summary>All properties at rho, kg/m3, and T, K.</summary>
    internal HelmholtzPoint At(double rho, double T)
    {
        double x = rho / rhoReducing, y = Treducing / T;
        Residual(x, y, out HelmholtzSums r);
        Ideal(y, out double g, out double gy, out double gyy);
        return new HelmholtzPoint(rho, T, R, g + Math.Log(x), gy, gyy, r);
    }
}
