using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>Which figures a device takes: what it does not take is refused, never left unread.</summary>
internal static class DeviceColumns
{
    private const int NozzleOptions = 1 << (int)CaseOption.DischargeCoefficient | 1 << (int)CaseOption.ConvergentAngle | 1 << (int)CaseOption.DivergentAngle
        | 1 << (int)CaseOption.Onset;
    private const int NozzleChoices = 1 << (int)ChoiceColumn.Shape | 1 << (int)ChoiceColumn.Expansion;
    private const int StateChoices = 1 << (int)ChoiceColumn.Fractions;

    /// <summary>Refuses the first cell that the device of the row does not take.</summary>
    internal static void Require(SheetPlan plan, CaseDraft draft)
    {
        foreach (FigureCell figure in plan.Stations)
        {
            if (!Takes(draft.Device, figure.Column.List) && draft.Of(figure.Column.List).Has(figure.Slot)) throw CellRefusals.NotOfDevice(figure.Place, draft.Device);
        }

        foreach (FigureCell figure in plan.Options)
        {
            if (!Takes(draft.Device, 1 << figure.Slot) && IsGiven(draft, figure)) throw CellRefusals.NotOfDevice(figure.Place, draft.Device);
        }

        foreach (int index in plan.Choices)
        {
            SheetColumn column = plan.Columns[index];
            if ((draft.Choices & Refused(draft.Device) & 1 << (int)column.Choice) != 0) throw CellRefusals.NotOfDevice(column.Heading.Trim(), draft.Device);
        }
    }

    private static bool IsGiven(CaseDraft draft, FigureCell figure) =>
        draft.Options.Has(figure.Slot) || (figure.Slot == (int)CaseOption.DischargeCoefficient && draft.Frame.Correlation is not null);

    private static bool Takes(SheetDevice device, StationLists list) => device switch
    {
        SheetDevice.Nozzle => list != StationLists.At,
        SheetDevice.Diffuser => list is StationLists.Inlet or StationLists.Exit,
        _ => list == StationLists.At,
    };

    private static bool Takes(SheetDevice device, int option) => device switch
    {
        SheetDevice.Nozzle => true,
        SheetDevice.Diffuser => (option & NozzleOptions) == 0,
        _ => false,
    };

    private static int Refused(SheetDevice device) => device switch
    {
        SheetDevice.Nozzle => 0,
        SheetDevice.Diffuser => NozzleChoices,
        _ => ~StateChoices,
    };
}
