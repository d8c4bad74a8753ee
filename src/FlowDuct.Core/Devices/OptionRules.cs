using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Rules between the options of a case, the same for the command line and for sheets.</summary>
internal static class OptionRules
{
    /// <summary>Why a sheet takes no volume flow whose reference state it does not name.</summary>
    internal static string NoReferenceState(string unit) => $"{unit} names no reference state, and a sheet has none: give Nm3/h (0 degC), Sm3/h (15 degC) or a mass flow";

    /// <summary>kg in one unit of a flow of a sheet: 1 of a mass or actual volume, the density of the reference state of an amount of ideal gas.</summary>
    internal static double MassOfAmount(string place, Fluid fluid, Dimension dimension)
    {
        if (dimension == Dimension.ReferenceVolumeFlow) throw Refuse(place, NoReferenceState("the unit"), string.Empty);
        if (dimension is (Dimension.NormalVolumeFlow or Dimension.StandardVolumeFlow) && fluid is IdealGas { Mixture.IsHumidAir: true })
            throw Refuse(place, "the mass of a normal or standard volume of humid air follows from its humidity, and a sheet does not say dry or wet", "give a mass flow, or an actual volume flow in m3/h");
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
