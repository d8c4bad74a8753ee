namespace FlowDuct.Devices.Diffusers;

/// <summary>The included angle up to which a diffuser is met unstalled.</summary>
/// <param name="Angle">The limit, rad.</param>
/// <param name="Spread">How uncertain it is, as a part: below (1 - Spread) no stall is expected, above (1 + Spread) it is.</param>
/// <param name="Standing">Where it comes from.</param>
internal readonly record struct StallLimit(double Angle, double Spread, string Standing)
{
    private const double Degree = Math.PI / 180;

    // Line a-a of the planar map, a fit through points recalled from the published chart; its range.
    private const double LeastLength = 1.5;
    private const double GreatestLength = 25;

    // A cone of 10 to 14 deg between its walls: steady attached flow is quoted up to 7 deg half angle, 10 to 12 deg where length is short.
    internal const double Cone = 12 * Degree;
    private const double ConeSpread = 1.0 / 6;

    /// <summary>The limit of a geometry; null of a planar diffuser whose length lies outside the chart or is not known.</summary>
    internal static StallLimit? Of(in DiffuserGeometry geometry)
    {
        if (geometry.Shape != DiffuserShape.Planar) return new StallLimit(Cone, ConeSpread, "common practice: 10 to 14 deg between the walls of a cone");
        return geometry.RelativeLength is double length and >= LeastLength and <= GreatestLength
            ? new StallLimit(Planar(length), 0.2, "Fox and Kline, J. Basic Eng. 84 (1962) 303, line a-a, fit from memory, to 20 %")
            : null;
    }

    /// <summary>2 theta = 24 (N/W1)^-0.47 deg, the line of first appreciable stall of planar diffusers, rad.</summary>
    internal static double Planar(double length) => 24 * Degree * Math.Pow(length, -0.47);
}
