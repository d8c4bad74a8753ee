using System.Text;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Csv;
using Xunit;

namespace FlowDuct.Sheets.Tests.Csv;

/// <summary>The quick ways with numbers against the slow ways of the core: the same bytes, the same bits.</summary>
public class DecimalTests
{
    private const int Samples = 200_000;

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(7)]
    [InlineData(9)]
    [InlineData(12)]
    public void A_number_is_written_as_the_core_writes_it(int digits)
    {
        byte[] room = new byte[DecimalText.MostBytes];
        foreach (double value in Values())
        {
            int count = DecimalText.Write(value, digits, (byte)'.', room);
            Assert.Equal(NumberFormatter.Shortest(value, digits), Encoding.ASCII.GetString(room, 0, count));
        }
    }

    [Fact]
    public void A_decimal_comma_takes_the_place_of_the_point()
    {
        byte[] room = new byte[DecimalText.MostBytes];
        int count = DecimalText.Write(-12.5, 7, (byte)',', room);
        Assert.Equal("-12,5", Encoding.ASCII.GetString(room, 0, count));
    }

    [Fact]
    public void A_plain_decimal_is_read_to_the_same_bits_as_by_the_core()
    {
        int quick = 0;
        foreach (double value in Values())
        {
            foreach (string text in new[] { NumberFormatter.Shortest(value, 6), NumberFormatter.Significant(value, 9), NumberFormatter.Shortest(value, 16) })
            {
                if (!DecimalCell.TryRead(Encoding.ASCII.GetBytes(text), (byte)'.', out double read, out double half)) continue;
                quick++;
                Assert.True(NumberParser.TryParse(text, out PrintedNumber number, out _));
                Assert.Equal(BitConverter.DoubleToInt64Bits(number.Value), BitConverter.DoubleToInt64Bits(read));
                Assert.Equal(number.HalfPlace, half);
            }
        }

        Assert.InRange(quick, Samples / 2, 3 * Samples);
    }

    [Theory]
    [InlineData("")]
    [InlineData("-")]
    [InlineData(".5")]
    [InlineData("5.")]
    [InlineData("1e3")]
    [InlineData("1,5")]
    [InlineData("+1")]
    [InlineData("NaN")]
    [InlineData("5 bar")]
    [InlineData("1.2.3")]
    [InlineData("9007199254740993")]
    [InlineData("99999999999999999999")]
    public void Anything_else_is_left_to_the_core(string text) =>
        Assert.False(DecimalCell.TryRead(Encoding.ASCII.GetBytes(text), (byte)'.', out _, out _));

    // Sizes from 1e-9 to 1e12, values beside powers of ten and ties of the seventh digit among them.
    private static IEnumerable<double> Values()
    {
        double[] special = [0, 1, -1, 9999999.5, 9999999.4999, 0.99999995, 0.00009999999, 0.0001, 1e7, 123456.75, 1234567.5, 2.5, 0.1, 100000.05, 1e22, 5e-324, 999999950000];
        foreach (double value in special) yield return value;
        for (int i = 1; i <= Samples; i++)
        {
            double mantissa = i * 0.6180339887498949 % 1, power = Math.Floor((i * 0.7548776662466927 % 1 * 21) - 9);
            yield return (i % 2 == 0 ? 1 : -1) * mantissa * Math.Pow(10, power);
        }
    }
}
