using CsCheck;
using FlowDuct.Errors;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

/// <summary>Whatever is typed ends in a finite value inside its range or in a refusal that a terminal can show.</summary>
public sealed class HostileInputTests
{
    private static readonly string[] Fragments =
    [
        "p", "p0", "T", "V", "x", "rho", "p/p0", "altitude", "w", "=", "=", "=", ",", ",", " ", "-", "+", ".", "..", ":", "%", "e", "1e400", "NaN",
        "0x", "5", "12.5", "1,5", "bar", "barg", "mpa", "degC", "K", "m/s", "inH2O", "(g)", "(vac)", "(a)", "kJ/(kg.K)", "\u00b0C", "\u2212", "\t", "\u0000", "scfm",
    ];

    [Fact]
    public void Any_station_list_is_read_or_refused() =>
        Gen.Int[0, Fragments.Length - 1].Select(i => Fragments[i]).Array[0, 12].Select(Gen.Enum<StationLists>()).Sample(
            (pieces, list) => Judge(() => StationListParser.Parse("--list", list == StationLists.None ? StationLists.At : list, string.Concat(pieces), 101325)),
            iter: 20_000);

    [Fact]
    public void Any_characters_are_read_or_refused() =>
        Gen.String.Select(Gen.Int[0, QuantityCatalogue.StationQuantities.Count - 1]).Sample((text, i) =>
        {
            QuantityRow row = QuantityCatalogue.StationQuantities[i];
            Judge(() => row.StationSlot is null ? [] : [new StationItem(row, ValueParser.Parse("--at", row, text, 101325))]);
        });

    private static void Judge(Func<IReadOnlyList<StationItem>> parse)
    {
        try
        {
            Assert.All(parse(), item => Assert.True(item.Row.Limits.Contains(item.Value.Si) && item.Value.HalfWidth >= 0));
        }
        catch (FlowDuctException refused)
        {
            Assert.Equal(RefusalKind.NotUnderstood, refused.Refusal.Kind);
            Assert.True((refused.Refusal.Reason + refused.Refusal.NextStep).All(c => c is >= ' ' and <= '~'), refused.Refusal.ToString());
            Assert.NotEmpty(refused.Refusal.Reason);
        }
    }
}
