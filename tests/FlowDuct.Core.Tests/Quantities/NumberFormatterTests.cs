using System.Globalization;
using CsCheck;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class NumberFormatterTests
{
    [Theory]
    [InlineData(230, 5, "230.00")]
    [InlineData(0, 4, "0.000")]
    [InlineData(0, 1, "0")]
    [InlineData(9.9996, 4, "10.00")]
    [InlineData(0.0001, 3, "0.000100")]
    [InlineData(0.00009999, 3, "0.000100")]
    [InlineData(0.000099, 3, "9.90e-5")]
    [InlineData(9999999, 7, "9999999")]
    [InlineData(9999999, 3, "1.00e7")]
    [InlineData(1234567, 3, "1230000")]
    [InlineData(1e7, 3, "1.00e7")]
    [InlineData(-12.345, 3, "-12.3")]
    [InlineData(-0.5, 3, "-0.500")]
    [InlineData(1e100, 1, "1e100")]
    [InlineData(2.5, 1, "2")] // an exact tie goes to the even digit
    [InlineData(3.5, 1, "4")]
    public void Significant_digits_are_kept(double value, int digits, string expected) =>
        Assert.Equal(expected, NumberFormatter.Significant(value, digits));

    [Theory]
    [InlineData(230, 5, "230")]
    [InlineData(1.01325, 6, "1.01325")]
    [InlineData(0, 6, "0")]
    [InlineData(1.2e-7, 6, "1.2e-7")]
    [InlineData(100, 1, "100")]
    public void The_short_form_drops_trailing_zeros(double value, int digits, string expected) =>
        Assert.Equal(expected, NumberFormatter.Shortest(value, digits));

    [Theory]
    [InlineData(double.NaN, 3)]
    [InlineData(double.PositiveInfinity, 3)]
    [InlineData(1.0, 0)]
    [InlineData(1.0, 18)]
    public void What_cannot_be_printed_is_refused(double value, int digits) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => NumberFormatter.Significant(value, digits));

    [Fact]
    public void Zero_has_no_sign()
    {
        Assert.Equal("0.000", NumberFormatter.Significant(-0.0, 4));
        Assert.Equal("0", NumberFormatter.Shortest(-0.0, 4));
    }

    [Fact]
    public void Printed_numbers_lie_within_half_a_place() =>
        Gen.Select(Gen.Double[-1e12, 1e12], Gen.Int[1, 15]).Sample((value, digits) =>
        {
            string text = NumberFormatter.Significant(value, digits);
            double error = Math.Abs(double.Parse(text, CultureInfo.InvariantCulture) - value);
            Assert.True(error <= Math.Abs(value) * 0.5 * double.Parse($"1E{1 - digits}", CultureInfo.InvariantCulture) * (1 + 1e-9), text);
        });

    [Fact]
    public void Seventeen_digits_restore_every_double() =>
        Gen.Double.Where(double.IsFinite).Sample(value =>
            double.Parse(NumberFormatter.Significant(value, 17), CultureInfo.InvariantCulture) == value);
}
