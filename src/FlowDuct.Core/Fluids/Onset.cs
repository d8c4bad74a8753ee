namespace FlowDuct.Fluids;

/// <summary>Where a held phase gives way to the other one: at the first of its limits to be met.</summary>
/// <param name="Fraction">Mass fraction of the other phase that the same pressure and enthalpy would have at equilibrium.</param>
/// <param name="Difference">Distance from the saturation temperature, K: undercooling of a vapour, superheat of a liquid.</param>
internal readonly record struct Onset(double Fraction, double Difference)
{
    /// <summary>Held to the end of its equation.</summary>
    internal static readonly Onset AtTheEnd = new(double.PositiveInfinity, double.PositiveInfinity);

    /// <summary>At a fraction of the other phase.</summary>
    internal static Onset AtFraction(double fraction) => AtTheEnd with { Fraction = fraction };

    /// <summary>At a distance from saturation, K.</summary>
    internal static Onset AtDifference(double difference) => AtTheEnd with { Difference = difference };
}
