namespace FlowDuct.Flow;

/// <summary>The steady-flow energy balance, per mass.</summary>
internal static class Energy
{
    /// <summary>Standard acceleration of free fall, m/s2 (CGPM 1901; NIST SP 811, 2008, Appendix B).</summary>
    internal const double StandardGravity = 9.80665;

    /// <summary>Velocity, m/s, from the total and the static specific enthalpy, J/kg; 0 where the static one is greater.</summary>
    internal static double Velocity(double h0, double h) => h0 > h ? Math.Sqrt(2 * (h0 - h)) : 0;
}
