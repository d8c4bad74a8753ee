namespace FlowDuct.Benchmarks;

/// <summary>Order statistics; the mean of timings on a shared machine says little.</summary>
internal static class Sample
{
    internal static double Median(IEnumerable<double> values) => Quantile(values, 0.5);

    internal static double Quantile(IEnumerable<double> values, double share)
    {
        double[] sorted = [.. values.Order()];
        return sorted[(int)Math.Round(share * (sorted.Length - 1))];
    }
}
