using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids.Gases;

/// <summary>Second virial coefficient of a gas or mixture: B = sum sum x_i x_j B_ij.</summary>
internal sealed class SecondVirial
{
    private readonly VirialPair[] pairs;

    private SecondVirial(VirialPair[] pairs, double Tc, double pc) => (this.pairs, this.Tc, this.pc) = (pairs, Tc, pc);

    // Kay's rule (common practice): the mole-weighted critical point, to tell where the series fails.
    private double Tc { get; }

    private double pc { get; }

    /// <summary>The coefficient of a mixture; null where one of its gases has no critical constants.</summary>
    internal static SecondVirial? Of(IReadOnlyList<GasComponent> components)
    {
        CriticalConstants[] gases = new CriticalConstants[components.Count];
        (double Tc, double pc) = (0, 0);
        for (int i = 0; i < gases.Length; i++)
        {
            if (CriticalRecords.Find(components[i].Species.Formula) is not CriticalConstants known) return null;
            gases[i] = known;
            (Tc, pc) = (Tc + (components[i].x * known.Tc), pc + (components[i].x * known.pc));
        }

        return new SecondVirial([.. Pairs(components, gases)], Tc, pc);
    }

    /// <summary>The coefficient at T, K.</summary>
    internal Virial At(double T)
    {
        (double B, double dB, double d2B) = (0, 0, 0);
        foreach (VirialPair pair in pairs)
        {
            Virial of = Tsonopoulos.At(pair.Gas, T);
            (B, dB, d2B) = (B + (pair.Weight * of.B), dB + (pair.Weight * of.dB), d2B + (pair.Weight * of.d2B));
        }

        return new Virial(B, dB, d2B);
    }

    /// <summary>
    /// True where a series of one term is no longer an estimate: the pressure above half the critical pressure times T/Tc (common
    /// practice).
    /// </summary>
    internal bool FailsAt(double p, double T) => p / pc > 0.5 * T / Tc;

    private static IEnumerable<VirialPair> Pairs(IReadOnlyList<GasComponent> components, CriticalConstants[] gases)
    {
        for (int i = 0; i < gases.Length; i++)
        {
            yield return new(gases[i], components[i].x * components[i].x);
            for (int j = 0; j < i; j++)
                yield return new(CriticalConstants.OfPair(gases[i], gases[j]), 2 * components[i].x * components[j].x);
        }
    }
}
