namespace FlowDuct.Fluids.Water;

/// <summary>Thermal conductivity of water: IAPWS R15-11 in its industrial form, with the critical enhancement from IF97 derivatives.</summary>
/// <remarks>Up to 1173.15 K over the pressures of IF97 (limit from memory). Reduced values in units of 1 mW/(m.K), as in the release.</remarks>
internal static class ThermalConductivity
{
    // R15-11, Eq. (1) to (6) and Table 3. cp is reduced with the gas constant of IAPWS-95, not with that of IF97.
    internal const double R = 461.51805;
    internal const double Lambda = 177.8514;
    private const double InverseCutOff = 0.40e-9;
    private const double Xi0 = 0.13e-9;
    private const double Gamma0 = 0.06;
    private const double NuByGamma = 0.630 / 1.239;
    private const double ReferenceT = 1.5;
    private const double LeastY = 1.2e-7;

    // At the critical point heat capacity and compressibility have no bound, and conductivity has none either: the cap keeps arithmetic finite.
    // No stable state of IF97 that is offered reaches it (cp is refused as a number long before).
    private const double Cap = 1e13;

    /// <summary>Conductivity, W/(m.K), of a state of one phase and its viscosity, Pa.s. R15-11, Eq. (15); check: Tables 7-9.</summary>
    /// <remarks>For stable states: (dv/dp) at constant T below zero and cp above. Elsewhere the number has no meaning; who offers it asks first.</remarks>
    internal static double Of(in RegionState at, double mu)
    {
        double t = at.T / WaterConstants.Tc, delta = 1 / (at.v * WaterConstants.rhoc);
        double byPressure = Capped(-at.vp / (at.v * at.v) * (WaterConstants.pc / WaterConstants.rhoc));
        return ((Dilute(t) * Dense(t, delta)) + Critical(t, delta, Capped(at.cp / R), at.cp / at.cv, byPressure, mu * 1e6)) * 1e-3;
    }

    /// <summary>lambda0 of the reduced temperature, Eq. (16).</summary>
    internal static double Dilute(double t)
    {
        ReadOnlySpan<double> L = WaterTables.ConductivityL0N;
        return Math.Sqrt(t) / (L[0] + ((L[1] + ((L[2] + ((L[3] + (L[4] / t)) / t)) / t)) / t));
    }

    /// <summary>lambda1 of reduced temperature and density, Eq. (17).</summary>
    internal static double Dense(double t, double delta) => Math.Exp(
        delta * PowerSum.Of((1 / t) - 1, delta - 1, WaterTables.ConductivityL1I, WaterTables.ConductivityL1J, WaterTables.ConductivityL1N));

    /// <summary>lambda2, Eq. (18): zeta is the reduced (drho/dp) at constant T, cp and mu reduced.</summary>
    internal static double Critical(double t, double delta, double cp, double kappa, double zeta, double mu)
    {
        double y = CorrelationLength(t, delta, zeta) / InverseCutOff;
        return Lambda * delta * cp * t / mu * Z(y, delta, kappa);
    }

    /// <summary>Correlation length, m, Eqs. (20)-(22); zero where the argument is negative.</summary>
    internal static double CorrelationLength(double t, double delta, double zeta)
    {
        double chi = delta * (zeta - (ReferenceZeta(delta) * ReferenceT / t));
        return chi > 0 ? Xi0 * Math.Exp(NuByGamma * Math.Log(chi / Gamma0)) : 0;
    }

    /// <summary>zeta at 1.5 times the critical temperature by the polynomials of the industrial form, Eqs. (25), (26).</summary>
    internal static double ReferenceZeta(double delta)
    {
        ReadOnlySpan<double> A = WaterTables.ConductivityZetaN;
        int first = 6 * delta switch { <= 0.310559006 => 0, <= 0.776397516 => 1, <= 1.242236025 => 2, <= 1.863354037 => 3, _ => 4 };
        double sum = 0;
        for (int i = 5; i >= 0; i--) sum = (sum * delta) + A[first + i];
        return 1 / sum;
    }

    // Eq. (19). 1 - exp(-u) of a small u by its half-angle form, which keeps the digits that a difference would lose.
    private static double Z(double y, double delta, double kappa)
    {
        if (y < LeastY) return 0;
        double u = 1 / ((1 / y) + (y * y / (3 * delta * delta)));
        double lost = 2 * Math.Exp(-u / 2) * Math.Sinh(u / 2);
        double share = 1 / kappa;
        return 2 / (Math.PI * y) * (((1 - share) * Math.Atan(y)) + (share * y) - lost);
    }

    private static double Capped(double value) => value >= 0 && value < Cap ? value : Cap;
}
