namespace FlowDuct.Fluids.Water;

/// <summary>A region of one phase as a type argument: the code of an inverse is compiled for each, with nothing to decide in its loop.</summary>
internal interface IOnePhaseRegion
{
    static abstract RegionState State(double p, double T);

    static abstract void Caloric(double p, double T, out double h, out double s, out double cp);

    static abstract Phase PhaseAt(double p, double T);
}

/// <summary>Region 1.</summary>
internal readonly struct LiquidRegion : IOnePhaseRegion
{
    public static RegionState State(double p, double T) => Region1.State(p, T);

    public static void Caloric(double p, double T, out double h, out double s, out double cp) => Region1.Caloric(p, T, out h, out s, out cp);

    public static Phase PhaseAt(double p, double T) => Phase.Liquid;
}

/// <summary>Region 2.</summary>
internal readonly struct VapourRegion : IOnePhaseRegion
{
    public static RegionState State(double p, double T) => Region2.State(p, T);

    public static void Caloric(double p, double T, out double h, out double s, out double cp) => Region2.Caloric(p, T, out h, out s, out cp);

    public static Phase PhaseAt(double p, double T) => p > WaterConstants.pc && T > WaterConstants.Tc ? Phase.Supercritical : Phase.SuperheatedVapour;
}
