namespace FlowDuct.Fluids.Water;

/// <summary>The edges of region 3 as functions of h and s. SR4-04(2014); checks: Tables 24 and 26.</summary>
internal static class EnthalpyEntropyEdges
{
    /// <summary>Enthalpy, J/kg, of the edge of regions 1 and 3 at s, J/(kg.K), 3.397782955 kJ/(kg.K) to s'(623.15 K). Eq. (7).</summary>
    internal static double hB13(double s) =>
        1700e3 * PowerSum.Of((s / 3.8e3) - 0.884, (s / 3.8e3) - 0.864, WaterTables.HB13SI, WaterTables.HB13SJ, WaterTables.HB13SN);

    /// <summary>
    /// Temperature, K, of the edge of regions 2 and 3 near h, J/kg, and s, J/(kg.K): h from 2563.592004 to 2812.942061 kJ/kg, s from
    /// 5.048096828 to 5.260578707 kJ/(kg.K). Eq. (8). A pressure above pB23 of it belongs to region 3.
    /// </summary>
    internal static double TB23(double h, double s) =>
        900 * PowerSum.Of((h / 3000e3) - 0.727, (s / 5.3e3) - 0.864, WaterTables.TB23HsI, WaterTables.TB23HsJ, WaterTables.TB23HsN);
}
