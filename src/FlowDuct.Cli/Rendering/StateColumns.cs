using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The columns of a table of states, with their units and values, SI.</summary>
/// <param name="Row">The quantity.</param>
/// <param name="Unit">The unit shown.</param>
/// <param name="Values">One a row of the table; null where it cannot be known.</param>
internal sealed record StateColumn(QuantityRow Row, UnitReading Unit, double?[] Values)
{
    /// <summary>The unit as a heading shows it: a pressure with its basis; empty of a ratio.</summary>
    internal string Heading => Unit.Dimension == Dimension.Ratio ? string.Empty
        : Unit.Dimension == Dimension.Pressure && !Unit.BasisIsWritten ? Unit.Spelling + "(a)"
        : Unit.Spelling;
}

/// <summary>Chooses the columns.</summary>
internal static class StateColumns
{
    // What fits a page of 80 columns; CSV carries all that are known.
    private static readonly string[] s_text = ["p", "T", "x", "h", "s", "rho", "w"];

    private static readonly string[] s_humid = ["p", "T", "h", "rho", "humidity", "dew-point", "humidity-ratio"];

    private static readonly string[] s_ofMotion = ["V", "M", "A", "d", "n", "z", "p0", "T0", "h0"];

    /// <summary>The columns of a table.</summary>
    internal static IReadOnlyList<StateColumn> Of(StateTable table, RenderOptions options, bool all) =>
        table.GasRows.Count > 0 ? OfGas(table, options) : [.. Keys(table, all).Select(key => OfStates(table, key, options)).Where(column => column.Values.Any(value => value is not null))];

    private static IEnumerable<string> Keys(StateTable table, bool all)
    {
        if (all) return StationFigureTable.All.Select(row => row.Key).Where(key => !s_ofMotion.Contains(key) || table.States[0].At.Velocity > 0);
        StateAnswer first = table.States[0];
        return StationFigureTable.Read(first.Fluid, first.At, "humidity-ratio") is null ? s_text : s_humid;
    }

    private static StateColumn OfStates(StateTable table, string key, RenderOptions options)
    {
        if (!QuantityCatalogue.TryFindStationQuantity(key, out QuantityRow? row)) throw new InvalidOperationException($"The catalogue has no {key}.");
        return new StateColumn(row, options.Units.UnitOf(row), [.. table.States.Select(state => StationFigureTable.Read(state.Fluid, state.At, key))]);
    }

    private static List<StateColumn> OfGas(StateTable table, RenderOptions options)
    {
        Func<GasTableRow, double>[] readers = [row => row.T, row => row.h, row => row.u, row => row.s0, row => row.p_r, row => row.v_r];
        return [.. QuantityCatalogue.GasTable.Select((row, i) => new StateColumn(row, UnitOf(row, options), [.. table.GasRows.Select(at => (double?)readers[i](at))]))];
    }

    // v_r is told of the absolute temperature, so the table shows that unless another unit was asked for.
    private static UnitReading UnitOf(QuantityRow row, RenderOptions options)
    {
        UnitReading usual = options.Units.UnitOf(row);
        string? absolute = (usual.Spelling, options.Units.Asks(row.Dimension)) switch
        {
            ("degC", false) => "K",
            ("degF", false) => "degR",
            _ => null,
        };
        return absolute is not null && UnitTable.TryFind(absolute, row.Dimension, out UnitReading unit) ? unit : usual;
    }
}
