namespace FlowDuct.Quantities;

/// <summary>A set of display units.</summary>
internal enum UnitSystem
{
    /// <summary>bar, degC, kJ/kg, m/s, mm.</summary>
    Metric,

    /// <summary>psi, degF, Btu/lb, ft/s, in.</summary>
    Us,
}
