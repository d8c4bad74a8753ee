namespace FlowDuct.Fluids.Water;

/// <summary>Names the limit of IAPWS R7-97(2012) that a pair crosses.</summary>
internal static class WaterRange
{
    private const string Source = "IAPWS R7-97(2012)";

    internal static RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) => outcome switch
    {
        Outcome.PressureTooLow => new("p", first, WaterConstants.pLeast, false, "this program (the release says only p > 0)"),
        Outcome.PressureTooHigh when pair == StatePair.PT && second > WaterConstants.T25 =>
            new("p", first, WaterConstants.pMost5, true, $"{Source} above 1073.15 K (region 5)"),
        Outcome.PressureTooHigh => new("p", first, WaterConstants.pMost, true, Source),
        Outcome.TemperatureTooLow => new("T", second, WaterConstants.TLeast, false, Source),
        Outcome.TemperatureTooHigh => new("T", second, WaterConstants.TMost, true, Source),
        Outcome.QualityOutsideRange => new("x", second, second > 1 ? 1 : 0, second > 1, "the quality of a mixture"),
        Outcome.NoSaturation => Saturation(pair, first),
        _ => Pair(outcome, pair, first, second),
    };

    private static RangeViolation Saturation(StatePair pair, double first) => pair == StatePair.TX
        ? new("T", first, first > 400 ? WaterConstants.Tc : WaterConstants.TLeast, first > 400, $"the saturation line of {Source}")
        : new("p", first, first > 1e6 ? WaterConstants.pc : SaturationLine.pAtLeastT, first > 1e6, $"the saturation line of {Source}");

    // The limit of h, s or rho at this pressure is the value on the coldest or hottest edge.
    private static RangeViolation Pair(Outcome outcome, StatePair pair, double first, double second)
    {
        bool high = outcome == Outcome.PairTooHigh;
        if (pair == StatePair.HS) return Isentrope(high, first, second);
        double THot = first <= WaterConstants.pMost5 ? WaterConstants.TMost : WaterConstants.T25;
        WaterFluid.Instance.FromPT(Math.Clamp(first, WaterConstants.pLeast, WaterConstants.pMost), high ? THot : WaterConstants.TLeast, out FluidState edge);
        string where = high ? $"{Source} at {THot} K and this pressure" : $"{Source} at 273.15 K and this pressure";
        return pair switch
        {
            StatePair.PH => new("h", second, edge.h, high, where),
            StatePair.PS => new("s", second, edge.s, high, where),
            _ => new("rho", second, edge.rho, !high, where),
        };
    }

    // On an isentrope the range ends at the lowest or highest pressure that still has a state.
    private static RangeViolation Isentrope(bool high, double h, double s)
    {
        double low = WaterConstants.pLeast, top = WaterConstants.pMost;
        for (int i = 0; i < 80; i++)
        {
            double p = Math.Sqrt(low * top);
            bool inside = Inverse<ByEntropy>.Solve(p, s, out _) == Outcome.Ok;
            if (inside == high) low = p;
            else top = p;
        }

        Inverse<ByEntropy>.Solve(high ? low : top, s, out FluidState edge);
        return new("h", h, edge.h, high, $"{Source} at this entropy");
    }
}
