using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The exit reading p, T lies on the saturation line and names a set of states.</summary>
internal static class SaturatedReading
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (!a.SaturatedReading) return null;
        a.Fluid.TrySaturationTemperature(a.Exit.State.p, out double Tsat);
        return new Finding("saturated-reading", Severity.Caution, a.Exit.State.T, Tsat, $"{a.Fluid.Source}, saturation line", text => Message(a, Tsat, text));
    }

    private static string Message(DeviceAnswer a, double Tsat, IQuantityText text)
    {
        string start = $"p and T at the exit lie on the saturation line ({text.Text(Tsat, Dimension.Temperature)}), so they are one figure, not two";
        return a.Performance is { ExitVelocityRange: Interval V, EfficiencyRange: Interval eta }
            ? $"{start}: V from {text.Text(V.Least, Dimension.Velocity)} to {text.Text(V.Greatest, Dimension.Velocity)}, efficiency from {text.Text(eta.Least, Dimension.Ratio, 3)} to {text.Text(eta.Greatest, Dimension.Ratio, 3)}; measure x or V to say more"
            : $"{start}; measure x or V to say more";
    }
}
