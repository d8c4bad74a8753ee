using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The exit plane lies so far below the back pressure that the flow may leave the wall inside.</summary>
internal static class OverexpandedSeparation
{
    // Fits to rocket-type nozzles put separation at a wall pressure of 0.25 to 0.5 of the ambient pressure: a warning band for a plant nozzle.
    private const double Warning = 0.5;

    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Performance is not { Regime: "overexpanded", Jet: JetAnswer jet }) return null;
        bool near = jet.PressureRatio < Warning;
        string disk = jet.RegularReflection == false ? "; the shocks cannot cross regularly, a Mach disk stands in the jet" : string.Empty;
        return new Finding(
            "overexpanded-separation", near ? Severity.Caution : Severity.Note, jet.PressureRatio, Warning, "from memory: fits to rocket nozzles, 0.25 to 0.5", text =>
                $"the exit plane holds {text.Text(jet.PressureRatio, Dimension.Ratio, 4)} of the back pressure{(near ? ": the flow may separate from the wall inside" : string.Empty)}{disk}");
    }
}
