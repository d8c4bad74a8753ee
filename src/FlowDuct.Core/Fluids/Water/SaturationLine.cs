namespace FlowDuct.Fluids.Water;

/// <summary>Region 4: pressure and temperature of saturation, 273.15 K to 647.096 K. R7-97(2012), Eqs. (29)-(31).</summary>
internal static class SaturationLine
{
    /// <summary>Saturation pressure at 273.15 K, Pa: below it there is no liquid in the range.</summary>
    internal static readonly double pAtLeastT = Pressure(WaterConstants.TLeast);

    /// <summary>Saturation pressure at 623.15 K, Pa: above it region 3 holds both saturated states.</summary>
    internal static readonly double pAtT13 = Pressure(WaterConstants.T13);

    /// <summary>Pressure, Pa, at T, K. Eq. (30); check: Table 35.</summary>
    internal static double Pressure(double T)
    {
        ReadOnlySpan<double> n = WaterTables.Region4N;
        double t = T + (n[8] / (T - n[9]));
        double a = (t * t) + (n[0] * t) + n[1];
        double b = (n[2] * t * t) + (n[3] * t) + n[4];
        double c = (n[5] * t * t) + (n[6] * t) + n[7];
        double beta = 2 * c / (-b + Math.Sqrt((b * b) - (4 * a * c)));
        return beta * beta * beta * beta * 1e6;
    }

    /// <summary>Temperature, K, at p, Pa. Eq. (31); check: Table 36.</summary>
    internal static double Temperature(double p)
    {
        ReadOnlySpan<double> n = WaterTables.Region4N;
        double beta = Math.Sqrt(Math.Sqrt(p * 1e-6));
        double e = (beta * beta) + (n[2] * beta) + n[5];
        double f = (n[0] * beta * beta) + (n[3] * beta) + n[6];
        double g = (n[1] * beta * beta) + (n[4] * beta) + n[7];
        double d = 2 * g / (-f - Math.Sqrt((f * f) - (4 * e * g)));
        double sum = n[9] + d;
        return (sum - Math.Sqrt((sum * sum) - (4 * (n[8] + (n[9] * d))))) / 2;
    }

    /// <summary>Slope dT/dp of the line, K/Pa, by differentiating Eq. (29) itself.</summary>
    internal static double Slope(double p, double T)
    {
        ReadOnlySpan<double> n = WaterTables.Region4N;
        double beta = Math.Sqrt(Math.Sqrt(p * 1e-6)), t = T + (n[8] / (T - n[9]));
        double byBeta = (2 * beta * t * t) + (2 * n[0] * beta * t) + (2 * n[1] * beta) + (n[2] * t * t) + (n[3] * t) + n[4];
        double byT = (2 * beta * beta * t) + (n[0] * beta * beta) + (2 * n[2] * beta * t) + (n[3] * beta) + (2 * n[5] * t) + n[6];
        double tByT = 1 - (n[8] / ((T - n[9]) * (T - n[9])));
        return -byBeta / byT * beta / (4 * p) / tByT;
    }
}
