using FlowDuct.Devices;
using FlowDuct.Fluids;

namespace FlowDuct.Findings;

/// <summary>All rules, in the order in which findings of equal severity are printed.</summary>
internal static class FindingRules
{
    internal static readonly Func<DeviceAnswer, Finding?>[] All =
    [
        SecondLaw.Check,
        FirstLaw.Check,
        MassMismatch.Check,
        AboveEquilibriumFlow.Check,
        BackMismatch.Check,
        EfficiencyAboveOne.Check,
        RecoveryAboveIdeal.Check,
        SaturatedReading.Check,
        IdealAssumed.Check,
        Flashing.Check,
        Cavitation.Check,
        Stall.Check,
        WetExit.Check,
        ErosionRisk.Check,
        a => Icing.Check(a.Fluid, a),
        LowTemperature.Check,
        NearChoking.Check,
        ModelDoubtful.Check,
        a => NearCritical.Check(a.Fluid, a),
        a => Condensation.Check(a.Fluid, a),
        a => RealGas.Check(a.Fluid, a),
        IllConditioned.Check,
        Shock.Check,
        OverexpandedSeparation.Check,
        ReactionForce.Check,
        Underexpanded.Check,
        Choked.Check,
        RoundingLimited.Check,
        a => Extrapolated.Check(a.Fluid, a),
        ExtrapolatedCorrelation.Check,
        ExtrapolatedLoss.Check,
        SubAtmospheric.Check,
        InletAtRest.Check,
        AssumedAmbient.Check,
        HeatSign.Check,
    ];

    /// <summary>True where no finding is an error and, if strict, none is a caution either.</summary>
    internal static bool Pass(IReadOnlyList<Finding> findings, bool strict)
    {
        Severity least = strict ? Severity.Caution : Severity.Error;
        for (int i = 0; i < findings.Count; i++)
        {
            if (findings[i].Severity >= least) return false;
        }

        return true;
    }

    /// <summary>The rules that speak of a state alone.</summary>
    internal static readonly Func<Fluid, IStations, Finding?>[] OfStates = [Icing.Check, NearCritical.Check, Condensation.Check, RealGas.Check, Extrapolated.Check];

    /// <summary>The findings of a property answer, gravest first.</summary>
    internal static IReadOnlyList<Finding> Apply(StateAnswer answer) =>
        [.. OfStates.Select(rule => rule(answer.Fluid, answer)).OfType<Finding>().OrderByDescending(finding => finding.Severity)];

    /// <summary>The findings of an answer, gravest first.</summary>
    internal static IReadOnlyList<Finding> Apply(DeviceAnswer answer)
    {
        List<Finding>? found = null;
        foreach (Func<DeviceAnswer, Finding?> rule in All)
        {
            if (rule(answer) is Finding finding) Place(found ??= [], finding);
        }

        return found ?? (IReadOnlyList<Finding>)[];
    }

    // Behind those that are as grave or graver: few findings, so no sorting.
    private static void Place(List<Finding> found, Finding finding)
    {
        int at = found.Count;
        while (at > 0 && found[at - 1].Severity < finding.Severity) at--;
        found.Insert(at, finding);
    }
}
