using FlowDuct.Devices;

namespace FlowDuct.Findings;

/// <summary>All rules, in the order in which findings of equal severity are printed.</summary>
internal static class FindingRules
{
    internal static readonly Func<DeviceAnswer, Finding?>[] All =
    [
        SecondLaw.Check,
        FirstLaw.Check,
        MassMismatch.Check,
        EfficiencyAboveOne.Check,
        RecoveryAboveIdeal.Check,
        SaturatedReading.Check,
        IdealAssumed.Check,
        Flashing.Check,
        WetExit.Check,
        ErosionRisk.Check,
        Icing.Check,
        LowTemperature.Check,
        NearChoking.Check,
        ModelDoubtful.Check,
        NearCritical.Check,
        IllConditioned.Check,
        ReactionForce.Check,
        Choked.Check,
        RoundingLimited.Check,
        Extrapolated.Check,
        SubAtmospheric.Check,
        InletAtRest.Check,
        AssumedAmbient.Check,
        HeatSign.Check,
    ];

    /// <summary>The findings of an answer, gravest first.</summary>
    internal static IReadOnlyList<Finding> Apply(DeviceAnswer answer) =>
        [.. All.Select(rule => rule(answer)).OfType<Finding>().OrderByDescending(finding => finding.Severity)];
}
