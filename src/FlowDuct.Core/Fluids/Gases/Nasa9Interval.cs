namespace FlowDuct.Fluids.Gases;

/// <summary>One temperature interval of a NASA nine-coefficient fit: the printed numbers, NASA/TP-2002-211556 (2002).</summary>
/// <param name="Tlow">Least temperature, K.</param>
/// <param name="Thigh">Greatest temperature, K.</param>
internal sealed record Nasa9Interval(double Tlow, double Thigh)
{
    /// <summary>Factor of T^-2 in cp/R, K2.</summary>
    internal required double a1 { get; init; }

    /// <summary>Factor of T^-1 in cp/R, K.</summary>
    internal required double a2 { get; init; }

    /// <summary>Constant term of cp/R.</summary>
    internal required double a3 { get; init; }

    /// <summary>Factor of T in cp/R, 1/K.</summary>
    internal required double a4 { get; init; }

    /// <summary>Factor of T^2 in cp/R, 1/K2.</summary>
    internal required double a5 { get; init; }

    /// <summary>Factor of T^3 in cp/R, 1/K3.</summary>
    internal required double a6 { get; init; }

    /// <summary>Factor of T^4 in cp/R, 1/K4.</summary>
    internal required double a7 { get; init; }

    /// <summary>Integration constant of h/R, K.</summary>
    internal required double b1 { get; init; }

    /// <summary>Integration constant of s0/R.</summary>
    internal required double b2 { get; init; }
}
