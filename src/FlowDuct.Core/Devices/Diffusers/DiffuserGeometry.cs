using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Diffusers;

/// <summary>The form of a diffuser as far as it is known.</summary>
/// <remarks>
/// Cone: AR = (1 + (N/R1) tan theta)^2; planar: AR = 1 + 2 (N/W1) tan theta, theta half the included angle. An annular diffuser or one of another form
/// stands for the cone of its areas and length (common practice).
/// </remarks>
/// <param name="Shape">Its form.</param>
/// <param name="AreaRatio">Exit over inlet area.</param>
/// <param name="Reference">R1 of a cone (of the inlet area where it is not round), W1 of a planar diffuser, m; null where the inlet section is not known.</param>
/// <param name="IncludedAngle">Angle between the diverging walls, rad; of the equivalent cone where it is none; null where no length is known.</param>
internal readonly record struct DiffuserGeometry(DiffuserShape Shape, double AreaRatio, double? Reference, double? IncludedAngle)
{
    /// <summary>Axial length over the reference length; null where no angle is known.</summary>
    internal double? RelativeLength => IncludedAngle is double angle && angle > 0 ? Growth / (2 * Math.Tan(angle / 2)) : null;

    /// <summary>Axial length, m.</summary>
    internal double? Length => RelativeLength * Reference;

    // Of the width: 2 (N/W1) tan theta; of the bore in radii of the inlet, twice (N/R1) tan theta.
    private double Growth => Shape == DiffuserShape.Planar ? AreaRatio - 1 : 2 * (Math.Sqrt(AreaRatio) - 1);

    /// <summary>The geometry of a case at an area ratio.</summary>
    internal static DiffuserGeometry Of(DeviceCase c, double areaRatio)
    {
        DiffuserShape shape = ShapeOf(c);
        var geometry = new DiffuserGeometry(shape, areaRatio, ReferenceOf(c, shape), c.Has(CaseOption.IncludedAngle) ? c.Value(CaseOption.IncludedAngle) : null);
        if (!c.Has(CaseOption.Length)) return geometry;
        if (geometry.IncludedAngle is not null) return StationFigures.HaveSection(c.Exit) ? throw Refusals.LengthTwice() : geometry;
        if (geometry.Reference is not double reference) throw Refusals.LengthWithoutSection();
        return geometry with { IncludedAngle = 2 * Math.Atan(geometry.Growth / (2 * c.Value(CaseOption.Length) / reference)) };
    }

    /// <summary>The exit area that length and angle give, m2 of one opening; null where they are not both given.</summary>
    internal static double? ExitArea(DeviceCase c, double inletArea)
    {
        if (!c.Has(CaseOption.Length) || !c.Has(CaseOption.IncludedAngle)) return null;
        DiffuserShape shape = ShapeOf(c);
        if (ReferenceOf(c, shape) is not double reference) throw Refusals.LengthWithoutSection();
        double growth = 2 * c.Value(CaseOption.Length) / reference * Math.Tan(c.Value(CaseOption.IncludedAngle) / 2);
        return inletArea * (shape == DiffuserShape.Planar ? 1 + growth : Math.Pow(1 + (growth / 2), 2));
    }

    // A rectangular inlet whose exit is not said to be another shape diverges on its first side.
    private static DiffuserShape ShapeOf(DeviceCase c)
    {
        GivenSlots inlet = c.Inlet, exit = c.Exit;
        if (inlet.Has(StationSymbol.Annulus) || exit.Has(StationSymbol.Annulus)) return DiffuserShape.Annular;
        if (inlet.Has(StationSymbol.Rectangle))
        {
            bool same = !exit.Has(StationSymbol.Rectangle) || exit.Second(StationSymbol.Rectangle) == inlet.Second(StationSymbol.Rectangle);
            return same && !exit.Has(StationSymbol.Diameter) ? DiffuserShape.Planar : DiffuserShape.Other;
        }

        return exit.Has(StationSymbol.Rectangle) ? DiffuserShape.Other : DiffuserShape.Conical;
    }

    private static double? ReferenceOf(DeviceCase c, DiffuserShape shape)
    {
        GivenSlots inlet = c.Inlet;
        if (shape == DiffuserShape.Planar) return inlet.Value((int)StationSymbol.Rectangle);
        StationFigures figures = StationFigures.Read(inlet, Station.Inlet);
        return figures.Has(Figure.Section) ? Math.Sqrt(figures[Figure.Section] / Math.PI) : null;
    }
}
