namespace FlowDuct.Fluids;

/// <summary>What a reader of a state should know about how it was obtained; solvers pass the bits on, findings speak.</summary>
[Flags]
public enum Notices
{
    /// <summary>Nothing to say.</summary>
    None = 0,

    /// <summary>Outside the fit of the correlation, inside its documented continuation (air from 50 K to 200 K).</summary>
    Extrapolated = 1,

    /// <summary>A metastable state: the equilibrium phase is another one.</summary>
    Metastable = 2,

    /// <summary>The pair falls into a gap between two regions and is served by the cooler region's equation past its edge.</summary>
    RegionGap = 4,

    /// <summary>Below the triple-point pressure: what condenses from here is ice.</summary>
    BelowTriplePoint = 8,

    /// <summary>So near the critical point that derivatives lose digits.</summary>
    NearCritical = 16,

    /// <summary>Ice is the stable phase here; the state is one that does not freeze.</summary>
    Ice = 32,
}
