namespace FlowDuct.Devices.Diffusers;

/// <summary>The cone of greatest recovery by a loss equation: at a given length up to first stall, and at a given area ratio.</summary>
/// <remarks>
/// G. Sovran, E. D. Klomp, Fluid Mechanics of Internal Flow (1967) 270, inlet blockage 0.02: N/R1 4.66 has its best at AR 2.13 (read), AR 1.8 at N/R1 7.85 (from
/// memory); this finds 2.22, and 7.1 at a friction factor of 0.010.
/// </remarks>
/// <param name="AreaRatio">Area ratio of greatest recovery at the length.</param>
/// <param name="Recovery">The recovery there, incompressible.</param>
/// <param name="Angle">Included angle of greatest recovery at the area ratio, rad.</param>
/// <param name="RelativeLength">N/R1 there.</param>
internal readonly record struct BestGeometry(double? AreaRatio, double? Recovery, double Angle, double RelativeLength)
{
    // Of the ends searched: no diffuser is sharper or blunter than these, and none past stall is the best.
    private const double LeastAngle = 0.5 * Math.PI / 180;
    private const double GreatestAngle = 40 * Math.PI / 180;

    /// <summary>The best cones by Idelchik's equation at a friction factor.</summary>
    internal static BestGeometry Of(in DiffuserGeometry geometry, double friction)
    {
        double ratio = geometry.AreaRatio, angle = Greatest(phi => -ConeLosses.Idelchik(phi, ratio, friction), LeastAngle, GreatestAngle);
        double length = (Math.Sqrt(ratio) - 1) / Math.Tan(angle / 2);
        if (geometry.RelativeLength is not double given) return new BestGeometry(null, null, angle, length);
        double opened = 1 + (given * Math.Tan(StallLimit.Cone / 2)), best = Greatest(AR => RecoveryAt(AR, given, friction), 1.001, opened * opened);
        return new BestGeometry(best, RecoveryAt(best, given, friction), angle, length);
    }

    private static double RecoveryAt(double AR, double length, double friction) =>
        DiffuserLoss.Ideal(AR) - ConeLosses.Idelchik(2 * Math.Atan((Math.Sqrt(AR) - 1) / length), AR, friction);

    // Each of the two has one greatest value: golden section.
    private static double Greatest(Func<double, double> f, double a, double b)
    {
        const double Golden = 0.6180339887498949;
        for (int i = 0; i < 80; i++)
        {
            double c = b - (Golden * (b - a)), d = a + (Golden * (b - a));
            if (f(c) > f(d)) b = d;
            else a = c;
        }

        return (a + b) / 2;
    }
}
