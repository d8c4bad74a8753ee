namespace FlowDuct.Fluids.Water;

/// <summary>Supersaturated vapour from saturation to 5 % equilibrium moisture, up to 10 MPa.</summary>
internal static class MetastableVapour
{
    /// <summary>State from p, Pa, and T, K. R7-97(2012), Eqs. (18), (19); check: Table 18.</summary>
    internal static RegionState State(double p, double T) => GibbsLoop.State(
        p, T, 540 / T, 0.5, WaterTables.Region2MetastableIdealJ, WaterTables.Region2MetastableIdealN,
        WaterTables.Region2MetastableResidualI, WaterTables.Region2MetastableResidualJ, WaterTables.Region2MetastableResidualN);
}
