namespace FlowDuct.Quantities;

/// <summary>Evenly spaced values from one end to the other; both ends are met to the last bit.</summary>
/// <param name="First">First value, SI.</param>
/// <param name="Last">Last value, SI.</param>
/// <param name="Count">Number of values, 2 or more.</param>
internal readonly record struct ValueRange(double First, double Last, int Count)
{
    /// <summary>The value at an index, from 0; counted from the nearer end, so that steps do not add up their rounding.</summary>
    public double this[int index]
    {
        get
        {
            int steps = Count - 1;
            double step = (Last - First) / steps;
            return index * 2 <= steps ? First + (index * step) : Last - ((steps - index) * step);
        }
    }
}
