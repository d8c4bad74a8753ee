using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Rules between the options of a case, the same for the command line and for sheets.</summary>
internal static class OptionRules
{
    /// <summary>kg in one unit of a flow: 1 of a mass or actual volume, the density of the reference state of an amount of ideal gas.</summary>
    internal static double MassOfAmount(string place, Fluid fluid, Dimension dimension)
    {
        if (dimension is not (Dimension.NormalVolumeFlow or Dimension.StandardVolumeFlow)) return 1;
        return ReferenceVolume.Density(fluid, dimension) ?? throw Refuse(
            place, $"normal and standard volumes are amounts of ideal gas, and {fluid.Name} is none", "give a mass flow, or an actual volume flow in m3/h");
    }

    /// <summary>The mass flow, kg/s, that a heat rate is divided by. The flow stands before the heat in the catalogue, so it is read.</summary>
    internal static double MassFlowBeside(string place, in GivenSlots options, bool flowIsVolume) => options.Has((int)CaseOption.Flow) && !flowIsVolume
        ? options.Value((int)CaseOption.Flow)
        : throw Refuse(place, "a heat rate needs the mass flow that takes it", "add --flow in kg/s, or give the heat in kJ/kg");

    /// <summary>On the stagnation head a recovery of one stops the flow; on the dynamic head compressibility adds a little.</summary>
    internal static void RequireRecovery(string place, in GivenSlots options, bool dynamic)
    {
        if (dynamic || !options.Has((int)CaseOption.Recovery) || options.Value((int)CaseOption.Recovery) <= 1) return;
        string value = NumberFormatter.Shortest(options.Value((int)CaseOption.Recovery), 6);
        throw Refuse(place, $"{value} is above 1, the recovery of a flow brought to rest without loss", "give a ratio up to 1, or --recovery-basis dynamic");
    }

    private static FlowDuctException Refuse(string place, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
