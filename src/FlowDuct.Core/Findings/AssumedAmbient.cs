using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A gauge reading was turned absolute with an ambient pressure that nobody gave.</summary>
internal static class AssumedAmbient
{
    // Between sea level and 1500 m the barometer differs by about this: ISO 2533:1975.
    private const double TypicalError = 16_800;

    internal static Finding? Check(DeviceAnswer a) => a.Case is not { UsesGauge: true, AmbientGiven: false } ? null
        : new Finding("assumed-ambient", Severity.Note, a.Case.AmbientPressure, null, "ISO 2533:1975, standard atmosphere", text =>
            $"gauge readings were added to an assumed ambient pressure of {text.Text(a.Case.AmbientPressure, Dimension.Pressure, 6)}; at 1500 m it is {text.Text(TypicalError, Dimension.PressureDifference, 3)} lower. Give --ambient");
}
