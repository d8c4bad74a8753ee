using System.Globalization;

namespace FlowDuct.Fluids.Gases;

/// <summary>Names the limit behind an outcome; runs only to speak of a failure.</summary>
internal readonly struct HelmholtzRefusal(HelmholtzFluid fluid)
{
    private readonly HelmholtzEquation of = fluid.Equation;
    private readonly PhaseBoundary boundary = fluid.Boundary;
    private readonly string source = fluid.Source;

    internal RangeViolation Of(Outcome outcome, StatePair pair, double first, double second) => outcome switch
    {
        Outcome.PressureTooLow => new("p", first, HelmholtzRange.LeastPressure, false, "this program (the equation needs only p > 0)"),
        Outcome.PressureTooHigh => new("p", first, of.Parameters.pMost, true, source),
        Outcome.TemperatureTooLow => Cold(first, second),
        Outcome.TemperatureTooHigh => new("T", second, of.Parameters.Tmost, true, source),
        Outcome.QualityOutsideRange => new("x", second, second > 1 ? 1 : 0, second > 1, "the quality of a mixture"),
        Outcome.NoSaturation => Saturation(pair, first),
        Outcome.BetweenPhases => BetweenPhases(pair, first, second),
        _ => OfPair(outcome, pair, first, second),
    };

    private string Melting(double p) => p <= of.Melting.pt
        ? $"triple point, {source}"
        : string.Create(CultureInfo.InvariantCulture, $"melting line at this pressure, {source}");

    private RangeViolation Cold(double p, double T) => new("T", T, HelmholtzRange.LeastTemperature(of, p), false, Melting(p));

    private RangeViolation Saturation(StatePair pair, double first)
    {
        bool byT = pair == StatePair.TX;
        (double low, double high) = byT ? (of.Parameters.Tleast, boundary.Tc) : (boundary.pLeast, boundary.pc);
        bool above = first > Math.Sqrt(low * high);
        return new(byT ? "T" : "p", first, above ? high : low, above, $"the saturation line, {source}");
    }

    // A vapour has to lie on this side of the dew line; the bubble line is the other end.
    private RangeViolation BetweenPhases(StatePair pair, double first, double second)
    {
        string where = $"dew line of air, {source}: between it and the bubble line the equation, which takes air as one pure fluid, has no state";
        if (pair == StatePair.PT && boundary is AirBoundary air) return new("p", first, air.DewPressure(second), true, where);
        if (pair == StatePair.HS || !boundary.TryAtPressure(first, out HelmholtzPair edge)) return new("s", second, second, false, where);
        return pair switch
        {
            StatePair.PH => new("h", second, edge.Vapour.h, false, where),
            StatePair.PS => new("s", second, edge.Vapour.s, false, where),
            _ => new("rho", second, edge.Vapour.rho, true, where),
        };
    }

    // The limit of h, s or rho at this pressure is the value on the coldest or hottest edge.
    private RangeViolation OfPair(Outcome outcome, StatePair pair, double first, double second)
    {
        bool high = outcome == Outcome.PairTooHigh;
        if (pair == StatePair.HS) return Isentrope(high, first, second);
        double p = Math.Clamp(first, HelmholtzRange.LeastPressure, of.Parameters.pMost), T = high ? of.Parameters.Tmost : HelmholtzRange.LeastTemperature(of, p);
        fluid.FromPT(p, T, out FluidState edge);
        string where = string.Create(CultureInfo.InvariantCulture, $"{(high ? source : Melting(p))} ({T} K)");
        return pair switch
        {
            StatePair.PH => new("h", second, edge.h, high, where),
            StatePair.PS => new("s", second, edge.s, high, where),
            _ => new("rho", second, edge.rho, !high, where),
        };
    }

    // On an isentrope the range ends at the lowest or highest pressure that still has a state.
    private RangeViolation Isentrope(bool high, double h, double s)
    {
        (double low, double top) = (HelmholtzRange.LeastPressure, of.Parameters.pMost);
        double inside = boundary.pc;
        for (int i = 0; i < 80; i++)
        {
            double p = Math.Sqrt((high ? top : low) * inside);
            if (fluid.FromPS(p, s, default, out _) == Outcome.Ok) inside = p;
            else if (high) top = p;
            else low = p;
        }

        fluid.FromPS(inside, s, default, out FluidState edge);
        return new("h", h, edge.h, high, $"{source} at this entropy");
    }
}
