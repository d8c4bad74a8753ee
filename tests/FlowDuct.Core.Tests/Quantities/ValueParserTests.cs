using FlowDuct.Errors;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class ValueParserTests
{
    private const double Ambient = 101325;

    [Theory]
    [InlineData("p", "9 bar", 9e5, 0.5e5, "bar")]
    [InlineData("p", "9.00bar", 9e5, 500, "bar")]
    [InlineData("p", "7 barg", 801325, 0.5e5, "barg")]
    [InlineData("p", "-0.5 barg", 51325, 5e3, "barg")]
    [InlineData("p", "200 mbar(vac)", 81325, 50, "mbar(vac)")]
    [InlineData("p", "1 atm", 101325, 50662.5, "atm")]
    [InlineData("T", "230degC", 503.15, 0.5, "degC")]
    [InlineData("T", "  230.0   degC ", 503.15, 0.05, "degC")]
    [InlineData("superheat", "20 degC", 20, 0.5, "degC")]
    [InlineData("superheat", "18 degF", 10, 0.5 / 1.8, "degF")]
    [InlineData("x", "97%", 0.97, 0.005, "%")]
    [InlineData("x", "97 %", 0.97, 0.005, "%")]
    [InlineData("x", "0.97", 0.97, 0.005, "1")]
    [InlineData("V", "25 m/s", 25, 0.5, "m/s")]
    [InlineData("V", "0 m/s", 0, 0.5, "m/s")]
    [InlineData("dp", "4 inH2O", 996.35564, 124.544455, "inH2O")]
    [InlineData("dp", "-0.1 bar", -1e4, 5e3, "bar")]
    [InlineData("n", "6", 6, 0.5, "1")]
    [InlineData("h", "-1.5e2 kJ/kg", -1.5e5, 5e3, "kJ/kg")]
    public void A_value_is_read_with_its_rounding(string symbol, string text, double si, double halfWidth, string unit)
    {
        GivenValue given = ValueParser.Parse("--at", Row(symbol), text, Ambient);
        Assert.Equal(si, given.Si, 1e-12 * Math.Abs(si));
        Assert.Equal(halfWidth, given.HalfWidth, 1e-14 * halfWidth);
        Assert.Equal((text.Trim(), unit), (given.Text, given.Unit.Spelling));
    }

    [Fact]
    public void Gauge_and_assumed_absolute_readings_are_marked()
    {
        Assert.Equal((false, true), Marks("9 bar"));
        Assert.Equal((false, false), Marks("9 bar(a)"));
        Assert.Equal((false, false), Marks("9 bara"));
        Assert.Equal((true, false), Marks("9 barg"));
        Assert.Equal((true, false), Marks("0.2 bar(vac)"));

        static (bool, bool) Marks(string text)
        {
            GivenValue given = ValueParser.Parse("--back", Row("p"), text, Ambient);
            return (given.WasGauge, given.BasisWasAssumed);
        }
    }

    [Theory]
    [InlineData("T", "200", "200 has no unit; write for example 200 degC")]
    [InlineData("V", "30", "30 has no unit; write for example 30 m/s")]
    [InlineData("p", "1,5 bar", "1,5 has a decimal comma; write 1.5")]
    [InlineData("p", "1'000 bar", "1'000 has a thousands separator; write the digits without a gap")]
    [InlineData("p", "1 000 bar", "1 000 has a thousands separator; write the digits without a gap")]
    [InlineData("p", "NaN bar", "NaN is not a finite number")]
    [InlineData("x", "NaN", "NaN is not a finite number")]
    [InlineData("p", "1e400 bar", "1e400 is too large; the greatest number is 1.79e308")]
    [InlineData("p", "1e308 MPa", "pressure 1e308 MPa is too large")]
    [InlineData("p", "0x10 bar", "0x10 is hexadecimal; write a decimal number")]
    [InlineData("p", "5. bar", "5. has no digit after its point; write 5 or 5.0")]
    [InlineData("p", "5 mpa", "5 mpa: mpa is not a unit here; did you mean MPa?")]
    [InlineData("p", "5 Bar", "5 Bar: Bar is not a unit here; did you mean bar?")]
    [InlineData("p", "5 inH2O", "5 inH2O: inH2O on a pressure needs its basis; write inH2O(a) for absolute, inH2O(g) for gauge or inH2O(vac) for vacuum")]
    [InlineData("dp", "5 barg", "5 barg: barg says a basis, but a pressure difference has none; write bar")]
    [InlineData("dp", "5 mbar(g)", "5 mbar(g): mbar(g) says a basis, but a pressure difference has none; write mbar")]
    [InlineData("p", "5 barg(g)", "5 barg(g): barg(g) says its basis twice; write barg")]
    [InlineData("T", "200 C", "200 C: C is not a unit here; did you mean degC?")]
    [InlineData("T", "200 \u00b0C", "200 \\u00b0C: \\u00b0C is not a unit here; did you mean degC?")]
    [InlineData("s", "6.8 kJ/kgK", "6.8 kJ/kgK: kJ/kgK is not a unit here; did you mean kJ/(kg.K)?")]
    [InlineData("V", "5 bar", "5 bar: bar is a unit of pressure; for velocity write one of m/s, km/s, mm/s, m/min, km/h, ft/s, ft/min, mph, kn")]
    [InlineData("V", "5 %", "5 %: a percentage suits a ratio only; write for example 25 m/s")]
    [InlineData("p", "-2 bar", "pressure -2 bar is not above 0: a bare unit is absolute; for gauge write bar(g)")]
    [InlineData("p", "0 Pa", "pressure 0 Pa is not above 0")]
    [InlineData("p", "-1.2 barg", "pressure -1.2 barg is not above perfect vacuum, -1.01325 barg (ambient pressure 1.01325 bar)")]
    [InlineData("p", "1.2 bar(vac)", "pressure 1.2 bar(vac) is not short of perfect vacuum, 1.01325 bar(vac) (ambient pressure 1.01325 bar)")]
    [InlineData("T", "-300 degC", "temperature -300 degC is not above absolute zero, -273.15 degC")]
    [InlineData("T", "-500 degF", "temperature -500 degF is not above absolute zero, -459.67 degF")]
    [InlineData("T", "0 K", "temperature 0 K is not above absolute zero, 0 K")]
    [InlineData("x", "1.2", "quality 1.2 is outside 0 to 1")]
    [InlineData("x", "-1 %", "quality -1 % is outside 0 to 100 %")]
    [InlineData("V", "-3 m/s", "velocity -3 m/s is below 0 m/s")]
    [InlineData("d", "0 mm", "diameter 0 mm is not above 0 mm")]
    [InlineData("n", "2.5", "2.5 is not a whole number")]
    [InlineData("n", "0", "0 is outside 1 to 100000")]
    [InlineData("x", "", "there is no value; write for example 0.97")]
    [InlineData("x", "0.5:1", "0.5:1 is a ratio of two numbers")]
    public void What_is_no_value_of_the_quantity_is_refused_with_its_reason(string symbol, string text, string reason) =>
        ExpectRefusal(Row(symbol), text, reason);

    [Theory]
    [InlineData("efficiency", "130 %", "efficiency 130 % is outside 0 to 100 %")]
    [InlineData("efficiency", "1.3", "efficiency 1.3 is outside 0 to 1")]
    [InlineData("efficiency", "0", "efficiency 0 is outside 0 (excluded) to 1")]
    [InlineData("flow", "500 SCFM", "500 SCFM: SCFM names no reference state (conventions differ by up to 8.7 %); write scfm, NL/min or the like with --reference-state, or Nm3/h (0 degC) or Sm3/h (15 degC)")]
    [InlineData("flow", "500 cfm", "500 cfm: cfm is not a unit here; did you mean acfm?")]
    [InlineData("heat-loss", "30", "30 has no unit; write for example 30 kJ/kg")]
    [InlineData("heat", "--fluid", "--fluid is not a number; write for example 1.5 or 2e5")]
    public void An_option_is_refused_with_its_reason(string option, string text, string reason)
    {
        Assert.True(QuantityCatalogue.TryFindOption(option, out QuantityRow? row));
        ExpectRefusal(row, text, reason);
    }

    [Theory]
    [InlineData("1.4 kg/s", "MassFlow", 1.4)]
    [InlineData("36 m3/h", "VolumeFlow", 0.01)]
    [InlineData("100 acfm", "VolumeFlow", 0.04719474432)]
    [InlineData("7200 Nm3/h", "NormalVolumeFlow", 2)]
    [InlineData("7200 Sm3/h", "StandardVolumeFlow", 2)]
    [InlineData("100 scfm", "ReferenceVolumeFlow", 0.04719474432)]
    public void A_flow_tells_its_kind_by_its_unit(string text, string dimension, double si)
    {
        GivenValue given = ValueParser.Parse("--flow", QuantityCatalogue.Of(CaseOption.Flow), text, Ambient);
        Assert.Equal(dimension, given.Unit.Dimension.ToString());
        Assert.Equal(si, given.Si, 1e-14 * si);
    }

    [Fact]
    public void A_cell_takes_the_unit_of_its_column_unless_it_has_its_own()
    {
        Assert.True(UnitTable.TryFind("barg", Dimension.Pressure, out UnitReading column));
        Assert.Equal(601325, Cell("5.0").Si, 1e-9);
        Assert.Equal(5000, Cell("5.0").HalfWidth, 1e-9);
        Assert.Equal(5e5, Cell("5 bar").Si, 1e-9);
        Assert.Equal("1,5 has a decimal comma; write 1.5", Assert.Throws<FlowDuctException>(() => Cell("1,5")).Refusal.Reason);

        GivenValue Cell(string text) => ValueParser.ParseCell("a.csv row 3", Row("p"), text, column, Ambient);
    }

    private static QuantityRow Row(string symbol) =>
        QuantityCatalogue.TryFindStationQuantity(symbol, out QuantityRow? row) ? row : throw new ArgumentException(symbol);

    private static void ExpectRefusal(QuantityRow row, string text, string reason)
    {
        Refusal refusal = Assert.Throws<FlowDuctException>(() => ValueParser.Parse("--here", row, text, Ambient)).Refusal;
        Assert.Equal((RefusalKind.NotUnderstood, "--here", reason), (refusal.Kind, refusal.Place, refusal.Reason));
    }
}
