namespace FlowDuct.Fluids.Gases;

/// <summary>cp/R, h/R and s0/R of one gas over its whole range, continuous at every joint, and their inverses.</summary>
/// <remarks>
/// <para>h is zero at 0 K: h = h_fit - h_fit(298.15 K) + (h(298.15 K) - h(0 K) as printed).</para>
/// <para>The printed fits miss each other at a joint by their rounding (air at 1000 K: 0.0002 J/mol and 6e-7 J/(mol.K)). A (p,h)
/// pair inside such a jump would have no temperature, so each warmer piece is moved by the jump; 1e-8 of h at most.</para>
/// </remarks>
internal sealed class CaloricCurve
{
    private const double ReferenceTemperature = 298.15;

    // Newton from the start table is converged after one or two steps; the limit only guards against a defect.
    private const int SolveLimit = 60;

    // Relative; rounding of the sums is near 3e-16, the promise to callers 1e-12.
    private const double Closure = 1e-13;

    private readonly CaloricPiece[] pieces;
    private readonly StartTable fromEnthalpy;
    private readonly StartTable fromEntropy;

    internal CaloricCurve(Species species, double R)
    {
        FitFrom = species.Intervals[0].Tlow;
        Tlow = species.ContinuedDownTo;
        Thigh = species.Intervals[^1].Thigh;
        pieces = Join(species, species.EnthalpyAbove0KAt298 / R);
        (Lowest, Highest) = (At(Tlow), At(Thigh));
        fromEnthalpy = StartTable.OfEnthalpy(this);
        fromEntropy = StartTable.OfEntropy(this);
    }

    /// <summary>Least temperature, K, continuation included.</summary>
    internal double Tlow { get; }

    /// <summary>Greatest temperature, K.</summary>
    internal double Thigh { get; }

    /// <summary>Temperature, K, from which the printed fit holds.</summary>
    internal double FitFrom { get; }

    /// <summary>Properties at <see cref="Tlow"/>.</summary>
    internal Reduced Lowest { get; }

    /// <summary>Properties at <see cref="Thigh"/>.</summary>
    internal Reduced Highest { get; }

    /// <summary>Properties at T, K, inside the range.</summary>
    internal Reduced At(double T)
    {
        CaloricPiece[] all = pieces;
        int i = 0;
        while (i < all.Length - 1 && T >= all[i].Thigh)
            i++;
        return all[i].At(T);
    }

    /// <summary>T, K, from h/R, K, inside the range; <paramref name="at"/> belongs to that T.</summary>
    internal bool TryTemperatureFromEnthalpy(double h, out double T, out Reduced at)
    {
        T = fromEnthalpy.Start(h);
        (double low, double high) = (Tlow, Thigh);
        for (int i = 0; i < SolveLimit; i++)
        {
            at = At(T);
            double miss = h - at.h;
            if (Math.Abs(miss) <= Closure * h)
                return true;
            Narrow(miss, T, ref low, ref high);
            T = Inside(T + (miss / at.cp), low, high);
        }

        at = default;
        return false;
    }

    /// <summary>T, K, from s0/R, inside the range; <paramref name="at"/> belongs to that T.</summary>
    internal bool TryTemperatureFromEntropy(double s0, out double T, out Reduced at)
    {
        T = fromEntropy.Start(s0);
        (double low, double high) = (Tlow, Thigh);
        for (int i = 0; i < SolveLimit; i++)
        {
            at = At(T);
            double miss = s0 - at.s0;
            if (Math.Abs(miss) <= Closure * s0)
                return true;
            Narrow(miss, T, ref low, ref high);
            double step = miss / at.cp; // in ln T; to second order, so that exp is not needed
            T = Inside(T + (T * step * (1 + (step / 2))), low, high);
        }

        at = default;
        return false;
    }

    private static void Narrow(double miss, double T, ref double low, ref double high)
    {
        if (miss > 0)
            low = T;
        else
            high = T;
    }

    // An end of the range is a state of the range: clamp to it; bisect only where Newton leaves a bracket it has narrowed.
    private double Inside(double T, double low, double high) =>
        T >= low && T <= high ? T
        : T < low && low == Tlow ? low
        : T > high && high == Thigh ? high
        : 0.5 * (low + high);

    private static CaloricPiece[] Join(Species species, double datum)
    {
        List<CaloricPiece> joined = [AtDatum(species.Intervals[0], datum)];
        foreach (Nasa9Interval next in species.Intervals.Skip(1))
        {
            Reduced joint = joined[^1].At(next.Tlow);
            joined.Add(CaloricPiece.Through(next, next.Tlow, joint.h, joint.s0));
        }

        double Tfit = species.Intervals[0].Tlow;
        if (species.ContinuedDownTo < Tfit)
            joined.Insert(0, CaloricPiece.ConstantThrough(species.ContinuedDownTo, Tfit, joined[0].At(Tfit)));
        return [.. joined];
    }

    private static CaloricPiece AtDatum(Nasa9Interval first, double datum)
    {
        Reduced printed = new CaloricPiece(first).At(ReferenceTemperature);
        return CaloricPiece.Through(first, ReferenceTemperature, datum, printed.s0);
    }
}
