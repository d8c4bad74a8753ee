namespace FlowDuct.Fluids;

/// <summary>The phase of a state of a fluid.</summary>
public enum Phase
{
    /// <summary>No state was computed.</summary>
    None,

    /// <summary>Ideal gas, where the model knows no other phase; or a real gas above its critical temperature and below its critical pressure.</summary>
    Gas,

    /// <summary>Liquid below its saturation temperature (subcooled).</summary>
    Liquid,

    /// <summary>Liquid on the saturation line, x = 0.</summary>
    SaturatedLiquid,

    /// <summary>Liquid and vapour in equilibrium, 0 &lt; x &lt; 1.</summary>
    Wet,

    /// <summary>Vapour on the saturation line, x = 1.</summary>
    SaturatedVapour,

    /// <summary>Vapour above its saturation temperature (superheated).</summary>
    SuperheatedVapour,

    /// <summary>Above both the critical pressure and the critical temperature.</summary>
    Supercritical,
}
