using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>One column of the states along a nozzle.</summary>
/// <param name="Name">Its heading and JSON key.</param>
/// <param name="Unit">The unit that the reader sees.</param>
/// <param name="Read">The number in a section, SI; null where it cannot be known.</param>
internal sealed record PathColumn(string Name, UnitReading Unit, Func<PathPoint, double?> Read)
{
    private static readonly string[] s_usual = ["p", "T", "V", "M", "x"];

    /// <summary>The ratios that may be asked for beside the quantities of a station, in the order in which they are offered.</summary>
    internal static readonly string[] Ratios = ["p/p0", "T/T0", "rho/rho0", "A/At"];

    /// <summary>Position, area, p, T, V, M, x, then what else is asked for; null where a name is no quantity of a station and no ratio.</summary>
    internal static PathColumn? Of(string name, DeviceAnswer a, RenderOptions options)
    {
        if (Array.IndexOf(Ratios, name) >= 0) return new PathColumn(name, options.Units.UnitOf(Dimension.Ratio), Ratio(name, a));
        bool known = Array.Exists(StationFigureTable.All, row => row.Key == name) && QuantityCatalogue.TryFindStationQuantity(name, out _);
        return known ? new PathColumn(name, TextFigures.UnitOf(name, options), Station(name, a.ExpandingFluid)) : null;
    }

    /// <summary>The columns that come first.</summary>
    internal static IEnumerable<PathColumn> Usual(DeviceAnswer a, RenderOptions options) =>
    [
        new("position", options.Units.UnitOf(Dimension.Length), point => point.Position),
        new("A", options.Units.UnitOf(Dimension.Area), point => point.Area),
        .. s_usual.Select(key => new PathColumn(key, TextFigures.UnitOf(key, options), Station(key, a.ExpandingFluid))),
    ];

    private static Func<PathPoint, double?> Station(string key, Fluid fluid) => point => StationFigureTable.Read(fluid, point.At, key);

    // Against the stagnation state of the inlet and the throat.
    private static Func<PathPoint, double?> Ratio(string name, DeviceAnswer a)
    {
        FluidState rest = a.Inlet.Stagnation!.Value;
        double throat = NozzlePath.Areas(a).Throat;
        return name switch
        {
            "p/p0" => point => point.At.State.p / rest.p,
            "T/T0" => point => point.At.State.T / rest.T,
            "rho/rho0" => point => point.At.State.rho / rest.rho,
            _ => point => point.Area / throat,
        };
    }
}
