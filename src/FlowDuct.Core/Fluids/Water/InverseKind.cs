namespace FlowDuct.Fluids.Water;

/// <summary>The property that stands beside p in an inverse: how it reads a state, how it moves, where it starts.</summary>
internal interface IInverseKind
{
    /// <summary>The property of a state.</summary>
    static abstract double Of(in RegionState at);

    /// <summary>Its derivative by T at constant p.</summary>
    static abstract double ByT(in RegionState at);

    /// <summary>The property itself, of h and s.</summary>
    static abstract double Pick(double h, double s);

    /// <summary>Its derivative by T at constant p, of cp and T.</summary>
    static abstract double Slope(double cp, double T);

    /// <summary>No liquid of region 1 has more of it.</summary>
    static abstract double MostOfRegion1 { get; }

    /// <summary>No vapour of region 2 has less of it.</summary>
    static abstract double LeastOfRegion2 { get; }

    /// <summary>Its derivative by density at constant T, from the derivatives of p.</summary>
    static abstract double ByDensity(in RegionState at, double prho, double pT);

    /// <summary>Its derivative by T at constant density.</summary>
    static abstract double ByTAtDensity(in RegionState at, double pT);

    /// <summary>Below this size a difference is measured absolutely.</summary>
    static abstract double Scale { get; }

    static abstract double GuessRegion1(double p, double y);

    static abstract double GuessRegion2(double p, double y);

    static abstract (double rho, double T) GuessRegion3(double p, double y);
}

/// <summary>Specific enthalpy, J/kg.</summary>
internal readonly struct ByEnthalpy : IInverseKind
{
    public static double Scale => 1e3;

    public static double Of(in RegionState at) => at.h;

    // h' at 623.15 K is 1671 kJ/kg, h" at 273.15 K 2501 kJ/kg.
    public static double MostOfRegion1 => 1.675e6;

    public static double LeastOfRegion2 => 2.5e6;

    public static double ByT(in RegionState at) => at.cp;

    public static double Pick(double h, double s) => h;

    public static double Slope(double cp, double T) => cp;

    public static double ByDensity(in RegionState at, double prho, double pT) => (prho * at.v) - (at.T * pT * at.v * at.v);

    public static double ByTAtDensity(in RegionState at, double pT) => at.cv + (at.v * pT);

    public static double GuessRegion1(double p, double y) => Region1.TFromPH(p, y);

    public static double GuessRegion2(double p, double y) => Region2.TFromPH(p, y);

    public static (double rho, double T) GuessRegion3(double p, double y) => Region3Backward.FromPH(p, y);
}

/// <summary>Specific entropy, J/(kg.K).</summary>
internal readonly struct ByEntropy : IInverseKind
{
    public static double Scale => 1;

    public static double Of(in RegionState at) => at.s;

    // s' at 623.15 K is 3.778 kJ/(kg.K); along the edge of regions 2 and 3 s stays above 5.048 kJ/(kg.K).
    public static double MostOfRegion1 => 3.78e3;

    public static double LeastOfRegion2 => 5.04e3;

    public static double ByT(in RegionState at) => at.cp / at.T;

    public static double Pick(double h, double s) => s;

    public static double Slope(double cp, double T) => cp / T;

    public static double ByDensity(in RegionState at, double prho, double pT) => -pT * at.v * at.v;

    public static double ByTAtDensity(in RegionState at, double pT) => at.cv / at.T;

    public static double GuessRegion1(double p, double y) => Region1.TFromPS(p, y);

    public static double GuessRegion2(double p, double y) => Region2.TFromPS(p, y);

    public static (double rho, double T) GuessRegion3(double p, double y) => Region3Backward.FromPS(p, y);
}
