using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>States of one fluid along a range of one property.</summary>
/// <param name="Fluid">The fluid as asked for.</param>
/// <param name="Given">The figures that stay.</param>
/// <param name="Range">The figure that varies.</param>
internal sealed record StateTable(Fluid Fluid, GivenSlots Given, StationRange Range)
{
    /// <summary>The states, in the order of the range; empty of a gas table.</summary>
    internal IReadOnlyList<StateAnswer> States { get; private init; } = [];

    /// <summary>The rows where a gas has a temperature and nothing else: what the handbooks' ideal-gas tables hold; else empty.</summary>
    internal IReadOnlyList<GasTableRow> GasRows { get; private init; } = [];

    /// <summary>What the rows show, each finding once with the value where it appears first; gravest first.</summary>
    internal IReadOnlyList<Finding> Findings { get; private init; } = [];

    /// <summary>Solves every row, or refuses.</summary>
    internal static StateTable Solve(Fluid fluid, in GivenSlots given, StationRange range, UnitSystem system)
    {
        var table = new StateTable(fluid, given, range);
        return table.IsGasTable ? table.OfGas(system) : table.OfStates();
    }

    /// <summary>The first row in which a finding appears, for its message.</summary>
    private IEnumerable<Finding> FirstOfEachCode(IEnumerable<(double Value, IEnumerable<Finding> Findings)> rows)
    {
        HashSet<string> seen = [];
        foreach ((double value, IEnumerable<Finding> findings) in rows)
        {
            foreach (Finding finding in findings)
            {
                if (seen.Add(finding.Code)) yield return finding with { Message = text => $"at {Range.Row.Symbol}={text.Text(value, Range.Row.Dimension)}: {finding.Message(text)}" };
            }
        }
    }

    private bool IsGasTable => Fluid is IdealGas && Given.IsEmpty && Range.Row.StationSlot == StationSymbol.Temperature;

    private StateTable OfGas(UnitSystem system)
    {
        if (Fluid is IdealGas { Mixture.IsHumidAir: true }) throw HumidityRefusals.Missing(Station.At);
        IdealGas gas = (IdealGas)Fluid;
        FluidState scale = AtReference(GasTableRow.ScaleTemperature).At.State;
        StateAnswer[] states = [.. Enumerable.Range(0, Range.Range.Count).Select(i => AtReference(Range.Range[i]))];
        IEnumerable<(double, IEnumerable<Finding>)> findings = states.Select(
            state => (state.At.State.T, Extrapolated.Check(Fluid, state) is Finding note ? (IEnumerable<Finding>)[note] : []));
        return this with { GasRows = [.. states.Select(state => GasTableRow.Of(gas, state.At.State, scale, system))], Findings = [.. FirstOfEachCode(findings)] };
    }

    private StateAnswer AtReference(double T)
    {
        GivenSlots slots = default;
        slots.Set((int)StationSymbol.Pressure, IdealGas.ReferencePressure);
        slots.Set((int)StationSymbol.Temperature, T);
        return StateAnswer.Solve(Fluid, slots);
    }

    private StateTable OfStates()
    {
        List<StateAnswer> states = [];
        for (int i = 0; i < Range.Range.Count; i++)
        {
            GivenSlots slots = Given;
            slots.Set((int)Range.Row.StationSlot!.Value, Range.Range[i]);
            states.Add(StateAnswer.Solve(Fluid, slots));
        }

        IEnumerable<(double, IEnumerable<Finding>)> findings = states.Select((state, i) => (Range.Range[i], (IEnumerable<Finding>)state.Findings));
        return this with { States = states, Findings = [.. FirstOfEachCode(findings).OrderByDescending(finding => finding.Severity)] };
    }
}
