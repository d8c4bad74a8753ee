using FlowDuct.Devices.Coefficients;

namespace FlowDuct.Devices.Diffusers;

/// <summary>What a correlation of the loss asks of a diffuser.</summary>
/// <param name="Geometry">Its form.</param>
/// <param name="Friction">Darcy friction factor of the inlet.</param>
/// <param name="Blockage">Share of the inlet area that the boundary layers block; null where it is not given.</param>
/// <param name="Mach">Mach number of the inlet.</param>
internal readonly record struct DiffuserFlow(DiffuserGeometry Geometry, double Friction, double? Blockage, double Mach)
{
    /// <summary>Included angle, rad; 0 where it is not known.</summary>
    internal double Angle => Geometry.IncludedAngle ?? 0;

    internal double AreaRatio => Geometry.AreaRatio;
}

/// <summary>A published equation for the loss coefficient of a diffuser.</summary>
/// <remarks>
/// They were found at low speed on rho V1^2/2; here they count on p0,1 - p1, on which the recovery keeps its value up to a Mach number of about 0.7
/// (Runstadler and Dean, J. Basic Eng. 91 (1969) 397; common practice). Where an inlet blockage is given the recovery is held to the greatest
/// that was measured at it.
/// </remarks>
/// <param name="Name">The name on the command line.</param>
/// <param name="Description">What it stands for.</param>
/// <param name="Standing">Source, and how its numbers are known.</param>
/// <param name="Formula">K.</param>
/// <param name="Angle">Published range of the included angle, rad.</param>
/// <param name="Uncertainty">As a part of K.</param>
/// <param name="Cone">True where it holds for cones, and for what stands for one.</param>
internal sealed record DiffuserLoss(
    string Name, string Description, string Standing, Func<DiffuserFlow, double> Formula, ArgumentRange Angle, double Uncertainty, bool Cone)
{
    private const double Degree = Math.PI / 180;

    // Kinetic-energy factors are taken as one: with thick layers that moves a recovery by this much.
    private const double ProfileUncertainty = 0.05;

    // The one chart point at hand, Sovran and Klomp (1967), N/R1 4.66, AR 2.13, blockage 0.02, has Cp 0.60, which is 0.11 below the equations.
    private const double ChartShortfall = 0.12;

    private static readonly ArgumentRange s_mach = new("M", 0, 0.7);

    internal static readonly DiffuserLoss[] All =
    [
        new("idelchik", "cone, Idelchik with wall friction", "Idelchik, Handbook of Hydraulic Resistance, formula from memory",
            flow => ConeLosses.Idelchik(flow.Angle, flow.AreaRatio, flow.Friction), new("included angle", 0, 40 * Degree), 0.15, true),
        new("gibson", "cone, Gibson", "A. H. Gibson, 1910 to 1912, formula from memory",
            flow => ConeLosses.Gibson(flow.Angle, flow.AreaRatio), new("included angle", 7.5 * Degree, 35 * Degree), 0.15, true),
        new("crane", "cone, Crane", "Crane Technical Paper 410, as quoted elsewhere and from memory",
            flow => ConeLosses.Crane(flow.Angle, flow.AreaRatio), new("included angle", 0, Math.PI), 0.2, true),
        new("best-planar", "planar, the effectiveness of the best one at its inlet blockage", BestRecovery.Standing + "; its use for other geometries is FlowDuct's own",
            BestPlanar, new("included angle", 0, Math.PI), 0.3, false),
    ];

    /// <summary>The word of the exact sudden expansion, which is no equation of a loss but a balance.</summary>
    internal const string Sudden = "sudden-expansion";

    /// <summary>Every word that stands for a loss.</summary>
    internal static IEnumerable<string> Words => [.. All.Select(row => row.Name), Sudden];

    internal static DiffuserLoss? Find(string name) => Array.Find(All, row => row.Name == name);

    /// <summary>The loss coefficient.</summary>
    internal double At(in DiffuserFlow flow)
    {
        double K = Formula(flow), ideal = Ideal(flow.AreaRatio);
        return flow.Blockage is double B && BestRecovery.At(flow.Geometry.Shape, B) is double most ? Math.Max(K, ideal - most) : K;
    }

    /// <summary>By how much a real recovery may be better than estimated.</summary>
    internal double Better(double K) => Math.Max(Uncertainty * K, ProfileUncertainty);

    /// <summary>By how much it may be worse.</summary>
    internal double Worse(double K) => Math.Max(Uncertainty * K, ChartShortfall);

    /// <summary>The first limit that a diffuser crosses; null inside.</summary>
    internal Crossing? CrossedBy(in DiffuserFlow flow) =>
        Angle.Cross(flow.Angle) ?? s_mach.Cross(flow.Mach) ?? (flow.Blockage is double B ? BestRecovery.Blockage.Cross(B) : null);

    /// <summary>1 - 1/AR^2.</summary>
    internal static double Ideal(double AR) => 1 - (1 / (AR * AR));

    // The best planar diffusers of the table are about 18 widths long and lie at first stall.
    private static double BestPlanar(DiffuserFlow flow)
    {
        const double length = 18;
        double AR = 1 + (2 * length * Math.Tan(StallLimit.Planar(length) / 2));
        double B = Math.Clamp(flow.Blockage ?? BestRecovery.Blockage.Least, BestRecovery.Blockage.Least, BestRecovery.Blockage.Greatest);
        double effectiveness = Math.Min(1, BestRecovery.At(DiffuserShape.Planar, B)!.Value / Ideal(AR));
        return (1 - effectiveness) * Ideal(flow.AreaRatio);
    }
}
