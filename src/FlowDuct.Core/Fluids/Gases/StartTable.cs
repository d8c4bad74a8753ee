namespace FlowDuct.Fluids.Gases;

/// <summary>Temperatures at evenly spaced values of h/R or s0/R: a start for Newton within some hundredths of a kelvin.</summary>
internal sealed class StartTable
{
    private const int Steps = 256;

    private readonly double[] T = new double[Steps + 1];
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
        table.Fill(curve, at => at.h, (at, _) => at.cp);
        return table;
    }

    internal static StartTable OfEntropy(CaloricCurve curve)
    {
        StartTable table = new(curve.Lowest.s0, curve.Highest.s0);
        table.Fill(curve, at => at.s0, (at, T) => at.cp / T);
        return table;
    }

    /// <summary>T, K, near the given value, which lies inside the range of the table.</summary>
    internal double Start(double value)
    {
        double place = (value - first) * perStep;
        int i = Math.Clamp((int)place, 0, Steps - 1);
        return T[i] + ((place - i) * (T[i + 1] - T[i]));
    }

    // Marches up with one Newton step a row; the error left over does not pile up because each row aims at its own value.
    private void Fill(CaloricCurve curve, Func<Reduced, double> valueOf, Func<Reduced, double, double> slopeOf)
    {
        T[0] = curve.Tlow;
        Reduced at = curve.Lowest;
        for (int i = 1; i <= Steps; i++)
        {
            double wanted = first + (i / perStep);
            double guess = T[i - 1] + ((wanted - valueOf(at)) / slopeOf(at, T[i - 1]));
            guess = Math.Clamp(guess, curve.Tlow, curve.Thigh);
            at = curve.At(guess);
            T[i] = Math.Clamp(guess + ((wanted - valueOf(at)) / slopeOf(at, guess)), curve.Tlow, curve.Thigh);
            at = curve.At(T[i]);
        }

    }
}
