namespace FlowDuct.Quantities;

/// <summary>The places of a device at which a state is given or answered.</summary>
internal enum Station
{
    /// <summary>Where the flow enters.</summary>
    Inlet,

    /// <summary>The narrowest section.</summary>
    Throat,

    /// <summary>The exit plane.</summary>
    Exit,

    /// <summary>The surroundings of the device.</summary>
    Ambient,

    /// <summary>The one station of a property question.</summary>
    At,
}
