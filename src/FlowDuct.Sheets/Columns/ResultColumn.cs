using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>One result of an answer: which figure, in which unit, and how it is read.</summary>
internal sealed class ResultColumn
{
    private static readonly string[] s_stations = ["inlet", "throat", "exit", "at"];

    private readonly Func<DeviceAnswer, double?>? _ofDevice;
    private readonly Func<StateAnswer, double?>? _ofState;

    private ResultColumn(string name, QuantityRow row, in UnitReading unit, Func<DeviceAnswer, double?>? ofDevice, Func<StateAnswer, double?>? ofState)
    {
        (Name, Row, Unit, _ofDevice, _ofState) = (name, row, unit, ofDevice, ofState);
        Scale = new UnitScale(unit);
    }

    /// <summary>Such as exit.T, regime, shock.area_ratio.</summary>
    internal string Name { get; }

    /// <summary>The quantity.</summary>
    internal QuantityRow Row { get; }

    /// <summary>The unit in which it is written.</summary>
    internal UnitReading Unit { get; }

    /// <summary>The unit, compiled.</summary>
    internal UnitScale Scale { get; }

    /// <summary>True where it follows from the exit brought to rest.</summary>
    internal bool NeedsExitHead => Name is "exit.p0" or "exit.T0" or "stagnation_pressure_ratio" or "loss_coefficient";

    /// <summary>The name with its unit, the basis of a pressure visible: exit.p [bar(a)].</summary>
    internal string Title => Row.IsText || Row.Dimension is Dimension.Ratio or Dimension.Count ? Name : $"{Name} [{Unit.Spelling}{(PressureBasis.IsOpen(Unit) ? "(a)" : string.Empty)}]";

    /// <summary>Reads "exit.T [degC]", "regime", "mass-flow [kg/h]"; without a unit that of the reader's system is taken.</summary>
    /// <param name="place">The option or heading, for a refusal.</param>
    /// <param name="text">The text.</param>
    /// <param name="units">The units of the reader.</param>
    /// <exception cref="FlowDuctException">It names no result, or a unit that does not measure it; kind NotUnderstood.</exception>
    internal static ResultColumn Parse(string place, string text, DisplayText units)
    {
        (string name, string? unit) = SheetColumn.SplitUnit(place, text);
        name = name.Replace('-', '_');
        QuantityRow row = Find(name, out string station) ?? throw HeadingRefusals.NoResult(place, name, Words);
        UnitReading reading = unit is null ? units.UnitOf(row) : UnitTable.TryFind(unit, row.Dimension, out UnitReading asked)
            ? asked
            : throw HeadingRefusals.Unit(place, UnitTable.Suggest(unit, row.Dimension));
        return station.Length == 0 ? OfPerformance(name, row, reading) : OfStation(name, station, row, reading);
    }

    /// <summary>The number in an answer, SI; null where it cannot be known or is a word.</summary>
    internal double? Read(DeviceAnswer answer) => _ofDevice?.Invoke(answer);

    /// <summary>The number in a property answer, SI; null where it has none.</summary>
    internal double? Read(StateAnswer answer) => _ofState?.Invoke(answer);

    /// <summary>The word in an answer; null where the result is a number or cannot be known.</summary>
    internal string? ReadText(DeviceAnswer answer) => Row.Key switch
    {
        "regime" => answer.Performance.Regime,
        "choked" => answer.Performance.Choked is bool choked ? (choked ? "true" : "false") : null,
        _ => null,
    };

    private static ResultColumn OfPerformance(string name, QuantityRow row, in UnitReading unit)
    {
        Func<Performance, double?>? read = Array.Find(PerformanceFigures.All, figure => figure.Key == row.Key).Read;
        return new ResultColumn(name, row, unit, read is null ? null : answer => read(answer.Performance), null);
    }

    private static ResultColumn OfStation(string name, string station, QuantityRow row, in UnitReading unit)
    {
        Func<Fluids.Fluid, StationAnswer, double?> read = Array.Find(StationFigureTable.All, figure => figure.Key == row.Key).Read;
        Func<DeviceAnswer, double?>? ofDevice = station switch
        {
            "inlet" => answer => read(answer.Fluid, answer.Inlet),
            "throat" => answer => answer.Throat is StationAnswer at ? read(answer.Fluid, at) : null,
            "exit" => answer => read(answer.Fluid, answer.Exit),
            _ => null,
        };
        return new ResultColumn(name, row, unit, ofDevice, station == "at" ? answer => read(answer.Fluid, answer.At) : null);
    }

    private static QuantityRow? Find(string name, out string station)
    {
        station = string.Empty;
        if (QuantityCatalogue.TryFindPerformance(name, out QuantityRow? result)) return result;
        int point = name.IndexOf('.', StringComparison.Ordinal);
        if (point < 0 || !s_stations.Contains(name[..point])) return null;
        bool known = QuantityCatalogue.TryFindStationQuantity(name.AsSpan(point + 1), out QuantityRow? row) && Array.Exists(StationFigureTable.All, figure => figure.Key == row.Key);
        station = name[..point];
        return known ? row : null;
    }

    private static IEnumerable<string> Words =>
        QuantityCatalogue.Performance.Select(row => row.Key).Concat(StationFigureTable.All.SelectMany(figure => s_stations.Select(station => $"{station}.{figure.Key}")));
}
