using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>Which figures a device takes, as the options of its command do: what it does not take is refused, never left unread.</summary>
internal static class DeviceColumns
{
    private static readonly CaseOption[] s_ofDiffuser =
    [
        CaseOption.Flow, CaseOption.Efficiency, CaseOption.Recovery, CaseOption.LossCoefficient, CaseOption.Length, CaseOption.IncludedAngle, CaseOption.InletBlockage,
        CaseOption.KineticEnergyCoefficient, CaseOption.Roughness, CaseOption.Heat, CaseOption.HeatLoss, CaseOption.BoundaryTemperature, CaseOption.Gravity,
    ];

    private static readonly CaseOption[] s_ofNozzle =
    [
        CaseOption.Flow, CaseOption.Efficiency, CaseOption.VelocityCoefficient, CaseOption.DischargeCoefficient, CaseOption.ConvergentAngle, CaseOption.DivergentAngle,
        CaseOption.Onset, CaseOption.LossCoefficient, CaseOption.Heat, CaseOption.HeatLoss, CaseOption.BoundaryTemperature, CaseOption.Gravity,
    ];

    private static readonly CaseOption[] s_ofVenturi =
    [
        CaseOption.Flow, CaseOption.DischargeCoefficient, CaseOption.LossCoefficient, CaseOption.Length, CaseOption.IncludedAngle, CaseOption.InletBlockage, CaseOption.Roughness,
    ];

    // By device, in the order of SheetDevice; a bit to the option.
    private static readonly int[] s_options = [MaskOf(s_ofNozzle), MaskOf(s_ofDiffuser), MaskOf(s_ofVenturi), 0];

    /// <summary>True where a device takes a numeric option.</summary>
    internal static bool Takes(SheetDevice device, CaseOption option) => (s_options[(int)device] >> (int)option & 1) != 0;

    /// <summary>True where a device takes the figures of a station or space.</summary>
    internal static bool Takes(SheetDevice device, StationLists list) => device switch
    {
        SheetDevice.State => list == StationLists.At,
        SheetDevice.Diffuser => list is StationLists.Inlet or StationLists.Throat or StationLists.Exit,
        _ => list != StationLists.At,
    };

    /// <summary>True where a device takes a choice.</summary>
    internal static bool Takes(SheetDevice device, ChoiceColumn choice) => choice switch
    {
        ChoiceColumn.Fractions or ChoiceColumn.EquationOfState => true,
        ChoiceColumn.Branch => device != SheetDevice.State,
        ChoiceColumn.RecoveryBasis => device == SheetDevice.Diffuser,
        _ => device == SheetDevice.Nozzle,
    };

    /// <summary>Refuses the first cell that the device of the row does not take.</summary>
    internal static void Require(SheetPlan plan, CaseDraft draft)
    {
        foreach (FigureCell figure in plan.Stations)
        {
            if (!Takes(draft.Device, figure.Column.List) && draft.Of(figure.Column.List).Has(figure.Slot)) throw CellRefusals.NotOfDevice(figure.Place, draft.Device);
        }

        foreach (FigureCell figure in plan.Options)
        {
            if (!Takes(draft.Device, (CaseOption)figure.Slot) && IsGiven(draft, figure)) throw CellRefusals.NotOfDevice(figure.Place, draft.Device);
        }

        foreach (int index in plan.Choices)
        {
            SheetColumn column = plan.Columns[index];
            if (!Takes(draft.Device, column.Choice) && (draft.Choices >> (int)column.Choice & 1) != 0) throw CellRefusals.NotOfDevice(column.Heading.Trim(), draft.Device);
        }
    }

    private static bool IsGiven(CaseDraft draft, FigureCell figure) => draft.Options.Has(figure.Slot) || (CaseOption)figure.Slot switch
    {
        CaseOption.DischargeCoefficient => draft.Frame.Correlation is not null,
        CaseOption.LossCoefficient => draft.Frame.LossWord is not null,
        _ => false,
    };

    private static int MaskOf(CaseOption[] options)
    {
        int mask = 0;
        foreach (CaseOption option in options) mask |= 1 << (int)option;
        return mask;
    }
}
