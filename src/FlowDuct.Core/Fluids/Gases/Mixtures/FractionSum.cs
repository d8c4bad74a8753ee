namespace FlowDuct.Fluids.Gases;

/// <summary>The sum of printed fractions, and how far from 1 their printed digits let it lie.</summary>
internal readonly record struct FractionSum
{
    // Exact fractions such as 0.1 and 0.7 add up to 1 within the rounding of binary numbers only.
    private const double Rounding = 1e-12;

    internal FractionSum(IEnumerable<GasFraction> given)
    {
        foreach (GasFraction gas in given)
        {
            Value += gas.Fraction;
            Slack += gas.HalfPlace;
        }
    }

    /// <summary>The sum of the fractions.</summary>
    internal double Value { get; }

    /// <summary>Half a unit of the last printed digit of each fraction, added.</summary>
    internal double Slack { get; }

    /// <summary>True where the sum is 1 within the printed digits.</summary>
    internal bool Holds => Math.Abs(Value - 1) <= Slack + Rounding;

    /// <summary>True where the sum differs from 1 by more than rounding of binary numbers.</summary>
    internal bool IsOff => Math.Abs(Value - 1) > Rounding;
}
