namespace FlowDuct.Fluids.Water.Verification;

/// <summary>Basic, saturation, boundary and backward equations of IAPWS R7-97(2012) by name; MPa, kJ and K.</summary>
internal static class BasicEquations
{
    internal static double Of(CheckRow row, double a, double b)
    {
        string equation = row.Equation;
        bool basic = equation.Contains("basic equation", StringComparison.Ordinal) || equation.Contains("metastable", StringComparison.Ordinal);
        return basic ? Property(State(equation, a, b), row.Output) : Line(equation, a, b);
    }

    /// <summary>A property of a state by its printed symbol.</summary>
    internal static double Property(in RegionState at, string symbol) => symbol switch
    {
        "p" => at.p / 1e6,
        "v" => at.v,
        "h" => at.h / 1e3,
        "s" => at.s / 1e3,
        "u" => (at.h - (at.p * at.v)) / 1e3,
        "cp" => at.cp / 1e3,
        "cv" => at.cv / 1e3,
        "w" => at.w,
        "rho" => 1 / at.v,
        _ => throw new ArgumentOutOfRangeException(nameof(symbol), symbol, "no such property"),
    };

    private static RegionState State(string equation, double T, double second) => equation[..7] switch
    {
        "region1" => Region1.State(second * 1e6, T),
        "region2" when equation.Contains("metastable", StringComparison.Ordinal) => MetastableVapour.State(second * 1e6, T),
        "region2" => Region2.State(second * 1e6, T),
        "region3" => Region3.State(second, T),
        "region5" => Region5.State(second * 1e6, T),
        _ => throw new ArgumentOutOfRangeException(nameof(equation), equation, "no such equation"),
    };

    private static double Line(string equation, double a, double b) => equation switch
    {
        "B23-equation (5)" => Boundaries.pB23(a) / 1e6,
        "B23-equation (6)" => Boundaries.TB23(a * 1e6),
        "B2bc-equation (20)" => Inverse2bc(a),
        "B2bc-equation (21)" => Boundaries.h2bc(a * 1e6) / 1e3,
        "saturation-pressure equation (30)" => SaturationLine.Pressure(a) / 1e6,
        "saturation-temperature equation (31)" => SaturationLine.Temperature(a * 1e6),
        _ when equation.StartsWith("backward T(p,h) region 1", StringComparison.Ordinal) => Region1.TFromPH(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,s) region 1", StringComparison.Ordinal) => Region1.TFromPS(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,h) subregion 2", StringComparison.Ordinal) => Region2.TFromPH(a * 1e6, b * 1e3),
        _ when equation.StartsWith("backward T(p,s) subregion 2", StringComparison.Ordinal) => Region2.TFromPS(a * 1e6, b * 1e3),
        _ => throw new ArgumentOutOfRangeException(nameof(equation), equation, "no such equation"),
    };

    // Eq. (20) is the inverse of Eq. (21), which is the one that is used: found by bisection.
    private static double Inverse2bc(double h)
    {
        (double low, double high) = (6.5467, 100);
        for (int i = 0; i < 100; i++)
        {
            double p = (low + high) / 2;
            if (Boundaries.h2bc(p * 1e6) / 1e3 < h) low = p;
            else high = p;
        }

        return low;
    }
}
