using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class QuantityCatalogueTests
{
    [Fact]
    public void Every_slot_has_exactly_one_row_at_its_own_index()
    {
        Assert.All(Enum.GetValues<StationSymbol>(), s => Assert.Equal(s, QuantityCatalogue.Of(s).StationSlot));
        Assert.All(Enum.GetValues<CaseOption>(), o => Assert.Equal(o, QuantityCatalogue.Of(o).OptionSlot));
        Assert.Equal(Enum.GetValues<StationSymbol>().Length, QuantityCatalogue.Rows.Count(r => r.StationSlot is not null));
        Assert.Equal(Enum.GetValues<CaseOption>().Length, QuantityCatalogue.Rows.Count(r => r.OptionSlot is not null));
    }

    [Fact]
    public void No_two_json_keys_differ_only_in_case() =>
        Assert.All(
            QuantityCatalogue.Rows.Select(r => r.JsonKey).Distinct().GroupBy(k => k, StringComparer.OrdinalIgnoreCase),
            g => Assert.Single(g));

    [Fact]
    public void Keys_and_words_are_unique_in_their_table()
    {
        foreach (IReadOnlyList<QuantityRow> table in (IReadOnlyList<QuantityRow>[])[QuantityCatalogue.StationQuantities, QuantityCatalogue.Options, QuantityCatalogue.Performance])
        {
            string[] names = [.. table.SelectMany(r => new[] { r.Key, r.Word }.Where(n => n.Length > 0).Distinct())];
            Assert.Equal(names.Length, names.Distinct().Count());
            Assert.Equal(table.Count, table.Select(r => r.JsonKey).Distinct().Count());
            Assert.Equal(table.Count, table.Select(r => r.Symbol).Distinct().Count());
        }
    }

    [Fact]
    public void Every_row_can_be_explained_and_shown()
    {
        foreach (QuantityRow row in QuantityCatalogue.Rows)
        {
            string all = row.Key + row.Symbol + row.Word + row.Name + row.Help + row.Example;
            Assert.True(row.Help.EndsWith('.') && row.Name.Length > 0 && row.Symbol.Length > 0 && row.JsonKey.Length > 0, row.Key);
            Assert.True(all.All(char.IsAscii), row.Key);
            Assert.True(row.Limits.Least < row.Limits.Greatest, row.Key);
            foreach (UnitSystem system in Enum.GetValues<UnitSystem>())
                Assert.True(UnitTable.TryFind(row.DisplayUnit(system), row.Dimension, out _), row.Key);
        }
    }

    [Fact]
    public void Every_option_reads_its_own_example_and_names_its_answers()
    {
        foreach (QuantityRow row in QuantityCatalogue.Options)
        {
            GivenValue given = ValueParser.Parse("--" + row.Word, row, row.Example, 101325);
            Assert.True(row.Limits.Contains(given.Si));
            Assert.All(row.AnsweredAs, key => Assert.True(QuantityCatalogue.TryFindPerformance(key, out _), key));
            Assert.True(QuantityCatalogue.TryFindOption(row.Word, out QuantityRow? byWord) && QuantityCatalogue.TryFindOption(row.Key, out QuantityRow? byKey) && byWord == byKey);
        }
    }

    [Fact]
    public void Every_example_lies_inside_and_every_limit_is_felt()
    {
        foreach (QuantityRow row in QuantityCatalogue.Rows.Where(r => double.IsFinite(r.Limits.Least)))
        {
            Assert.Equal(row.Limits.IncludesLeast, row.Limits.Contains(row.Limits.Least));
            Assert.False(row.Limits.Contains(row.Limits.Least - 1e-9 - (1e-9 * Math.Abs(row.Limits.Least))));
            Assert.False(row.Limits.Contains(double.NaN));
            Assert.False(row.Limits.Contains(double.PositiveInfinity));
        }
    }

    // The names of the "performance" object of the JSON answer that are numbers or words; a change there is a change of the format.
    [Theory]
    [InlineData("regime choked mass_flow volume_flow isentropic_efficiency velocity_coefficient discharge_coefficient")]
    [InlineData("critical_pressure_ratio area_ratio throat_area_ratio entropy_rise exit_velocity_ideal pressure_change stagnation_pressure_ratio")]
    [InlineData("recovery recovery_dynamic ideal_recovery effectiveness loss_coefficient polytropic_efficiency reynolds_throat")]
    [InlineData("thrust axial_force heat_rate lost_work")]
    [InlineData("back_pressure_limits.subsonic back_pressure_limits.shock_at_exit back_pressure_limits.full_expansion")]
    [InlineData("shock.p_upstream shock.p_downstream shock.M_upstream shock.M_downstream shock.area_ratio")]
    public void Every_name_of_the_performance_object_is_in_the_catalogue(string keys)
    {
        ArgumentNullException.ThrowIfNull(keys);
        Assert.All(keys.Split(' '), key => Assert.True(QuantityCatalogue.TryFindPerformance(key, out _), key));
    }

    [Theory]
    [InlineData("w", "StationAnswer")]
    [InlineData("speed-of-sound", "StationAnswer")]
    [InlineData("phase", "StationAnswer")]
    [InlineData("cp", "StationAnswer")]
    [InlineData("cv", "StationAnswer")]
    [InlineData("v", "StationInput")]
    [InlineData("rho", "Both")]
    [InlineData("p/p0", "StationInput")]
    public void A_station_quantity_is_found_by_symbol_or_word(string name, string kind)
    {
        Assert.True(QuantityCatalogue.TryFindStationQuantity(name, out QuantityRow? row));
        Assert.Equal(kind, row.Kind.ToString());
        Assert.Equal(kind == "StationAnswer", row.StationSlot is null);
    }

    [Theory]
    [InlineData("")]
    [InlineData("t")]
    [InlineData("Pressure")]
    [InlineData("inlet.p")]
    public void An_unknown_name_is_not_found(string name) =>
        Assert.False(QuantityCatalogue.TryFindStationQuantity(name, out _));
}
