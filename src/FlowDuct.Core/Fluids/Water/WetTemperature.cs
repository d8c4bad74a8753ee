namespace FlowDuct.Fluids.Water;

/// <summary>Temperature of wet steam from h and s. SR4-04(2014); check: Table 29.</summary>
internal static class WetTemperature
{
    /// <summary>Temperature, K, at h, J/kg, and s, J/(kg.K), inside the wet region with s at least s"(623.15 K). Eq. (9); within 1 mK.</summary>
    internal static double Of(double h, double s) =>
        550 * PowerSum.Of((h / 2800e3) - 0.119, (s / 9.2e3) - 1.07, WaterTables.TsatHsI, WaterTables.TsatHsJ, WaterTables.TsatHsN);
}
