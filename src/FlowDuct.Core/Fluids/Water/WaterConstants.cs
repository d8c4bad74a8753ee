namespace FlowDuct.Fluids.Water;

/// <summary>Reducing constants and region limits of IAPWS R7-97(2012), SI.</summary>
internal static class WaterConstants
{
    /// <summary>Specific gas constant, J/(kg.K), Eq. (1).</summary>
    internal const double R = 461.526;

    /// <summary>Critical temperature, K, Eq. (2).</summary>
    internal const double Tc = 647.096;

    /// <summary>Critical pressure, Pa, Eq. (3).</summary>
    internal const double pc = 22.064e6;

    /// <summary>Critical density, kg/m3, Eq. (4).</summary>
    internal const double rhoc = 322;

    /// <summary>Entropy of the critical point, J/(kg.K), SR3-03(2014), section 3.2.</summary>
    internal const double sc = 4412.02148223476;

    /// <summary>Triple-point temperature, K, Eq. (9).</summary>
    internal const double Tt = 273.16;

    /// <summary>Least temperature, K, section 2.</summary>
    internal const double TLeast = 273.15;

    /// <summary>Edge of regions 1 and 3, K, section 2.</summary>
    internal const double T13 = 623.15;

    /// <summary>Highest temperature of the edge of regions 2 and 3, K, section 4.</summary>
    internal const double TB23Most = 863.15;

    /// <summary>Edge of regions 2 and 5, K, section 2.</summary>
    internal const double T25 = 1073.15;

    /// <summary>Greatest temperature, K, section 2.</summary>
    internal const double TMost = 2273.15;

    /// <summary>Greatest pressure up to 1073.15 K, Pa, section 2.</summary>
    internal const double pMost = 100e6;

    /// <summary>Greatest pressure above 1073.15 K, Pa, section 9.</summary>
    internal const double pMost5 = 50e6;

    /// <summary>Least pressure of this implementation, Pa; the release says only that p is above zero.</summary>
    internal const double pLeast = 1;
}
