namespace FlowDuct.Fluids.Gases;

/// <summary>One gas in a mixture; a pure gas is its own only component.</summary>
/// <param name="Species">The gas.</param>
/// <param name="x">Mole fraction; all of a mixture add up to 1.</param>
internal sealed record GasComponent(Species Species, double x);
