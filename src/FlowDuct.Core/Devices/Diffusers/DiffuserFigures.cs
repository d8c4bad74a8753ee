using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Diffusers;

/// <summary>Figures that only a diffuser has. Null is "cannot be known from what was given".</summary>
internal sealed record DiffuserFigures
{
    // Of the vapour pressure: the closure of the saturation line.
    private const double Line = 1 - 1e-9;

    internal double? IdealIncompressible { get; private init; }

    /// <summary>Recovery by the estimate, less and more its uncertainty, held to the ideal.</summary>
    internal Interval? RecoveryRange { get; private init; }

    /// <summary>Recovery of a sudden expansion of the same area ratio.</summary>
    internal double? SuddenExpansion { get; private init; }

    /// <summary>Dynamic pressure left in the exit over that of the inlet: lost where it discharges into a space.</summary>
    internal double? ExitLoss { get; private init; }

    internal double? Length { get; private init; }

    internal double? IncludedAngle { get; private init; }

    internal double? RelativeLength { get; private init; }

    internal double? FrictionFactor { get; private init; }

    internal StallLimit? Stall { get; private init; }

    /// <summary>Limiting angle over the angle, less one: negative past stall.</summary>
    internal double? StallMargin { get; private init; }

    internal BestGeometry? Best { get; private init; }

    /// <summary>Greatest recovery measured at the inlet blockage.</summary>
    internal double? GreatestMeasured { get; private init; }

    internal Starting? Starting { get; private init; }

    internal double? StandardRecovery { get; private init; }

    /// <summary>Stagnation pressure that a pitot tube reads in the supersonic inlet, Pa.</summary>
    internal double? PitotPressure { get; private init; }

    /// <summary>Lowest static pressure over the vapour pressure, Pa above it; of a liquid.</summary>
    internal double? CavitationMargin { get; private init; }

    /// <summary>That margin over the inlet dynamic pressure.</summary>
    internal double? CavitationNumber { get; private init; }

    internal static DiffuserFigures? Of(DeviceAnswer a, double recovery)
    {
        if (a.Diffuser is not DiffuserAnswer diffuser) return null;
        StationAnswer entry = DiffuserSolver.Entry(a);
        double head = entry.Stagnation is FluidState rest ? rest.p - entry.State.p : 0, dynamic = entry.State.rho * entry.Velocity!.Value * entry.Velocity.Value / 2;
        double? ideal = a.Performance.IdealRecovery ?? 1;
        double? margin = CavitationOf(a);
        return WithForm(a, diffuser, entry) with
        {
            RecoveryRange = diffuser.Loss is double K && DiffuserLoss.Find(a.Case.LossWord!) is DiffuserLoss row
                ? new Interval(recovery - row.Worse(K), Math.Min(recovery + row.Better(K), ideal.Value)) : null,
            ExitLoss = head > 0 && a.Exit.Stagnation is FluidState last ? (last.p - a.Exit.State.p) / head : null,
            FrictionFactor = diffuser.Loss is null ? null : diffuser.Friction,
            Starting = Diffusers.Starting.Of(a.Fluid, new Inlet(a.Inlet, StationFigures.Read(a.Case.Inlet, Station.Inlet), null, false)),
            StandardRecovery = a.Inlet.Mach > 1 ? RamRecovery.At(a.Inlet.Mach.Value) : null,
            PitotPressure = Pitot(a),
            CavitationMargin = margin,
            CavitationNumber = margin / dynamic,
        };
    }

    private static DiffuserFigures WithForm(DeviceAnswer a, DiffuserAnswer diffuser, StationAnswer entry)
    {
        if (diffuser.Geometry is not DiffuserGeometry geometry) return new DiffuserFigures();
        StallLimit? stall = geometry.IncludedAngle is null ? null : StallLimit.Of(geometry);
        bool blocked = a.Case.Has(CaseOption.InletBlockage);
        return new DiffuserFigures
        {
            IdealIncompressible = DiffuserLoss.Ideal(geometry.AreaRatio),
            SuddenExpansion = Sudden(a, entry, geometry.AreaRatio),
            Length = geometry.Length,
            IncludedAngle = geometry.IncludedAngle,
            RelativeLength = geometry.RelativeLength,
            Stall = stall,
            StallMargin = stall?.Angle / geometry.IncludedAngle - 1,
            Best = geometry.Shape == DiffuserShape.Planar || geometry.AreaRatio == 1 ? null : BestGeometry.Of(geometry, diffuser.Friction),
            GreatestMeasured = blocked ? BestRecovery.At(geometry.Shape, a.Case.Value(CaseOption.InletBlockage)) : null,
        };
    }

    private static double? Sudden(DeviceAnswer a, StationAnswer entry, double areaRatio)
    {
        if (entry.Stagnation is not FluidState rest || rest.p <= entry.State.p || entry.Velocity >= entry.State.w || areaRatio <= 1) return null;
        return Diffusers.SuddenExpansion.TryFind(a.Fluid, entry.State, entry.Velocity!.Value, entry.StagnationEnthalpy!.Value, areaRatio, out FluidState exit, out _)
            ? (exit.p - entry.State.p) / (rest.p - entry.State.p)
            : null;
    }

    private static double? Pitot(DeviceAnswer a) =>
        a.Inlet.Mach > 1 && NormalShock.TryFind(a.Fluid, a.Inlet.State, a.Inlet.Velocity!.Value, out FluidState behind, out double V2)
        && Stagnation.Of(a.Fluid, behind, V2, out FluidState rest) == Outcome.Ok ? rest.p : null;

    private static double? CavitationOf(DeviceAnswer a)
    {
        FluidState inlet = a.Inlet.State;
        if (inlet.Phase is not (Phase.Liquid or Phase.SaturatedLiquid) || !a.Fluid.TrySaturationPressure(inlet.T, out double vapour)) return null;
        double margin = Math.Min(inlet.p, a.Exit.State.p) - vapour;
        return Math.Abs(margin) < vapour * (1 - Line) ? 0 : margin;
    }
}
