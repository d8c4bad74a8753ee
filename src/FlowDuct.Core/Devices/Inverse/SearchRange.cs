using FlowDuct.Quantities;

namespace FlowDuct.Devices.Inverse;

/// <summary>Where an unknown is looked for: the whole range that its kind can have, in steps fine enough to part its roots.</summary>
internal static class SearchRange
{
    private const int Steps = 240;

    /// <summary>Trial values, SI, rising.</summary>
    internal static double[] Of(CaseSlot slot)
    {
        (double low, double high, bool logarithmic) = slot.Row.Dimension switch
        {
            Dimension.Pressure or Dimension.PressureDifference => (1e2, 1e8, true),
            Dimension.Temperature => (180, 2270, false),
            Dimension.TemperatureDifference => (0.01, 1500, true),
            Dimension.Length => (1e-5, 20, true),
            Dimension.Area => (1e-10, 300, true),
            Dimension.Velocity => (0.1, 4000, true),
            Dimension.MassFlow => (1e-8, 1e6, true),
            Dimension.SpecificEnergy => (1e3, 6e6, true),
            Dimension.Ratio => (1e-4, Math.Min(slot.Row.Limits.Greatest, 10), false),
            _ => (1e-6, 1e9, true),
        };
        return [.. Enumerable.Range(0, Steps + 1).Select(i => At((double)i / Steps))];

        double At(double u) => logarithmic ? low * Math.Pow(high / low, u) : low + (u * (high - low));
    }
}
