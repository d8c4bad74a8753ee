namespace FlowDuct.Fluids.Gases;

/// <summary>One gas of a mixture as somebody gave it.</summary>
/// <param name="Species">The gas.</param>
/// <param name="Fraction">Its mole or mass fraction, 0 to 1.</param>
/// <param name="HalfPlace">Half of the last printed place of the fraction; 0 where it is exact.</param>
internal sealed record GasFraction(Species Species, double Fraction, double HalfPlace = 0);
