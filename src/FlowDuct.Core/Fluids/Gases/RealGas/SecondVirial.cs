using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids.Gases;

/// <summary>Second virial coefficient of a gas or mixture: B = sum sum x_i x_j B_ij.</summary>
internal sealed class SecondVirial
{
    private readonly (CriticalConstants Pair, double Weight)[] pairs;

    private SecondVirial((CriticalConstants Pair, double Weight)[] pairs, double Tc, double pc) => (this.pairs, this.Tc, this.pc) = (pairs, Tc, pc);

    // Kay's rule (common practice): the mole-weighted critical point, to tell where the series fails.
    private double Tc { get; }

    private double pc { get; }

    /// <summary>The coefficient of a mixture; null where one of its gases has no critical constants.</summary>
    internal static SecondVirial? Of(IReadOnlyList<GasComponent> components)
    {
        List<(CriticalConstants Gas, double x)> gases = [];
        foreach (GasComponent gas in components)
        {
            if (CriticalRecords.Find(gas.Species.Formula) is not CriticalConstants known) return null;
            gases.Add((known, gas.x));
        }

        return new SecondVirial([.. Pairs(gases)], gases.Sum(gas => gas.x * gas.Gas.Tc), gases.Sum(gas => gas.x * gas.Gas.pc));
    }

    /// <summary>The coefficient at T, K.</summary>
    internal Virial At(double T)
    {
        (double B, double dB, double d2B) = (0, 0, 0);
        foreach ((CriticalConstants pair, double weight) in pairs)
        {
            Virial of = Tsonopoulos.At(pair, T);
            (B, dB, d2B) = (B + (weight * of.B), dB + (weight * of.dB), d2B + (weight * of.d2B));
        }

        return new Virial(B, dB, d2B);
    }

    /// <summary>
    /// True where a series of one term is no longer an estimate: the pressure above half the critical pressure times T/Tc (common
    /// practice).
    /// </summary>
    internal bool FailsAt(double p, double T) => p / pc > 0.5 * T / Tc;

    private static IEnumerable<(CriticalConstants Pair, double Weight)> Pairs(List<(CriticalConstants Gas, double x)> gases)
    {
        for (int i = 0; i < gases.Count; i++)
        {
            yield return (gases[i].Gas, gases[i].x * gases[i].x);
            for (int j = 0; j < i; j++)
                yield return (CriticalConstants.OfPair(gases[i].Gas, gases[j].Gas), 2 * gases[i].x * gases[j].x);
        }
    }
}
