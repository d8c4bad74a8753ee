namespace FlowDuct.Fluids.Water;

/// <summary>Chooses the subregion of v(p,T) in region 3: 0 for 3a to 25 for 3z. SR5-05(2016), Tables 2 and 10.</summary>
internal static class Region3Subregion
{
    // psat(643.15 K), section 5.1, and where the edge 3cd meets the saturation line, Table 2 note b; MPa.
    private const double PsatAt643 = 21.04336732;
    private const double P3cd = 19.00881189173929;

    // Where v' is 0.00264 and v" is 0.00385 m3/kg, MPa: Table 10, notes e and f.
    private const double P3uy = 21.93161551;
    private const double P3zx = 21.90096265;

    /// <summary>Number of the subregion at p, MPa, and T, K, inside region 3. Saturation temperature belongs to the liquid.</summary>
    internal static int Of(double p, double T)
    {
        char letter = p switch
        {
            > 40 => T <= Region3Edges.T3ab(p) ? 'a' : 'b',
            > 25 => UpTo40(p, T),
            _ when T <= ColdEdge(p) => 'c',
            > 23.5 => UpTo25(p, T, 'g'),
            > 23 => UpTo25(p, T, 'l'),
            > 22.5 => UpTo23(p, T),
            > PsatAt643 => UpTo22And5(p, T),
            _ => BelowPsatAt643(p, T),
        };
        return letter - 'a';
    }

    // Below the point where both meet, saturation cuts subregion 3c off before the edge 3cd does.
    private static double ColdEdge(double p) => p > P3cd ? Region3Edges.T3cd(p) : SaturationLine.Temperature(p * 1e6);

    private static char UpTo40(double p, double T)
    {
        if (T <= Region3Edges.T3ab(p)) return T <= Region3Edges.T3cd(p) ? 'c' : 'd';
        return T <= Region3Edges.T3ef(p) ? 'e' : 'f';
    }

    private static char UpTo25(double p, double T, char coldest)
    {
        if (T > Region3Edges.T3ef(p)) return T <= Region3Edges.T3ij(p) ? 'i' : Hottest(p, T, 'j');
        return T <= Region3Edges.T3gh(p) ? coldest : 'h';
    }

    private static char UpTo23(double p, double T)
    {
        if (T > Region3Edges.T3ij(p)) return Hottest(p, T, 'j');
        if (T > Region3Edges.T3ef(p)) return T <= Region3Edges.T3op(p) ? 'o' : 'p';
        if (T <= Region3Edges.T3gh(p)) return 'l';
        return T <= Region3Edges.T3mn(p) ? 'm' : 'n';
    }

    private static char UpTo22And5(double p, double T)
    {
        if (T <= Region3Edges.T3qu(p)) return 'q';
        if (T > Region3Edges.T3rx(p)) return Hottest(p, T, 'r');
        return p > WaterConstants.pc / 1e6 ? AboveCriticalPressure(p, T) : BelowCriticalPressure(p, T);
    }

    private static char Hottest(double p, double T, char below) => T <= Region3Edges.T3jk(p) ? below : 'k';

    private static char AboveCriticalPressure(double p, double T)
    {
        bool wide = p > 22.11;
        if (T > Region3Edges.T3ef(p)) return T > Region3Edges.T3wx(p) ? 'x' : wide ? 'w' : 'z';
        return T <= Region3Edges.T3uv(p) ? 'u' : wide ? 'v' : 'y';
    }

    private static char BelowCriticalPressure(double p, double T)
    {
        if (T <= SaturationLine.Temperature(p * 1e6)) return p <= P3uy || T <= Region3Edges.T3uv(p) ? 'u' : 'y';
        return p <= P3zx || T > Region3Edges.T3wx(p) ? 'x' : 'z';
    }

    private static char BelowPsatAt643(double p, double T)
    {
        if (p <= P3cd) return 't';
        if (T <= SaturationLine.Temperature(p * 1e6)) return 's';
        return p <= 20.5 ? 't' : Hottest(p, T, 'r');
    }
}
