using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class ValueRangeTests
{
    // In binary 0.1 + 6 x 0.1 is not 0.7, nor 0.1 + 6 (0.7 - 0.1)/6: the ends are the numbers that were typed.
    [Theory]
    [InlineData(0.1, 0.7, 7)]
    [InlineData(0.1, 0.9, 10)]
    [InlineData(1e5, 4.013250e5, 11)]
    [InlineData(273.15, 373.15, 41)]
    [InlineData(0.7, 0.1, 7)]
    public void Both_ends_are_met_to_the_last_bit_and_steps_are_even(double first, double last, int count)
    {
        ValueRange range = new(first, last, count);
        Assert.Equal(first, range[0]);
        Assert.Equal(last, range[count - 1]);
        for (int i = 1; i < count; i++) Assert.Equal((last - first) / (count - 1), range[i] - range[i - 1], 1e-15 * (Math.Abs(first) + Math.Abs(last)));
    }

    [Fact]
    public void Counting_on_from_one_end_would_miss_the_other() => Assert.Contains(
        Enumerable.Range(2, 200), count => 0.1 + ((count - 1) * ((0.7 - 0.1) / (count - 1))) != 0.7);
}
