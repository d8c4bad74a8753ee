namespace FlowDuct.Fluids.Water.Verification;

/// <summary>Viscosity, conductivity, surface tension and ice lines by name, in the units of the releases.</summary>
internal static class TransportEquations
{
    internal static double Of(CheckRow row, double nudge) => row.Source switch
    {
        "IAPWS R12-08" => Viscosity.Of(row.First * nudge, row.Second) * 1e6,
        "IAPWS R1-76(2014)" => SurfaceTension.Of((row.First + 273.15) * nudge) * 1e3,
        "IAPWS R14-08(2011)" => Ice(row.Equation, row.First * nudge) / 1e6,
        _ => Conductivity(row, row.First * nudge, row.Second * nudge),
    };

    private static double Ice(string equation, double T) =>
        equation.StartsWith("melting", StringComparison.Ordinal) ? IceLine.MeltingPressure(T) : IceLine.SublimationPressure(T);

    // Tables 4 and 5 check the parts without the critical enhancement, Tables 7 to 9 the industrial form with IF97.
    private static double Conductivity(CheckRow row, double T, double second) => row.Table switch
    {
        "Table 7" => Industrial(row.Output, Region1.State(second * 1e6, T)),
        "Table 8" => Industrial(row.Output, Region2.State(second * 1e6, T)),
        "Table 9" => Industrial(row.Output, Region3.State(second, T)),
        _ => Background(row.Output, T / WaterConstants.Tc, second / WaterConstants.rhoc),
    };

    private static double Background(string output, double t, double delta) => output switch
    {
        "lambda0" => ThermalConductivity.Dilute(t),
        "lambda1" => ThermalConductivity.Dense(t, delta),
        _ => ThermalConductivity.Dilute(t) * ThermalConductivity.Dense(t, delta),
    };

    private static double Industrial(string output, in RegionState at)
    {
        double t = at.T / WaterConstants.Tc, delta = 1 / (at.v * WaterConstants.rhoc), mu = Viscosity.Of(at.T, 1 / at.v);
        double byPressure = -at.vp / (at.v * at.v), zeta = byPressure * WaterConstants.pc / WaterConstants.rhoc;
        double cp = at.cp / ThermalConductivity.R, critical = ThermalConductivity.Critical(t, delta, cp, at.cp / at.cv, zeta, mu * 1e6);
        return output switch
        {
            "lambda" => ThermalConductivity.Of(at, mu) * 1e3,
            "lambda0" or "lambda1" => Background(output, t, delta),
            "lambda2" => critical,
            "drho_dp_T" => byPressure * 1e6,
            "drho_dp_TR" => ThermalConductivity.ReferenceZeta(delta) * WaterConstants.rhoc / (WaterConstants.pc / 1e6),
            "xi" => ThermalConductivity.CorrelationLength(t, delta, zeta) * 1e9,
            "Z" => critical * mu * 1e6 / (ThermalConductivity.Lambda * delta * cp * t),
            "mu" => mu * 1e6,
            _ => BasicEquations.Property(at, output),
        };
    }
}
