namespace FlowDuct.Quantities;

/// <summary>The range that a quantity has by its nature, SI; infinite where it has none.</summary>
/// <param name="Least">Lower limit.</param>
/// <param name="Greatest">Upper limit.</param>
/// <param name="IncludesLeast">Whether the lower limit itself is allowed.</param>
internal readonly record struct QuantityLimits(double Least, double Greatest, bool IncludesLeast)
{
    /// <summary>Any finite number.</summary>
    public static QuantityLimits Any => new(double.NegativeInfinity, double.PositiveInfinity, false);

    /// <summary>Above zero.</summary>
    public static QuantityLimits Positive => new(0, double.PositiveInfinity, false);

    /// <summary>Zero or above.</summary>
    public static QuantityLimits NotNegative => new(0, double.PositiveInfinity, true);

    /// <summary>0 to 1, both included.</summary>
    public static QuantityLimits Fraction => new(0, 1, true);

    /// <summary>Above 0, up to and including 1.</summary>
    public static QuantityLimits PositiveFraction => new(0, 1, false);

    /// <summary>True where a finite value lies inside.</summary>
    public bool Contains(double si) => double.IsFinite(si) && (IncludesLeast ? si >= Least : si > Least) && si <= Greatest;
}
