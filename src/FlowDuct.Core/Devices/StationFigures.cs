using System.Numerics;
using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>What a station was given, with synonyms merged, SI.</summary>
internal sealed class StationFigures
{
    private readonly double[] _values = new double[16];

    internal Figure Given { get; private set; }

    internal double Openings { get; private init; } = 1;

    internal double Elevation { get; private init; }

    /// <summary>Largest distance of a printed temperature from saturation at which it says no more than the pressure does, K.</summary>
    internal double TemperatureHalfPlace { get; private set; }

    internal double this[Figure figure] => _values[BitOperations.TrailingZeroCount((int)figure)];

    /// <summary>Reads the slots of a station behind the inlet, whose section may be given relative to the inlet's.</summary>
    internal static StationFigures Read(in GivenSlots slots, Station station, in GivenSlots inlet)
    {
        StationFigures figures = Read(slots, station);
        if (!slots.Has(StationSymbol.DiameterRatio)) return figures;
        if (!inlet.Has(StationSymbol.Diameter)) throw Refusals.BetaWithoutInlet(station);
        double d = slots.Value((int)StationSymbol.DiameterRatio) * inlet.Value((int)StationSymbol.Diameter);
        figures.Add(Figure.Section, Math.PI * d * d / 4, station);
        return figures;
    }

    /// <summary>True where the slots give a section.</summary>
    internal static bool HaveSection(in GivenSlots slots) =>
        slots.Has(StationSymbol.Area) || slots.Has(StationSymbol.Diameter) || slots.Has(StationSymbol.Rectangle) || slots.Has(StationSymbol.Annulus)
        || slots.Has(StationSymbol.DiameterRatio);

    /// <summary>Reads the slots of a station.</summary>
    internal static StationFigures Read(in GivenSlots slots, Station station)
    {
        var figures = new StationFigures
        {
            Openings = ValueOr(slots, StationSymbol.Openings, 1),
            Elevation = ValueOr(slots, StationSymbol.Elevation, 0),
        };
        foreach ((StationSymbol symbol, Figure figure, Func<double, double> convert) in s_merges)
        {
            if (slots.Has((int)symbol)) figures.Add(figure, convert(slots.Value((int)symbol)), station);
        }

        if (slots.Has(StationSymbol.Rectangle)) figures.Add(Figure.Section, slots.Value((int)StationSymbol.Rectangle) * slots.Second(StationSymbol.Rectangle), station);
        if (slots.Has(StationSymbol.Annulus)) figures.Add(Figure.Section, Ring(slots.Value((int)StationSymbol.Annulus), slots.Second(StationSymbol.Annulus)), station);
        if (slots.Has((int)StationSymbol.Temperature)) figures.TemperatureHalfPlace = slots.HalfPlace((int)StationSymbol.Temperature);
        else if (slots.Has((int)StationSymbol.StagnationTemperature))
            figures.TemperatureHalfPlace = slots.HalfPlace((int)StationSymbol.StagnationTemperature);
        return figures;
    }

    internal bool Has(Figure figure) => (Given & figure) != 0;

    /// <summary>Adds a figure; a second one of the same meaning is redundant.</summary>
    internal void Add(Figure figure, double value, Station station)
    {
        if (Has(figure)) throw Refusals.Redundant(station, Figures.Names(figure));
        Given |= figure;
        _values[BitOperations.TrailingZeroCount((int)figure)] = value;
    }

    private static double Ring(double outer, double inner) => Math.PI / 4 * ((outer * outer) - (inner * inner));

    private static double ValueOr(in GivenSlots slots, StationSymbol symbol, double otherwise) =>
        slots.Has((int)symbol) ? slots.Value((int)symbol) : otherwise;

    private static readonly (StationSymbol Symbol, Figure Figure, Func<double, double> Convert)[] s_merges =
    [
        (StationSymbol.Pressure, Figure.P, p => p),
        (StationSymbol.Temperature, Figure.T, T => T),
        (StationSymbol.Enthalpy, Figure.H, h => h),
        (StationSymbol.Entropy, Figure.S, s => s),
        (StationSymbol.InternalEnergy, Figure.U, u => u),
        (StationSymbol.Density, Figure.Rho, rho => rho),
        (StationSymbol.SpecificVolume, Figure.Rho, v => 1 / v),
        (StationSymbol.Quality, Figure.X, x => x),
        (StationSymbol.Moisture, Figure.X, y => 1 - y),
        (StationSymbol.Superheat, Figure.Superheat, d => d),
        (StationSymbol.Subcooling, Figure.Superheat, d => -d),
        (StationSymbol.StagnationPressure, Figure.P0, p => p),
        (StationSymbol.StagnationTemperature, Figure.T0, T => T),
        (StationSymbol.StagnationEnthalpy, Figure.H0, h => h),
        (StationSymbol.Velocity, Figure.V, V => V),
        (StationSymbol.Mach, Figure.M, M => M),
        (StationSymbol.Area, Figure.Section, A => A),
        (StationSymbol.Diameter, Figure.Section, d => Math.PI * d * d / 4),
    ];
}
