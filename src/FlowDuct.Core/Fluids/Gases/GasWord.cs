namespace FlowDuct.Fluids.Gases;

/// <summary>The two words of a gas.</summary>
/// <param name="Name">The name, lower case with hyphens.</param>
/// <param name="Formula">The formula or short name, case-sensitive.</param>
internal sealed record GasWord(string Name, string Formula);
