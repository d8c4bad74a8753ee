using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Fluids;

namespace FlowDuct.Sheets.Batch;

/// <summary>All of a case but its figures. Rows of a sheet mostly share it, and a case is made anew only where it changes.</summary>
internal record struct CaseFrame
{
    public CaseFrame()
    {
    }

    internal DeviceKind Device { get; set; }

    internal Fluid? Fluid { get; set; }

    internal NozzleShape Shape { get; set; }

    internal Branch Branch { get; set; }

    internal ExpansionModel Expansion { get; set; }

    internal DischargeCorrelation? Correlation { get; set; }

    internal string? LossWord { get; set; }

    internal RecoveryBasis RecoveryBasis { get; set; }

    internal double AmbientPressure { get; set; } = 101325;

    internal double AmbientTemperature { get; set; } = 288.15;

    internal bool AmbientGiven { get; set; }

    internal AmbientAltitude? Altitude { get; set; }

    internal FlowReference? FlowReference { get; set; }

    internal bool FlowIsVolume { get; set; }

    internal bool OnsetIsDifference { get; set; }

    internal bool UsesGauge { get; set; }
}
