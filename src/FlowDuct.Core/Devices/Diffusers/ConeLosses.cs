namespace FlowDuct.Devices.Diffusers;

/// <summary>
/// Loss of stagnation pressure of cones over the inlet dynamic pressure, incompressible and turbulent: phi is the included angle, rad, AR the area ratio.
/// </summary>
internal static class ConeLosses
{
    // Above this angle Crane counts a cone as a sudden expansion.
    private const double Sudden = Math.PI / 4;

    /// <summary>K = 3.5 (tan(phi/2))^1.22 (1 - 1/AR)^2; A. H. Gibson, 1910 to 1912, formula from memory.</summary>
    internal static double Gibson(double phi, double AR) => 3.5 * Math.Pow(Math.Tan(phi / 2), 1.22) * BordaCarnot(AR);

    /// <summary>
    /// K = 3.2 (tan(phi/2))^1.25 (1 - 1/AR)^2 + f/(8 sin(phi/2)) (1 - 1/AR^2), f the Darcy friction factor; I. E. Idelchik, Handbook of Hydraulic
    /// Resistance, formula from memory.
    /// </summary>
    internal static double Idelchik(double phi, double AR, double f) =>
        (3.2 * Math.Pow(Math.Tan(phi / 2), 1.25) * BordaCarnot(AR)) + (f == 0 || AR == 1 ? 0 : f / (8 * Math.Sin(phi / 2)) * (1 - (1 / (AR * AR))));

    /// <summary>K = 2.6 sin(phi/2) (1 - 1/AR)^2 up to 45 deg, (1 - 1/AR)^2 above; Crane Technical Paper 410, as quoted elsewhere.</summary>
    internal static double Crane(double phi, double AR) => (phi > Sudden ? 1 : 2.6 * Math.Sin(phi / 2)) * BordaCarnot(AR);

    /// <summary>(1 - 1/AR)^2, a sudden expansion: momentum balance.</summary>
    internal static double BordaCarnot(double AR) => (1 - (1 / AR)) * (1 - (1 / AR));
}
