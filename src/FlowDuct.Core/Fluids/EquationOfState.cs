namespace FlowDuct.Fluids;

/// <summary>Which equation of state a gas is taken by.</summary>
public enum EquationOfState
{
    /// <summary>The default: an ideal gas; water is always IAPWS-IF97.</summary>
    Ideal,

    /// <summary>The published reference equation of the real gas.</summary>
    Reference,
}
