using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Colder than unalloyed steel is used without proof of toughness.</summary>
internal static class LowTemperature
{
    // -29 degC (-20 degF): common practice for carbon steel without impact tests.
    private const double Limit = 244.15;

    internal static Finding? Check(DeviceAnswer a)
    {
        double T = Math.Min(a.Exit.State.T, a.Throat?.State.T ?? double.PositiveInfinity);
        return T >= Limit ? null : new Finding("low-temperature", Severity.Caution, T, Limit, "common practice", text =>
            $"the stream falls to {text.Text(T, Dimension.Temperature, 4)}, below {text.Text(Limit, Dimension.Temperature, 4)}: check the toughness of the material, and ice from moist gas");
    }
}
