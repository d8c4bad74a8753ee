namespace FlowDuct.Devices;

/// <summary>The figures of a station after synonyms are merged (moisture into x, bore into section, dp into p), a bit each.</summary>
[Flags]
internal enum Figure
{
    None = 0,
    P = 1 << 0,
    T = 1 << 1,
    H = 1 << 2,
    S = 1 << 3,
    U = 1 << 4,
    Rho = 1 << 5,
    X = 1 << 6,

    /// <summary>Temperature above saturation; subcooling is its opposite.</summary>
    Superheat = 1 << 7,
    P0 = 1 << 8,
    T0 = 1 << 9,
    H0 = 1 << 10,
    V = 1 << 11,
    M = 1 << 12,
    Section = 1 << 13,

    /// <summary>Isentropic efficiency; the velocity coefficient is its root.</summary>
    Efficiency = 1 << 14,
    Loss = 1 << 15,
}

/// <summary>Sets of figures.</summary>
internal static class Figures
{
    internal const Figure Static =
        Figure.P | Figure.T | Figure.H | Figure.S | Figure.U | Figure.Rho | Figure.X | Figure.Superheat;

    internal const Figure Stagnation = Figure.P0 | Figure.T0 | Figure.H0;

    private static readonly (Figure Figure, string Symbol)[] s_symbols =
    [
        (Figure.P, "p"), (Figure.T, "T"), (Figure.H, "h"), (Figure.S, "s"), (Figure.U, "u"), (Figure.Rho, "rho"), (Figure.X, "x"),
        (Figure.Superheat, "superheat"), (Figure.P0, "p0"), (Figure.T0, "T0"), (Figure.H0, "h0"), (Figure.V, "V"), (Figure.M, "M"),
        (Figure.Section, "A or d"), (Figure.Efficiency, "efficiency"), (Figure.Loss, "loss coefficient"),
    ];

    /// <summary>The symbols of a set, comma-separated.</summary>
    internal static string Names(Figure set) => string.Join(", ", s_symbols.Where(row => (set & row.Figure) != 0).Select(row => row.Symbol));
}
