using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>The standard atmosphere against its printed base pressures and a second evaluation.</summary>
public class StandardAtmosphereTests
{
    [Fact]
    public void Pressure_and_temperature_are_those_of_the_table()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceTable.Read("gas/standard_atmosphere_check.csv");
        Assert.Equal(22, rows.Count);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            Assert.True(StandardAtmosphere.TryAtGeopotential(Number(row["geopotential_altitude_m"]), out double p, out double T));
            Agrees(row["p_Pa"], p);
            Agrees(row["T_K"], T);
        }
    }

    [Fact]
    public void Base_pressures_are_the_printed_ones()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceTable.Read("gas/standard_atmosphere_layers.csv");
        Assert.Equal(8, rows.Count);
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            Assert.True(StandardAtmosphere.TryAtGeopotential(Number(row["base_geopotential_altitude_m"]), out double p, out double T));

            // The standard cuts its digits off: 54.7489 mbar is printed 54.748, 8.68019 mbar 8.6801.
            Printed printed = Printed.Parse(row["base_pressure_published_mbar"]);
            Assert.InRange(p / 100, printed.Value * (1 - 1e-12), printed.Value + (2 * printed.HalfDigit));
            Agrees(row["base_temperature_K"], T);
        }
    }

    [Fact]
    public void Layers_join_without_a_jump() => Assert.All(new[] { 11_000.0, 20_000, 32_000, 47_000, 51_000, 71_000 }, H =>
    {
        StandardAtmosphere.TryAtGeopotential(H, out double below, out double coldBelow);
        StandardAtmosphere.TryAtGeopotential(Math.BitIncrement(H), out double above, out double coldAbove);
        Assert.Equal(below, above, 1e-12 * below);
        Assert.Equal(coldBelow, coldAbove, 1e-9);
    });

    [Fact]
    public void Pressure_falls_by_the_weight_of_the_air()
    {
        // dp/dH = -g0 p M/(R T) with the constants of the standard, against a central difference over 2 m.
        for (double H = -4900; H < 84_000; H += 371)
        {
            if (Math.Abs(H % 1000) < 2) continue; // a joint has two slopes of temperature
            StandardAtmosphere.TryAtGeopotential(H - 1, out double lower, out _);
            StandardAtmosphere.TryAtGeopotential(H + 1, out double upper, out _);
            StandardAtmosphere.TryAtGeopotential(H, out double p, out double T);
            double slope = -9.80665 * p * 0.0289644 / (8.31432 * T);
            Assert.Equal(slope, (upper - lower) / 2, 1e-7 * Math.Abs(slope));
        }
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(11_019.07, 11_000)] // geometric altitudes of the layers, from memory of the standard's Table I
    [InlineData(20_063.12, 20_000)]
    [InlineData(32_161.90, 32_000)]
    [InlineData(86_000, 84_852.05)]
    public void Geometric_altitude_is_more_than_geopotential(double z, double H) =>
        Assert.Equal(H, StandardAtmosphere.Geopotential(z), 0.01);

    [Theory]
    [InlineData(-5000, true)]
    [InlineData(86_000, true)]
    [InlineData(-5000.01, false)]
    [InlineData(86_000.01, false)]
    [InlineData(double.NaN, false)]
    [InlineData(double.PositiveInfinity, false)]
    public void It_ends_where_the_standard_ends(double z, bool inside) => Assert.Equal(inside, StandardAtmosphere.TryAtAltitude(z, out _, out _));

    private static void Agrees(string printed, double computed) => Assert.True(
        Printed.Parse(printed).Agrees(computed), string.Create(CultureInfo.InvariantCulture, $"{computed:R}, the table has {printed}"));

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
