namespace FlowDuct.Fluids.Gases;

/// <summary>Pressure and temperature of the standard atmosphere over altitude, -5 km to 86 km.</summary>
/// <remarks>
/// U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562), Eqs. (23), (33a), (33b), Table 4; up to 32 km the same as ISO 2533:1975 and the
/// ICAO standard atmosphere. The layers are told by geopotential altitude H = r z/(r + z) of the geometric altitude z, Eq. (18).
/// </remarks>
public static class StandardAtmosphere
{
    /// <summary>Least geometric altitude, m.</summary>
    internal const double LeastAltitude = -5000;

    /// <summary>Greatest geometric altitude, m.</summary>
    internal const double GreatestAltitude = 86_000;

    /// <summary>Pressure at sea level, Pa.</summary>
    internal const double SeaLevelPressure = 101325;

    // The standard keeps its own constants: effective radius of the earth, m; gravity, m/s2; molar mass, g/mol; gas constant, J/(kmol.K).
    private const double EarthRadius = 6_356_766;
    private const double GravityOverR = 9.80665 * 28.9644 / 8314.32;

    // Molecular-scale temperature; above 80 km the molar mass falls by 4e-4 at most, which the pressure does not see.
    private static ReadOnlySpan<double> BaseAltitudes => [0, 11_000, 20_000, 32_000, 47_000, 51_000, 71_000];

    private static ReadOnlySpan<double> BaseTemperatures => [288.15, 216.65, 216.65, 228.65, 270.65, 270.65, 214.65];

    private static ReadOnlySpan<double> Lapses => [-0.0065, 0, 0.001, 0.0028, 0, -0.0028, -0.002];

    /// <summary>Pressure and temperature at a geometric altitude: the height above mean sea level.</summary>
    /// <param name="z">Geometric altitude, m.</param>
    /// <param name="p">Pressure, Pa.</param>
    /// <param name="T">Temperature, K.</param>
    /// <returns>False outside -5 km to 86 km.</returns>
    public static bool TryAtAltitude(double z, out double p, out double T) => TryAtGeopotential(Geopotential(z), out p, out T);

    /// <summary>Pressure and temperature at a geopotential altitude.</summary>
    /// <param name="H">Geopotential altitude, m.</param>
    /// <param name="p">Pressure, Pa.</param>
    /// <param name="T">Temperature, K.</param>
    /// <returns>False outside the altitudes of <see cref="TryAtAltitude"/>.</returns>
    public static bool TryAtGeopotential(double H, out double p, out double T)
    {
        (p, T) = (0, 0);
        if (!(H >= Geopotential(LeastAltitude) && H <= Geopotential(GreatestAltitude)))
            return false;
        p = SeaLevelPressure;
        int layer = 0;
        for (; layer < Lapses.Length - 1 && H > BaseAltitudes[layer + 1]; layer++)
            p *= PressureRatio(layer, BaseAltitudes[layer + 1]);
        p *= PressureRatio(layer, H);
        T = Temperature(layer, H);
        return true;
    }

    /// <summary>Geopotential altitude, m, of a geometric one, m.</summary>
    internal static double Geopotential(double z) => EarthRadius * z / (EarthRadius + z);

    private static double Temperature(int layer, double H) => BaseTemperatures[layer] + (Lapses[layer] * (H - BaseAltitudes[layer]));

    // p/pb in a layer of falling or rising temperature, and in one of level temperature.
    private static double PressureRatio(int layer, double H)
    {
        double Tb = BaseTemperatures[layer], L = Lapses[layer];
        return L == 0
            ? Math.Exp(-GravityOverR * (H - BaseAltitudes[layer]) / Tb)
            : Math.Pow(Temperature(layer, H) / Tb, -GravityOverR / L);
    }
}
