namespace FlowDuct.Fluids.Gases;

/// <summary>Two gases of a mixture, or one with itself.</summary>
/// <param name="Gas">The constants that stand for the pair.</param>
/// <param name="Weight">Product of the mole fractions, twice where the gases are unlike.</param>
internal sealed record VirialPair(CriticalConstants Gas, double Weight);
