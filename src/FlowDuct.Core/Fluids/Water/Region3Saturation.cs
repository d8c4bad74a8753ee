namespace FlowDuct.Fluids.Water;

/// <summary>Saturation pressure, Pa, of region 3 from the enthalpy or entropy of either saturated phase. SR3-03(2014).</summary>
internal static class Region3Saturation
{
    /// <summary>From h, J/kg, between h'(623.15 K) and h"(623.15 K). Eq. (10); within 0.00043 %; check: Table 18.</summary>
    internal static double PressureFromH(double h) => 22e6 * PowerSum.Of(
        (h / 2600e3) - 1.02, (h / 2600e3) - 0.608, WaterTables.Region3PsatHI, WaterTables.Region3PsatHJ, WaterTables.Region3PsatHN);

    /// <summary>From s, J/(kg.K), between s'(623.15 K) and s"(623.15 K). Eq. (11); within 0.0033 %; check: Table 20.</summary>
    internal static double PressureFromS(double s) => 22e6 * PowerSum.Of(
        (s / 5.2e3) - 1.03, (s / 5.2e3) - 0.699, WaterTables.Region3PsatSI, WaterTables.Region3PsatSJ, WaterTables.Region3PsatSN);
}
