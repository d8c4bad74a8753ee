namespace FlowDuct.Fluids;

/// <summary>The words for phases in text and JSON.</summary>
internal static class PhaseWords
{
    /// <summary>The phase in lower case with hyphens; null where no state is known.</summary>
    internal static string? Of(Phase phase) => phase switch
    {
        Phase.Gas => "gas",
        Phase.Liquid => "liquid",
        Phase.SaturatedLiquid => "saturated-liquid",
        Phase.Wet => "wet-vapour",
        Phase.SaturatedVapour => "saturated-vapour",
        Phase.SuperheatedVapour => "superheated-vapour",
        Phase.Supercritical => "supercritical",
        _ => null,
    };
}
