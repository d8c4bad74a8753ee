using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Rules between the options of a case, the same for the command line and for sheets.</summary>
internal static class OptionRules
{
    /// <summary>The mass flow, kg/s, that a heat rate is divided by. The flow stands before the heat in the catalogue, so it is read.</summary>
    internal static double MassFlowBeside(string place, in GivenSlots options, bool flowIsVolume) => options.Has((int)CaseOption.Flow) && !flowIsVolume
        ? options.Value((int)CaseOption.Flow)
        : throw Refuse(place, "a heat rate needs the mass flow that takes it", "add --flow in kg/s, or give the heat in kJ/kg");

    /// <summary>Refuses a heat rate beside a reference volume of humid air: its mass is known only once the inlet is.</summary>
    internal static void RequireKnownMass(string place, FlowReference? reference, Fluid fluid)
    {
        if (reference is null || fluid is not IdealGas { Mixture.IsHumidAir: true }) return;
        throw Refuse(place, "a heat rate needs the mass flow that takes it, and that of humid air by volume follows from its humidity", "give --flow in kg/s, or the heat in kJ/kg");
    }

    /// <summary>On the stagnation head a recovery of one stops the flow; on the dynamic head compressibility adds a little.</summary>
    internal static void RequireRecovery(string place, in GivenSlots options, bool dynamic)
    {
        if (dynamic || !options.Has((int)CaseOption.Recovery) || options.Value((int)CaseOption.Recovery) <= 1) return;
        string value = NumberFormatter.Shortest(options.Value((int)CaseOption.Recovery), 6);
        throw Refuse(place, $"{value} is above 1, the recovery of a flow brought to rest without loss", "give a ratio up to 1, or --recovery-basis dynamic");
    }

    private static FlowDuctException Refuse(string place, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
