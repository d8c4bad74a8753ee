namespace FlowDuct.Fluids.Gases;

/// <summary>The record of a mixture: the mole-weighted sum of the records of its gases, with the entropy of mixing.</summary>
/// <remarks>
/// Ideal gases do not know of each other (Gibbs-Dalton): cp, h and s0 per mole add by mole fraction, each s0 at its own partial
/// pressure. The sum of nine-coefficient fits is a nine-coefficient fit on the intervals that all of them share.
/// </remarks>
internal static class MixedRecord
{
    internal static Species Of(string name, IReadOnlyList<GasComponent> components) => new()
    {
        Name = name,
        Formula = name,
        ReportRecord = string.Join(" + ", components.Select(gas => gas.Species.ReportRecord)),
        MolarMass = Sum(components, gas => gas.MolarMass),
        HeatOfFormation298 = Sum(components, gas => gas.HeatOfFormation298),
        EnthalpyAbove0KAt298 = Sum(components, gas => gas.EnthalpyAbove0KAt298),
        ContinuedDownTo = components.Max(gas => gas.Species.ContinuedDownTo),
        Intervals = [.. Intervals(components, MixingEntropy.Of(components))],
    };

    private static IEnumerable<Nasa9Interval> Intervals(IReadOnlyList<GasComponent> components, double mixing)
    {
        double[] ends = Ends(components);
        for (int i = 1; i < ends.Length; i++)
            yield return Mixed(components, mixing, ends[i - 1], ends[i]);
    }

    // Every break of every gas, inside the range that all of them have.
    private static double[] Ends(IReadOnlyList<GasComponent> components)
    {
        double Tlow = components.Max(gas => gas.Species.Intervals[0].Tlow);
        double Thigh = components.Min(gas => gas.Species.Intervals[^1].Thigh);
        List<double> ends = [];
        foreach (Nasa9Interval interval in components.SelectMany(gas => gas.Species.Intervals))
        {
            AddOnce(ends, Math.Clamp(interval.Tlow, Tlow, Thigh));
            AddOnce(ends, Math.Clamp(interval.Thigh, Tlow, Thigh));
        }

        ends.Sort();
        return [.. ends];
    }

    private static void AddOnce(List<double> ends, double T)
    {
        if (!ends.Contains(T))
            ends.Add(T);
    }

    private static Nasa9Interval Mixed(IReadOnlyList<GasComponent> components, double mixing, double Tlow, double Thigh)
    {
        return new(Tlow, Thigh)
        {
            a1 = Of(i => i.a1),
            a2 = Of(i => i.a2),
            a3 = Of(i => i.a3),
            a4 = Of(i => i.a4),
            a5 = Of(i => i.a5),
            a6 = Of(i => i.a6),
            a7 = Of(i => i.a7),
            b1 = Of(i => i.b1),
            b2 = Of(i => i.b2) + mixing,
        };

        double Of(Func<Nasa9Interval, double> coefficient) =>
            Sum(components, gas => coefficient(gas.Intervals.First(i => i.Tlow <= Tlow && i.Thigh >= Thigh)));
    }

    private static double Sum(IReadOnlyList<GasComponent> components, Func<Species, double> what)
    {
        double sum = 0;
        foreach (GasComponent gas in components)
            sum += gas.x * what(gas.Species);
        return sum;
    }
}
