namespace FlowDuct.Devices.Coefficients;

/// <summary>Wall pressure over ambient pressure at which the flow of an overexpanded nozzle leaves the wall.</summary>
/// <remarks>
/// Fits to rocket-type nozzles with turbulent layers, formulas from memory: in a plant nozzle they bound a warning, they predict nothing.
/// Summerfield, Foster and Swan, Jet Propulsion 24 (1954) 319; Schmucker, NASA TM-77396 (1984); Kalt and Badal, J. Spacecraft Rockets 2 (1965)
/// 447; Stark, DLR.
/// </remarks>
internal static class SeparationCriteria
{
    internal const string Standing = "papers, from memory: fits to rocket-type nozzles";

    // Summerfield and others name a band, not a function.
    private const double SummerfieldLeast = 0.35;
    private const double SummerfieldGreatest = 0.40;

    private static readonly ArgumentRange s_schmuckerMach = new("M", 1.75, 5);
    private static readonly ArgumentRange s_starkMach = new("M", 2.4, 4.5);
    private static readonly ArgumentRange s_kaltBadalRatio = new("p0/pa", 10, 200);

    /// <summary>(1.88 M - 1)^-0.64, M 1.75 to 5; null outside.</summary>
    internal static double? Schmucker(double M) => s_schmuckerMach.Cross(M) is null ? Math.Pow((1.88 * M) - 1, -0.64) : null;

    /// <summary>(2/3)(pa/p0)^0.2, p0/pa 10 to 200; null outside.</summary>
    internal static double? KaltBadal(double p0OverPa) => s_kaltBadalRatio.Cross(p0OverPa) is null ? 2.0 / 3 * Math.Pow(p0OverPa, -0.2) : null;

    /// <summary>pi/(3 M), M 2.4 to 4.5; null outside.</summary>
    internal static double? Stark(double M) => s_starkMach.Cross(M) is null ? Math.PI / (3 * M) : null;

    /// <summary>Least and greatest of the criteria that hold at a Mach number and a stagnation pressure over ambient pressure.</summary>
    internal static Interval Band(double M, double p0OverPa)
    {
        double least = SummerfieldLeast, greatest = SummerfieldGreatest;
        foreach (double? ratio in (double?[])[Schmucker(M), KaltBadal(p0OverPa), Stark(M)])
        {
            if (ratio is not double at) continue;
            (least, greatest) = (Math.Min(least, at), Math.Max(greatest, at));
        }

        return new Interval(least, greatest);
    }
}
