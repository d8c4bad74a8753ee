namespace FlowDuct.Fluids.Gases;

/// <summary>What the fractions of a mixture count.</summary>
public enum FractionBasis
{
    /// <summary>Amount of substance, which for ideal gases is volume too.</summary>
    Mole,

    /// <summary>Mass.</summary>
    Mass,
}
