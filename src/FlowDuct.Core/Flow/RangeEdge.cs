namespace FlowDuct.Flow;

/// <summary>The edge of a range on a path, where one pressure has a state and another has none.</summary>
internal static class RangeEdge
{
    // Below the closure of the property calls.
    private const double Closure = 1e-13;
    private const int MostSteps = 60;

    /// <summary>The last pressure, Pa, on the way from inside to outside that still has a state, by bisection.</summary>
    internal static double Find(Func<double, bool> hasState, double inside, double outside)
    {
        for (int i = 0; i < MostSteps && Math.Abs(inside - outside) > Closure * inside; i++)
        {
            double middle = (inside + outside) / 2;
            if (hasState(middle)) inside = middle;
            else outside = middle;
        }

        return inside;
    }
}
