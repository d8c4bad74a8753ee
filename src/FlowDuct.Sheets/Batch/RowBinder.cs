using System.Text;
using CsvHelper;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>Turns the cells of a record into a case. One to a worker: it keeps what rows have in common.</summary>
internal sealed class RowBinder(SheetPlan plan)
{
    private static readonly FlowReferenceReader s_flows = new("flow", "reference-state");

    private readonly FluidCells _fluids = new(plan.Mixtures);
    private UnitBasis? _basis;
    private bool _massFractions;
    private bool _realGas;

    /// <summary>The case of the record read last.</summary>
    internal CaseDraft Draft { get; } = new();

    /// <summary>A cell without spaces around it.</summary>
    internal static ReadOnlySpan<byte> Cell(CsvReader record, int index) => index < 0 ? default : record.GetSpan(index).Trim((byte)' ');

    /// <summary>Reads the cells of a record into the draft.</summary>
    /// <exception cref="FlowDuctException">A cell is refused, or does not suit the device; kind NotUnderstood.</exception>
    internal void Read(CsvReader record)
    {
        Draft.Begin();
        Draft.Device = DeviceOf(Cell(record, plan.Device));
        foreach (int index in plan.Choices) Choose(plan.Columns[index], Cell(record, index));
        Draft.Frame.Fluid = _fluids.Find(Cell(record, plan.Fluid), Fractions(), Equation());
        Draft.Frame.Device = Draft.Device switch { SheetDevice.Diffuser => DeviceKind.Diffuser, SheetDevice.Venturi => DeviceKind.Venturi, _ => DeviceKind.Nozzle };
        _basis = BasisOf(Cell(record, plan.Basis));
        ReadAmbient(record);
        foreach (FigureCell figure in plan.Stations) ReadStation(figure, Cell(record, figure.Index));
        string? state = Cell(record, plan.ReferenceState) is { IsEmpty: false } cell ? Encoding.UTF8.GetString(cell) : null;
        bool flow = false;
        foreach (FigureCell figure in plan.Options)
        {
            ReadOnlySpan<byte> typed = Cell(record, figure.Index);
            flow |= figure.Slot == (int)CaseOption.Flow && !typed.IsEmpty;
            ReadOption(figure, typed, state);
        }

        if (state is not null && !flow) s_flows.Read(null, state, Draft.Frame.Fluid);
        OptionRules.RequireRecovery("recovery", Draft.Options, Draft.Frame.RecoveryBasis == RecoveryBasis.Dynamic);
        DeviceColumns.Require(plan, Draft);
    }

    private static SheetDevice DeviceOf(ReadOnlySpan<byte> cell)
    {
        if (cell.SequenceEqual("nozzle"u8)) return SheetDevice.Nozzle;
        if (cell.SequenceEqual("diffuser"u8)) return SheetDevice.Diffuser;
        if (cell.SequenceEqual("venturi"u8)) return SheetDevice.Venturi;
        return cell.SequenceEqual("state"u8) ? SheetDevice.State : throw CellRefusals.NoDevice(Encoding.UTF8.GetString(cell));
    }

    private static UnitBasis? BasisOf(ReadOnlySpan<byte> cell)
    {
        if (cell.IsEmpty) return null;
        if (cell.SequenceEqual("absolute"u8)) return UnitBasis.Absolute;
        return cell.SequenceEqual("gauge"u8) ? UnitBasis.Gauge : throw CellRefusals.NotOneOf("pressure-basis", Encoding.UTF8.GetString(cell), ["absolute", "gauge"]);
    }

    private FractionBasis? Fractions() =>
        (Draft.Choices >> (int)ChoiceColumn.Fractions & 1) == 0 ? null : _massFractions ? FractionBasis.Mass : FractionBasis.Mole;

    private EquationOfState? Equation() =>
        (Draft.Choices >> (int)ChoiceColumn.EquationOfState & 1) == 0 ? null : _realGas ? EquationOfState.Reference : EquationOfState.Ideal;

    private void Choose(SheetColumn column, ReadOnlySpan<byte> cell)
    {
        if (cell.IsEmpty) return;
        string text = Encoding.UTF8.GetString(cell);
        string[] words = ChoiceWords.Of(column.Choice);
        int word = Array.IndexOf(words, text);
        if (word < 0) throw CellRefusals.NotOneOf(column.Heading.Trim(), text, words);
        Draft.Choices |= 1 << (int)column.Choice;
        switch (column.Choice)
        {
            case ChoiceColumn.Shape: Draft.Frame.Shape = word == 0 ? NozzleShape.Convergent : NozzleShape.ConvergentDivergent; break;
            case ChoiceColumn.Branch: Draft.Frame.Branch = word == 0 ? Branch.Subsonic : Branch.Supersonic; break;
            case ChoiceColumn.Expansion: Draft.Frame.Expansion = (ExpansionModel)word; break;
            case ChoiceColumn.RecoveryBasis: Draft.Frame.RecoveryBasis = (RecoveryBasis)word; break;
            case ChoiceColumn.EquationOfState: _realGas = word == 1; break;
            default: _massFractions = word == 1; break;
        }
    }

