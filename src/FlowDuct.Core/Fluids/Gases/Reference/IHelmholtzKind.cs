namespace FlowDuct.Fluids.Gases;

/// <summary>The property that stands beside pressure in an inverse: enthalpy or entropy.</summary>
internal interface IHelmholtzKind
{
    /// <summary>The size below which closure is absolute.</summary>
    static abstract double Scale { get; }

    /// <summary>The property.</summary>
    static abstract double Of(in HelmholtzPoint at);

    /// <summary>Its derivative by density at constant T.</summary>
    static abstract double ByDensity(in HelmholtzPoint at);

    /// <summary>Its derivative by T at constant density.</summary>
    static abstract double ByTemperature(in HelmholtzPoint at);

    /// <summary>Its derivative by T at constant pressure.</summary>
    static abstract double ByTemperatureAtPressure(in HelmholtzPoint at);
}

/// <summary>Specific enthalpy, J/kg.</summary>
internal readonly struct HelmholtzEnthalpy : IHelmholtzKind
{
    public static double Scale => 1e3;

    public static double Of(in HelmholtzPoint at) => at.h;

    public static double ByDensity(in HelmholtzPoint at) => at.hrho;

    public static double ByTemperature(in HelmholtzPoint at) => at.hT;

    public static double ByTemperatureAtPressure(in HelmholtzPoint at) => at.cp;
}

/// <summary>Specific entropy, J/(kg.K).</summary>
internal readonly struct HelmholtzEntropy : IHelmholtzKind
{
    public static double Scale => 1;

    public static double Of(in HelmholtzPoint at) => at.s;

    public static double ByDensity(in HelmholtzPoint at) => at.srho;

    public static double ByTemperature(in HelmholtzPoint at) => at.sT;

    public static double ByTemperatureAtPressure(in HelmholtzPoint at) => at.cp / at.T;
}
