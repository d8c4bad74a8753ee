namespace FlowDuct.Fluids.Gases;

/// <summary>Critical point of a gas and its acentric factor, SI per mole.</summary>
/// <param name="Tc">Critical temperature, K.</param>
/// <param name="pc">Critical pressure, Pa.</param>
/// <param name="Vc">Critical molar volume, m3/mol.</param>
/// <param name="Zc">Critical compressibility factor.</param>
/// <param name="omega">Acentric factor.</param>
internal readonly record struct CriticalConstants(double Tc, double pc, double Vc, double Zc, double omega)
{
    /// <summary>The constants that stand for a pair of unlike gases (J. M. Prausnitz's rules, from memory).</summary>
    internal static CriticalConstants OfPair(in CriticalConstants a, in CriticalConstants b)
    {
        double Tc = Math.Sqrt(a.Tc * b.Tc), Zc = (a.Zc + b.Zc) / 2, omega = (a.omega + b.omega) / 2;
        double edge = (Math.Cbrt(a.Vc) + Math.Cbrt(b.Vc)) / 2;
        double Vc = edge * edge * edge;
        return new(Tc, Zc * IdealGas.MolarGasConstant * Tc / Vc, Vc, Zc, omega);
    }
}
