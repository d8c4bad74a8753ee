using System.Globalization;
using CsCheck;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class NumberParserTests
{
    [Theory]
    [InlineData("1.50", 1.5, 0.005)]
    [InlineData("1500", 1500, 0.5)]
    [InlineData("1.5e3", 1500, 50)]
    [InlineData("+2E-3", 0.002, 0.0005)]
    [InlineData("-0.25", -0.25, 0.005)]
    [InlineData("0", 0, 0.5)]
    [InlineData("0e99999", 0, double.NaN)]
    [InlineData("1.25e-12", 1.25e-12, 5e-15)]
    [InlineData("007", 7, 0.5)]
    [InlineData("1e00000000003", 1000, 500)]
    [InlineData("3.14159265358979", 3.14159265358979, 5e-15)]
    public void A_number_carries_half_of_its_last_place(string text, double value, double halfPlace)
    {
        bool isNumber = NumberParser.TryParse(text, out PrintedNumber number, out string problem);
        Assert.Equal(double.IsFinite(halfPlace), isNumber);
        Assert.Equal(isNumber, problem.Length == 0);
        if (isNumber)
            Assert.Equal(new PrintedNumber(value, halfPlace), number);
    }

    [Theory]
    [InlineData("", "there is no number")]
    [InlineData("NaN", "NaN is not a finite number")]
    [InlineData("-nan", "-nan is not a finite number")]
    [InlineData("Infinity", "Infinity is not a finite number")]
    [InlineData("-inf", "-inf is not a finite number")]
    [InlineData("1e400", "1e400 is too large; the greatest number is 1.79e308")]
    [InlineData("-1e99999999999", "-1e99999999999 is too large; the greatest number is 1.79e308")]
    [InlineData("1e-400", "1e-400 is too small; the least positive number is 4.9e-324")]
    [InlineData("1,5", "1,5 has a decimal comma; write 1.5")]
    [InlineData("1'000", "1'000 has a thousands separator; write the digits without a gap")]
    [InlineData("1 000", "1 000 has a thousands separator; write the digits without a gap")]
    [InlineData("0x1F", "0x1F is hexadecimal; write a decimal number")]
    [InlineData("5.", "5. has no digit after its point; write 5 or 5.0")]
    [InlineData(".5", ".5 has no digit before its point; write for example 0.5")]
    [InlineData("1.2.3", "1.2.3 has two points")]
    [InlineData("4..12", "4..12 has no digit after its point; write 4 or 4.0")]
    [InlineData("\u22125", "\\u22125 has a typographic minus sign; write a hyphen, -")]
    [InlineData("2.5:1", "2.5:1 is a ratio of two numbers; write it as one number")]
    [InlineData("--5", "--5 is not a number; write for example 1.5 or 2e5")]
    [InlineData("5e", "5e is not a number; write for example 1.5 or 2e5")]
    [InlineData("\u0665", "\\u0665 is not a number; write for example 1.5 or 2e5")]
    [InlineData("1_000", "1_000 has a thousands separator; write the digits without a gap")]
    [InlineData("(5)", "(5) is not a number; write for example 1.5 or 2e5")]
    [InlineData("5 ", "5  has a thousands separator; write the digits without a gap")]
    public void What_is_no_number_is_refused_with_its_reason(string text, string expected)
    {
        Assert.False(NumberParser.TryParse(text, out PrintedNumber number, out string problem));
        Assert.Equal(expected, problem);
        Assert.Equal(default, number);
    }

    [Theory]
    [InlineData("4..12", 1)]
    [InlineData("9bar", 1)]
    [InlineData("1.5e3m", 5)]
    [InlineData("2e", 1)]
    [InlineData("2e+", 1)]
    [InlineData("-3.25 bar", 5)]
    [InlineData("bar", 0)]
    [InlineData("-", 0)]
    [InlineData("+.5", 0)]
    public void The_longest_number_at_the_start_is_measured(string text, int length) =>
        Assert.Equal(length, NumberParser.Measure(text, out _));

    [Fact]
    public void Every_double_printed_in_full_is_read_back() =>
        Gen.Double.Where(double.IsFinite).Sample(value =>
        {
            string text = value.ToString("E16", CultureInfo.InvariantCulture);
            return NumberParser.TryParse(text, out PrintedNumber number, out _) ? number.Value == value : value == 0 || !double.IsNormal(value) || Math.Abs(value) > 1e300;
        });

    [Fact]
    public void Half_a_place_is_half_of_one_step_of_the_last_digit() =>
        Gen.Select(Gen.Int[0, 999_999], Gen.Int[0, 12]).Sample((digits, decimals) =>
        {
            decimal step = new(1, 0, 0, false, (byte)decimals);
            string text = (digits * step).ToString(CultureInfo.InvariantCulture);
            Assert.True(NumberParser.TryParse(text, out PrintedNumber number, out _));
            Assert.Equal((double)(step / 2), number.HalfPlace);
            Assert.Equal((double)(digits * step), number.Value);
        });

    [Fact]
    public void The_locale_of_the_machine_changes_nothing()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo german = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        german.NumberFormat.NumberDecimalSeparator = ",";
        german.NumberFormat.NumberGroupSeparator = ".";
        german.NumberFormat.NegativeSign = "~";
        try
        {
            CultureInfo.CurrentCulture = german;
            Assert.True(NumberParser.TryParse("-1.5e-12", out PrintedNumber number, out _));
            Assert.Equal(new PrintedNumber(-1.5e-12, 5e-14), number);
            Assert.False(NumberParser.TryParse("1,5", out _, out _));
            Assert.Equal("-1.50", NumberFormatter.Significant(-1.5, 3));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
