namespace FlowDuct.Fluids.Water.Verification;

/// <summary>The supplementary equations by the name that the check values carry, in the units of the releases: MPa, kJ and K.</summary>
internal static class SupplementaryEquations
{
    internal static double Of(string equation, double a, double b) => equation switch
    {
        "backward p(h,s) region 1, Eq. (1)" => EnthalpyEntropyGuess.p1(a * 1e3, b * 1e3) / 1e6,
        "backward p(h,s) subregion 2a, Eq. (3)" => EnthalpyEntropyGuess.p2a(a * 1e3, b * 1e3) / 1e6,
        "backward p(h,s) subregion 2b, Eq. (4)" => EnthalpyEntropyGuess.p2b(a * 1e3, b * 1e3) / 1e6,
        "backward p(h,s) subregion 2c, Eq. (5)" => EnthalpyEntropyGuess.p2c(a * 1e3, b * 1e3) / 1e6,
        "backward p(h,s) subregion 3a, Eq. (1)" => Region3EnthalpyEntropy.p3a(a * 1e3, b * 1e3) / 1e6,
        "backward p(h,s) subregion 3b, Eq. (2)" => Region3EnthalpyEntropy.p3b(a * 1e3, b * 1e3) / 1e6,
        "boundary h2ab(s), Eq. (2)" => EnthalpyEntropyGuess.h2ab(a * 1e3) / 1e3,
        "boundary p3sat(h), Eq. (10)" => Region3Saturation.PressureFromH(a * 1e3) / 1e6,
        "boundary p3sat(s), Eq. (11)" => Region3Saturation.PressureFromS(a * 1e3) / 1e6,
        "saturated liquid h'1(s), Eq. (3)" => SaturatedEnthalpy.Liquid1(a * 1e3) / 1e3,
        "saturated liquid h'3a(s), Eq. (4)" => SaturatedEnthalpy.Liquid3a(a * 1e3) / 1e3,
        "saturated vapour h\"2ab(s), Eq. (5)" => SaturatedEnthalpy.Vapour2ab(a * 1e3) / 1e3,
        "saturated vapour h\"2c3b(s), Eq. (6)" => SaturatedEnthalpy.Vapour2c3b(a * 1e3) / 1e3,
        "boundary hB13(s), Eq. (7)" => EnthalpyEntropyEdges.hB13(a * 1e3) / 1e3,
        "boundary TB23(h,s), Eq. (8)" => EnthalpyEntropyEdges.TB23(a * 1e3, b * 1e3),
        "two-phase Tsat(h,s), Eq. (9)" => WetTemperature.Of(a * 1e3, b * 1e3),
        _ when equation.StartsWith("boundary h3ab", StringComparison.Ordinal) => Boundaries.h3ab(a * 1e6) / 1e3,
        _ when equation.StartsWith("backward T(p,h) subregion 3", StringComparison.Ordinal) => Region3Backward.FromPH(a * 1e6, b * 1e3).T,
        _ when equation.StartsWith("backward T(p,s) subregion 3", StringComparison.Ordinal) => Region3Backward.FromPS(a * 1e6, b * 1e3).T,
        _ when equation.StartsWith("backward v(p,h) subregion 3", StringComparison.Ordinal) => 1 / Region3Backward.FromPH(a * 1e6, b * 1e3).rho,
        _ when equation.StartsWith("backward v(p,s) subregion 3", StringComparison.Ordinal) => 1 / Region3Backward.FromPS(a * 1e6, b * 1e3).rho,
        _ when equation.StartsWith("v(p,T) subregion 3", StringComparison.Ordinal) => Volume(equation[^1] - 'a', a * 1e6, b),
        _ when equation.StartsWith("subregion boundary T", StringComparison.Ordinal) => Edge(equation[^6..^3], a),
        _ => throw new ArgumentOutOfRangeException(nameof(equation), equation, "no such equation"),
    };

    /// <summary>Temperature of an edge of subregions at p, MPa, by its printed name.</summary>
    internal static double Edge(string name, double p) => name switch
    {
        "3ab" => Region3Edges.T3ab(p),
        "3cd" => Region3Edges.T3cd(p),
        "3ef" => Region3Edges.T3ef(p),
        "3gh" => Region3Edges.T3gh(p),
        "3ij" => Region3Edges.T3ij(p),
        "3jk" => Region3Edges.T3jk(p),
        "3mn" => Region3Edges.T3mn(p),
        "3op" => Region3Edges.T3op(p),
        "3qu" => Region3Edges.T3qu(p),
        "3rx" => Region3Edges.T3rx(p),
        "3uv" => Region3Edges.T3uv(p),
        "3wx" => Region3Edges.T3wx(p),
        "Tsat" => SaturationLine.Temperature(p * 1e6),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "no such edge"),
    };

    // The equation of the named subregion is asked; SubregionTests says that the choice finds it.
    private static double Volume(int subregion, double p, double T) => Region3Volume.InSubregion(subregion, p, T);
}
