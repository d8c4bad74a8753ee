namespace FlowDuct.Devices;

/// <summary>How a law of nature judges the figures.</summary>
internal enum Verdict
{
    /// <summary>The figures obey it.</summary>
    Holds,

    /// <summary>They break it by less than their own printed rounding.</summary>
    WithinRounding,

    /// <summary>No device can have them.</summary>
    Broken,

    /// <summary>Nothing to judge: the figures that it needs were not given.</summary>
    NotJudged,
}

/// <summary>The judgement of mass, energy and entropy.</summary>
internal sealed record Audit
{
    internal Verdict Mass { get; init; } = Verdict.NotJudged;

    internal Verdict Energy { get; init; } = Verdict.NotJudged;

    internal Verdict Entropy { get; init; } = Verdict.NotJudged;

    /// <summary>Entropy rise above the least that the second law allows, J/(kg.K); negative is a breach.</summary>
    internal double? EntropyMargin { get; init; }

    /// <summary>How far the printed rounding of the figures can move that margin, J/(kg.K).</summary>
    internal double EntropyRounding { get; init; }

    /// <summary>The highest exit velocity that the second law allows at the exit pressure, m/s.</summary>
    internal double? HighestExitVelocity { get; init; }

    /// <summary>The highest exit pressure that the second law allows at the exit velocity, Pa.</summary>
    internal double? HighestExitPressure { get; init; }

    /// <summary>Total energy missing at the exit, J/kg, where the static enthalpy alone exceeds what came in.</summary>
    internal double? EnergyShortfall { get; init; }

    /// <summary>The flow that the second section carries, kg/s, where it differs from the flow given.</summary>
    internal double? MassFlowFound { get; init; }

    /// <summary>The rounding of that comparison, kg/s.</summary>
    internal double MassFlowRounding { get; init; }
}
