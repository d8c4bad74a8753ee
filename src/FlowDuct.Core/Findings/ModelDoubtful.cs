using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The equations are solved where their assumptions are weak.</summary>
internal static class ModelDoubtful
{
    // Below this entry quality the slip between the phases is no longer small: common practice.
    private const double LeastEntryQuality = 0.1;

    internal static Finding? Check(DeviceAnswer a)
    {
        FluidState inlet = a.Inlet.State;
        bool wet = inlet.Phase == Phase.Wet;
        if (a.Performance.Metastable is Devices.Rating.MetastableAnswer held)
        {
            return new Finding("model-doubtful", Severity.Caution, held.Undercooling, null, "assumption", _ => HeldWords(a, held));
        }

        if (a.Case.Device == DeviceKind.Diffuser && (wet || a.Exit.State.Phase == Phase.Wet))
        {
            return new Finding("model-doubtful", Severity.Caution, null, null, "assumption", _ =>
                "wet compression is taken at equilibrium: droplets evaporate later than that");
        }

        if (a.Case.Device == DeviceKind.Diffuser && a.Inlet.Mach >= 1 && a.Diffuser?.Shock is null)
        {
            return new Finding("model-doubtful", Severity.Caution, a.Inlet.Mach, 1, "assumption", _ =>
                "the inlet is supersonic: the balances hold across any shock, but where it stands and what it costs is not solved");
        }

        return wet && inlet.x < LeastEntryQuality
            ? new Finding("model-doubtful", Severity.Caution, inlet.x, LeastEntryQuality, "common practice", _ =>
                "so wet a stream is taken as one homogeneous fluid at equilibrium: the phases slip and lag")
            : null;
    }

    private static string HeldWords(DeviceAnswer a, in Devices.Rating.MetastableAnswer held)
    {
        string what = held.IsLiquid ? "the liquid is kept from flashing" : "the vapour is kept from condensing";
        bool chosen = a.Case.Has(Quantities.CaseOption.Onset);
        string end = chosen ? "to the onset given" : "to the end of its equation";
        if (held.FlowIsLeast) return $"{what} {end}, which is met in the throat: the flow is at least this";
        return held.OnsetPressure is null
            ? $"{what}: where it gives way is not predicted, and the truth lies between this and equilibrium"
            : $"{what} {end}, and returns to equilibrium there at once: where it does is {(chosen ? "your" : "no")} prediction";
    }
}
