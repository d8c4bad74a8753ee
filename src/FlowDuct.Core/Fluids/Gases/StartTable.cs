namespace FlowDuct.Fluids.Gases;

/// <summary>
/// Temperatures and their slopes at evenly spaced values of h/R or s0/R. The cubic between two rows is within 1e-4 K, so that
/// Newton needs one step: half the time of a start from straight lines.
/// </summary>
internal sealed class StartTable
{
    private const int Steps = 256;

    private readonly (double T, double Rise)[] rows = new (double, double)[Steps + 1];
    private readonly double first;
    private readonly double perStep;

    private StartTable(double first, double last)
    {
        this.first = first;
        perStep = Steps / (last - first);
    }

    internal static StartTable OfEnthalpy(CaloricCurve curve)
    {
        StartTable table = new(curve.Lowest.h, curve.Highest.h);
        table.Fill(curve, at => at.h, (at, _) => 1 / at.cp);
        return table;
    }

    internal static StartTable OfEntropy(CaloricCurve curve)
    {
        StartTable table = new(curve.Lowest.s0, curve.Highest.s0);
        table.Fill(curve, at => at.s0, (at, T) => T / at.cp);
        return table;
    }

    /// <summary>T, K, near the given value, which lies inside the range of the table.</summary>
    internal double Start(double value)
    {
        double place = (value - first) * perStep;
        int i = Math.Clamp((int)place, 0, Steps - 1);
        (double T0, double rise0) = rows[i];
        (double T1, double rise1) = rows[i + 1];
        double x = place - i;
        double straight = T1 - T0;
        double bend = (x - 1) * (((rise1 - straight) * x) + ((rise0 - straight) * (x - 1)));
        return T0 + (x * (straight + bend));
    }

    // Marches up with one Newton step a row; the error left over does not pile up because each row aims at its own value.
    private void Fill(CaloricCurve curve, Func<Reduced, double> valueOf, Func<Reduced, double, double> slopeOf)
    {
        rows[0] = (curve.Tlow, slopeOf(curve.Lowest, curve.Tlow) / perStep);
        for (int i = 1; i <= Steps; i++)
        {
            double guess = Math.Min(rows[i - 1].T + rows[i - 1].Rise, curve.Thigh);
            Reduced at = curve.At(guess);
            double miss = first + (i / perStep) - valueOf(at);
            double T = Math.Min(guess + (miss * slopeOf(at, guess)), curve.Thigh);
            rows[i] = (T, slopeOf(curve.At(T), T) / perStep);
        }
    }
}