    private void ReadAmbient(CsvReader record)
    {
        foreach (FigureCell figure in plan.Ambient)
        {
            ReadOnlySpan<byte> cell = Cell(record, figure.Index);
            if (!cell.IsEmpty) Draft.Ambient.Set(figure.Slot, figure.Read(cell, null, Draft.Frame.AmbientPressure).Si);
        }

        if (!Draft.Ambient.IsEmpty) AmbientCells.Apply(Draft.Ambient, ref Draft.Frame);
    }

    private void ReadStation(FigureCell figure, ReadOnlySpan<byte> cell)
    {
        if (cell.IsEmpty) return;
        if (figure.Row.IsPair)
        {
            Draft.Of(figure.Column.List).Set(figure.ReadPair(cell));
            return;
        }

        FigureValue value = figure.Read(cell, _basis, Draft.Frame.AmbientPressure);
        Draft.Of(figure.Column.List).Set(figure.Slot, value.Si, value.HalfWidth);
        Draft.Frame.UsesGauge |= value.WasGauge;
    }

    private void ReadOption(FigureCell figure, ReadOnlySpan<byte> cell, string? referenceState)
    {
        if (cell.IsEmpty) return;
        var option = (CaseOption)figure.Slot;
        if (char.IsAsciiLetter((char)cell[0]) && TakesWord(figure, option, cell)) return;

        if (option == CaseOption.Flow && figure.IsAmount(cell, referenceState is not null))
        {
            ReadAmount(figure, figure.Typed(cell), referenceState);
            return;
        }

        FigureValue value = figure.Read(cell, _basis, Draft.Frame.AmbientPressure);
        double size = SizeOf(figure, option, value.Dimension);
        Draft.Frame.FlowIsVolume |= option == CaseOption.Flow && value.Dimension == Dimension.VolumeFlow;
        Draft.Frame.OnsetIsDifference |= option == CaseOption.Onset && value.Dimension == Dimension.TemperatureDifference;
        Draft.Options.Set(figure.Slot, value.Si * size, value.HalfWidth * size);
    }

    // A name stands where a number could.
    private bool TakesWord(FigureCell figure, CaseOption option, ReadOnlySpan<byte> cell)
    {
        string text = Encoding.UTF8.GetString(cell);
        if (option == CaseOption.DischargeCoefficient) Draft.Frame.Correlation = CorrelationOf(figure, text);
        else if (option == CaseOption.LossCoefficient && Draft.Device != SheetDevice.Nozzle)
            Draft.Frame.LossWord = DiffuserLoss.Words.Contains(text) ? text : throw CellRefusals.NotOneOf(figure.Place, text, ["a number", .. DiffuserLoss.Words]);
        else return false;
        return true;
    }

    private double SizeOf(FigureCell figure, CaseOption option, Dimension dimension) => option switch
    {
        CaseOption.Heat or CaseOption.HeatLoss when dimension == Dimension.HeatRate => 1 / HeatedFlow(figure),
        _ => 1,
    };

    private double HeatedFlow(FigureCell figure)
    {
        OptionRules.RequireKnownMass(figure.Place, Draft.Frame.FlowReference, Draft.Frame.Fluid!);
        return OptionRules.MassFlowBeside(figure.Place, Draft.Options, Draft.Frame.FlowIsVolume);
    }

    // A volume of gas at a reference state is an amount: its mass follows from the gas.
    private void ReadAmount(FigureCell figure, string typed, string? state)
    {
        FlowReference? reference = (s_flows with { FlowPlace = figure.Place }).Read(typed, state, Draft.Frame.Fluid!);
        GivenValue value = ValueParser.Parse(figure.Place, figure.Row, FlowReferenceReader.WithoutMoisture(typed), Draft.Frame.AmbientPressure);
        double size = reference?.MassPerVolume(Draft.Frame.Fluid!) ?? 1;
        Draft.Frame.FlowReference = reference;
        Draft.Frame.FlowIsVolume |= value.Unit.Dimension == Dimension.VolumeFlow;
        Draft.Options.Set(figure.Slot, value.Si * size, value.HalfWidth * size);
    }

    private static DischargeCorrelation CorrelationOf(FigureCell figure, string text) =>
        DischargeCorrelation.Find(text) ?? throw CellRefusals.NotOneOf(figure.Place, text, ["a number", .. DischargeCorrelation.All.Select(row => row.Name)]);
}
