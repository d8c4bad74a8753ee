using FlowDuct.Errors;
using FlowDuct.Sheets.Sweep;
using Xunit;

namespace FlowDuct.Sheets.Tests.Sweep;

public class VariationTests
{
    [Theory]
    [InlineData("inlet.p=4..6 bar by 0.5 bar", "bar", "4|4.5|5|5.5|6")]
    [InlineData("inlet.p=4..6 bar by 50 kPa", "bar", "4|4.5|5|5.5|6")]
    [InlineData("inlet.p = 4 .. 5 barg by 0.5 bar", "barg", "4|4.5|5")]
    [InlineData("inlet.p=0..1 bar by 0.1", "bar", "0|0.1|0.2|0.3|0.4|0.5|0.6|0.7|0.8|0.9|1")]
    [InlineData("inlet.p=6..4 bar by 1 bar", "bar", "6|5|4")]
    [InlineData("inlet.p=4..6 bar by 1.5 bar", "bar", "4|5.5")]
    [InlineData("inlet.T=200..220 degC by 10 K", "degC", "200|210|220")]
    [InlineData("inlet.T=32..50 degF by 5 K", "degF", "32|41|50")]
    [InlineData("inlet.T=200..300 degC in 5 points", "degC", "200|225|250|275|300")]
    [InlineData("inlet.p=1..2 bar in 4 points", "bar", "1|1.33333333333333|1.66666666666667|2")]
    [InlineData("exit.p=1..100 bar in 3 points log", "bar", "1|10|100")]
    [InlineData("exit.p=1..100 bar log in 3 points", "bar", "1|10|100")]
    [InlineData("exit.p=1,2,3 bar", "bar", "1|2|3")]
    [InlineData("exit.p=1,2 bar,30 psi", "", "1 bar|2 bar|30 psi")]
    [InlineData("efficiency=90..100 % by 5 %", "%", "90|95|100")]
    [InlineData("efficiency=0.9,0.95", "", "0.9|0.95")]
    [InlineData("fluid=air,steam", "", "air|steam")]
    [InlineData("inlet.p=1.50..2.0 bar in 2 points", "bar", "1.50|2.0")]
    public void A_variation_lists_its_values(string text, string unit, string values)
    {
        Variation variation = VariationParser.Parse(text);
        Assert.Equal(unit, variation.Unit);
        Assert.Equal(values, string.Join('|', variation.Values));
    }

    [Theory]
    [InlineData("inlet.p", "is not name=values")]
    [InlineData("inlet.p=", "has no values")]
    [InlineData("outlet.p=1,2 bar", "names no station")]
    [InlineData("inlet.dp=1,2 bar", "is no figure that can be given there")]
    [InlineData("inlet.p=1..2 bar", "does not say its points")]
    [InlineData("inlet.p=1..2 bar in 1 points", "does not say its points")]
    [InlineData("inlet.p=1..2 bar in 2.5 points", "does not say its points")]
    [InlineData("inlet.p=1..2 by 0.5", "has no unit")]
    [InlineData("inlet.p=1,2", "has no unit")]
    [InlineData("inlet.p=1 bar..2 psi by 1 psi", "the units bar and psi")]
    [InlineData("inlet.p=1..2 bar by 0 bar", "is not above 0")]
    [InlineData("inlet.p=1..2 bar by 1 K", "K is not a unit here")]
    [InlineData("inlet.p=1..2 mpa by 1 mpa", "did you mean MPa")]
    [InlineData("inlet.p=1..2 barg in 3 points log", "a scale that begins at zero")]
    [InlineData("inlet.p=0..2 bar in 3 points log", "ends above 0")]
    [InlineData("inlet.p=1..1e9 bar by 1 bar", "more than 1000000 points")]
    [InlineData("inlet.p=NaN..2 bar by 1 bar", "begins with no number")]
    [InlineData("fluid=air..steam", "words have no range")]
    public void A_slip_is_told_with_its_place(string text, string words)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => VariationParser.Parse(text));
        Assert.Equal("--vary", refused.Refusal.Place);
        Assert.Contains(words, refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_last_variation_of_a_grid_runs_fastest()
    {
        var grid = new SweepGrid([VariationParser.Parse("inlet.p=1,2 bar"), VariationParser.Parse("exit.p=3,4,5 bar")]);
        int[] at = new int[2];
        List<string> seen = [];
        for (long point = 0; point < grid.Count; point++)
        {
            grid.At(point, at);
            seen.Add($"{at[0]}{at[1]}");
        }

        Assert.Equal(["00", "01", "02", "10", "11", "12"], seen);
    }

    [Fact]
    public void One_input_is_varied_once()
    {
        Variation one = VariationParser.Parse("inlet.p=1,2 bar");
        Assert.Throws<FlowDuctException>(() => new SweepGrid([one, one]));
    }

    // A thousand steps of a tenth: a sum would miss the end by rounding.
    [Fact]
    public void Points_are_counted_and_never_summed()
    {
        Variation variation = VariationParser.Parse("inlet.p=0.1..100 bar by 0.1 bar");
        Assert.Equal(1000, variation.Values.Count);
        for (int i = 0; i < 1000; i++) Assert.Equal((i + 1) / 10m, decimal.Parse(variation.Values[i], System.Globalization.CultureInfo.InvariantCulture));
    }
}
