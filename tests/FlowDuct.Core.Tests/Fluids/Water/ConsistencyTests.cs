using FlowDuct.Core.Tests.Support;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>
/// Every difference between equations that IAPWS R7-97(2012), SR2-01(2014), SR3-03(2014), SR4-04(2014) and SR5-05(2016) state, met on fixed
/// points all over the range and held against the tolerated value; where the release tolerates none, against its stated maximum.
/// </summary>
public class ConsistencyTests
{
    // Points that miss the worst place still come this near to the stated maximum; a comparison of something with itself would not.
    // The least is h2ab(s), 9.1 kPa along the isentropes of the isobar against "within 22 kPa". Chosen here.
    private const double Reach = 0.4;

    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("water/if97_consistency.csv");

    public static TheoryData<string, string> Rows()
    {
        var rows = new TheoryData<string, string>();
        foreach (IReadOnlyDictionary<string, string> row in s_rows) rows.Add(row["subject"], row["quantity"]);
        return rows;
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void The_difference_is_tolerated_and_met(string subject, string quantity)
    {
        IReadOnlyDictionary<string, string> row = s_rows.Single(row => row["subject"] == subject && row["quantity"] == quantity);
        double[] met = [.. Differences.Of(subject, quantity)];
        Assert.True(met.Length >= (IsOnePoint(subject) ? 1 : 1000), $"{met.Length} points only");
        Assert.All(met, difference => Assert.True(double.IsFinite(difference)));
        Printed stated = Printed.Parse(row["max_stated"]);
        double limit = row["tolerated"].Length > 0 ? Printed.Parse(row["tolerated"]).Value : stated.Value + stated.HalfDigit;
        Assert.InRange(met.Max(Math.Abs), Reach * stated.Value, limit);
    }

    [Fact]
    public void No_row_is_left_out() => Assert.Equal(107, s_rows.Count);

    private static bool IsOnePoint(string subject) => subject == "Eqs. (7),(15) against (28) at 623.15 K";
}
