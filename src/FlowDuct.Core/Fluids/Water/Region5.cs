namespace FlowDuct.Fluids.Water;

/// <summary>Region 5, hot vapour: 1073.15 K to 2273.15 K up to 50 MPa.</summary>
internal static class Region5
{
    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eqs. (32)-(34); check: Table 42.</summary>
    internal static RegionState State(double p, double T) => GibbsLoop.State(
        p, T, 1000 / T, 0, WaterTables.Region5IdealJ, WaterTables.Region5IdealN,
        WaterTables.Region5ResidualI, WaterTables.Region5ResidualJ, WaterTables.Region5ResidualN);
}
