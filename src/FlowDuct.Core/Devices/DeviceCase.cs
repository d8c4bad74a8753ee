using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>The devices that are solved.</summary>
internal enum DeviceKind
{
    /// <summary>A duct that speeds the flow up.</summary>
    Nozzle,

    /// <summary>A duct that slows the flow down and raises its pressure.</summary>
    Diffuser,

    /// <summary>A nozzle followed by a diffuser.</summary>
    Venturi,
}

/// <summary>The words of the devices, as in commands, answers and datasheets.</summary>
internal static class DeviceWords
{
    internal static string Of(DeviceKind device) => device switch
    {
        DeviceKind.Nozzle => "nozzle",
        DeviceKind.Diffuser => "diffuser",
        _ => "venturi",
    };
}

/// <summary>The form of a nozzle.</summary>
internal enum NozzleShape
{
    /// <summary>Not given: decided by the figures, and said.</summary>
    Auto,

    /// <summary>The exit is the narrowest section.</summary>
    Convergent,

    /// <summary>The exit lies behind a throat.</summary>
    ConvergentDivergent,
}

/// <summary>What the fluid does where an expansion meets saturation.</summary>
internal enum ExpansionModel
{
    /// <summary>Both phases stay in equilibrium.</summary>
    Equilibrium,

    /// <summary>Vapour does not condense.</summary>
    Supersaturated,

    /// <summary>Liquid does not flash.</summary>
    SinglePhase,
}

/// <summary>Which of two solutions is wanted.</summary>
internal enum Branch
{
    /// <summary>Not said: several solutions are listed and refused.</summary>
    Ask,

    /// <summary>The solution slower than sound.</summary>
    Subsonic,

    /// <summary>The solution faster than sound.</summary>
    Supersonic,
}

/// <summary>On which head the pressure recovery is based.</summary>
internal enum RecoveryBasis
{
    /// <summary>p0,1 - p1.</summary>
    Stagnation,

    /// <summary>rho1 V1^2 / 2.</summary>
    Dynamic,
}

/// <summary>One device at one operating point: what is given, SI.</summary>
internal sealed record DeviceCase
{
    private GivenSlots _inlet;
    private GivenSlots _exit;
    private GivenSlots _options;
    private GivenSlots _throat;
    private GivenSlots _back;

    internal required DeviceKind Device { get; init; }

    internal required Fluid Fluid { get; init; }

    internal NozzleShape Shape { get; init; }

    internal Branch Branch { get; init; }

    internal ExpansionModel Expansion { get; init; }

    /// <summary>The correlation that gives the discharge coefficient; null where a number or none is given.</summary>
    internal Coefficients.DischargeCorrelation? DischargeCorrelation { get; init; }

    /// <summary>The word of a correlation or balance that gives the loss of a diffuser; null where a number or none is given.</summary>
    internal string? LossWord { get; init; }

    internal RecoveryBasis RecoveryBasis { get; init; }

    /// <summary>Ambient pressure, Pa.</summary>
    internal double AmbientPressure { get; init; } = 101325;

    /// <summary>Ambient temperature, K.</summary>
    internal double AmbientTemperature { get; init; } = 288.15;

    /// <summary>True where the ambient state was typed, false where the default stands in for it.</summary>
    internal bool AmbientGiven { get; init; }

    /// <summary>The altitude that the ambient state was given by; null where it was not.</summary>
    internal AmbientAltitude? AmbientAltitude { get; init; }

    /// <summary>True where the flow is an actual volume flow at the inlet, m3/s; else it is a mass flow, kg/s.</summary>
    internal bool FlowIsVolume { get; init; }

    /// <summary>The reference volume that the mass flow was given by; null where it was given otherwise.</summary>
    internal FlowReference? FlowReference { get; init; }

    /// <summary>True where the onset of the other phase is a temperature difference, K; else it is its mass fraction at equilibrium.</summary>
    internal bool OnsetIsDifference { get; init; }

    /// <summary>True where a gauge or vacuum reading made use of the ambient pressure.</summary>
    internal bool UsesGauge { get; init; }

    internal ref GivenSlots Inlet => ref _inlet;

    internal ref GivenSlots Exit => ref _exit;

    internal ref GivenSlots Options => ref _options;

    /// <summary>What is given of the throat (nozzle).</summary>
    internal ref GivenSlots Throat => ref _throat;

    /// <summary>What is given of the space beyond the exit (nozzle).</summary>
    internal ref GivenSlots Back => ref _back;

    internal bool Has(CaseOption option) => _options.Has((int)option);

    internal double Value(CaseOption option) => _options.Value((int)option);

    internal double ValueOr(CaseOption option, double otherwise) => Has(option) ? Value(option) : otherwise;

    /// <summary>The efficiency, given as itself or as the square of a velocity coefficient; null where neither is.</summary>
    internal double? GivenEfficiency =>
        Has(CaseOption.VelocityCoefficient) ? Value(CaseOption.VelocityCoefficient) * Value(CaseOption.VelocityCoefficient)
        : Has(CaseOption.Efficiency) ? Value(CaseOption.Efficiency)
        : null;

    /// <summary>The flow as a mass flow at an inlet of this density, kg/m3; null where none is given.</summary>
    internal double? GivenMassFlow(double rho) => Has(CaseOption.Flow) ? Value(CaseOption.Flow) * (FlowIsVolume ? rho : 1) : null;

    /// <summary>Where a held phase gives way.</summary>
    internal Onset Onset => !Has(CaseOption.Onset) ? Onset.AtTheEnd
        : OnsetIsDifference ? Onset.AtDifference(Value(CaseOption.Onset)) : Onset.AtFraction(Value(CaseOption.Onset));

    /// <summary>Heat added per mass, J/kg: heat minus heat loss.</summary>
    internal double Heat => ValueOr(CaseOption.Heat, 0) - ValueOr(CaseOption.HeatLoss, 0);
}
