namespace FlowDuct.Devices.Diffusers;

/// <summary>The form of a diffuser, from the shapes of its sections.</summary>
internal enum DiffuserShape
{
    /// <summary>Round at both ends.</summary>
    Conical,

    /// <summary>Rectangular with one pair of diverging walls, the first side; the other side is the same at both ends.</summary>
    Planar,

    /// <summary>A ring at the inlet or at the exit.</summary>
    Annular,

    /// <summary>Any other: areas alone are known.</summary>
    Other,
}
