using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The exit plane lies so far below the back pressure that the flow may leave the wall inside.</summary>
internal static class OverexpandedSeparation
{
    // What a message will need is set aside where its method begins, so that method begins only for a rated nozzle.
    internal static Finding? Check(DeviceAnswer a) => a.Rating is null ? null : OfRated(a);

    private static Finding? OfRated(DeviceAnswer a)
    {
        if (a.Performance.Jet is not JetAnswer jet || Separation.Of(a) is not Separation separation) return null;
        bool near = separation.AreaRatio is not null;
        string disk = jet.RegularReflection == false ? "; the shocks cannot cross regularly, a Mach disk stands in the jet" : string.Empty;
        return new Finding(
            "overexpanded-separation", near ? Severity.Caution : Severity.Note, jet.PressureRatio, separation.Band.Greatest, SeparationCriteria.Standing, text =>
                $"the exit plane holds {Short(text, jet.PressureRatio)} of the back pressure{Where(text, separation)}{disk}");
    }

    private static string Where(IQuantityText text, in Separation separation)
    {
        string band = $"{Short(text, separation.Band.Least)} to {Short(text, separation.Band.Greatest)}";
        return separation.AreaRatio is double ratio
            ? $": the flow may leave the wall inside, from {Short(text, ratio)} throat areas on (fits: at {band})"
            : $" (fits put separation at {band})";
    }

    private static string Short(IQuantityText text, double ratio) => text.Text(ratio, Dimension.Ratio, 3);
}
