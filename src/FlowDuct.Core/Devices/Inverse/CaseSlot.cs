using FlowDuct.Quantities;

namespace FlowDuct.Devices.Inverse;

/// <summary>One figure of a case by its name, such as back.p, throat.d or efficiency.</summary>
/// <param name="Name">The name as typed.</param>
/// <param name="Row">The quantity.</param>
/// <param name="Part">inlet, throat, exit, back, or empty for an option.</param>
/// <param name="Slot">Its slot.</param>
internal sealed record CaseSlot(string Name, QuantityRow Row, string Part, int Slot)
{
    /// <summary>Finds a slot by name; null where nothing that can be given has it.</summary>
    internal static CaseSlot? Find(string name)
    {
        int point = name.IndexOf('.', StringComparison.Ordinal);
        if (point < 0)
        {
            bool known = QuantityCatalogue.TryFindOption(name, out QuantityRow? option) && option.OptionSlot is not null;
            return known ? new CaseSlot(name, option!, string.Empty, (int)option!.OptionSlot!.Value) : null;
        }

        string part = name[..point];
        bool taken = part is "inlet" or "throat" or "exit" or "back";
        return taken && QuantityCatalogue.TryFindStationQuantity(name[(point + 1)..].Replace('_', '-'), out QuantityRow? row) && row.StationSlot is StationSymbol symbol
            ? new CaseSlot(name, row, part, (int)symbol)
            : null;
    }

    internal bool IsGiven(DeviceCase c) => Slots(c).Has(Slot);

    /// <summary>A copy of a case with this figure set, SI.</summary>
    internal DeviceCase With(DeviceCase c, double value)
    {
        DeviceCase copy = c with { };
        Slots(copy).Set(Slot, value);
        return copy;
    }

    private ref GivenSlots Slots(DeviceCase c)
    {
        switch (Part)
        {
            case "inlet": return ref c.Inlet;
            case "throat": return ref c.Throat;
            case "exit": return ref c.Exit;
            case "back": return ref c.Back;
            default: return ref c.Options;
        }
    }
}
