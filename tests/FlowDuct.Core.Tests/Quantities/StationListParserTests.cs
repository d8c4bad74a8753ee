using FlowDuct.Errors;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class StationListParserTests
{
    private const double Ambient = 101325;

    [Fact]
    public void Items_keep_their_order_value_and_slot()
    {
        IReadOnlyList<StationItem> items = StationListParser.Parse("--inlet", Station.Inlet, "p=9 bar, T=230 degC,V=25m/s", Ambient);
        Assert.Equal([StationSymbol.Pressure, StationSymbol.Temperature, StationSymbol.Velocity], items.Select(i => i.Slot));
        Assert.Equal([9e5, 503.15, 25], items.Select(i => i.Value.Si));
        Assert.Equal([5e4, 0.5, 0.5], items.Select(i => i.Value.HalfWidth));
        Assert.Equal(["9 bar", "230 degC", "25m/s"], items.Select(i => i.Value.Text));
    }

    [Theory]
    [InlineData("pressure=9 bar , temperature = 230 degC", "p T")]
    [InlineData("stagnation-pressure=9 bar,stagnation-temperature=230 degC", "p0 T0")]
    [InlineData("p=6bar,moisture=2%", "p moisture")]
    [InlineData("p0=7 barg, T0=40 degC, d=18 mm, n=3", "p0 T0 d n")]
    [InlineData("velocity=25 m/s,mach=0.2", "V M")]
    [InlineData("volume=0.2 m3/kg,density=5 kg/m3,internal-energy=2600 kJ/kg", "v rho u")]
    [InlineData("speed=3 m/s", "")]
    public void Symbols_and_words_are_accepted(string text, string symbols)
    {
        if (symbols.Length == 0)
            Assert.Throws<FlowDuctException>(() => StationListParser.Parse("--inlet", Station.Inlet, text, Ambient));
        else
            Assert.Equal(symbols, string.Join(' ', StationListParser.Parse("--inlet", Station.Inlet, text, Ambient).Select(i => i.Row.Symbol)));
    }

    [Theory]
    [InlineData("T=200", "T=200 has no unit; write for example T=200 degC")]
    [InlineData("", "the list is empty")]
    [InlineData("   ", "the list is empty")]
    [InlineData("p=9 bar,", "an item is empty: there is a comma too many")]
    [InlineData("p=9 bar,,T=200 degC", "an item is empty: there is a comma too many")]
    [InlineData("9 bar", "9 bar has no equals sign")]
    [InlineData("=9 bar", "=9 bar has no symbol before its equals sign")]
    [InlineData("p=", "p= has no value; write for example p=9 bar")]
    [InlineData("p=1,5 bar", "p=1,5 bar has a decimal comma")]
    [InlineData("x=0,9", "x=0,9 has a decimal comma")]
    [InlineData("p=9 bar, p=8 bar", "p is given twice")]
    [InlineData("p=9 bar, pressure=8 bar", "p is given twice")]
    [InlineData("v=30 m/s", "v is specific volume, m3/kg; for velocity write V=30 m/s")]
    [InlineData("V=0.2 m3/kg", "V is velocity, m/s; for specific volume write v=0.2 m3/kg")]
    [InlineData("t=200 degC", "t is not a symbol (case matters); for static temperature write T=200 degC")]
    [InlineData("P=5 bar", "P is not a symbol (case matters); for static pressure write p=5 bar")]
    [InlineData("Pressure=5 bar", "Pressure is not a symbol (case matters); for static pressure write p=5 bar")]
    [InlineData("m=0.3", "m is not a symbol (case matters); for Mach number write M=0.3")]
    [InlineData("presure=5 bar", "presure is not a symbol; did you mean p=9 bar?")]
    [InlineData("beta=0.5", "beta (diameter ratio) is not taken here")]
    [InlineData("rect=600 mm", "rect=600 mm is one number, and rectangular section takes two")]
    [InlineData("annulus=500x900 mm", "annulus=500x900 mm has no ring between its diameters")]
    [InlineData("rect=600x-3 mm", "rect=-3 mm is not above 0 mm")]
    [InlineData("w=500 m/s", "w (speed of sound) is an answer, it cannot be given")]
    [InlineData("dp=0.3 bar", "dp (pressure drop) is not taken here")]
    [InlineData("altitude=500 m", "altitude (altitude) is not taken here")]
    [InlineData("x=1.2", "x=1.2 is outside 0 to 1")]
    [InlineData("T=-300 degC", "T=-300 degC is not above absolute zero, -273.15 degC")]
    [InlineData("p=-1.2 barg", "p=-1.2 barg is not above perfect vacuum, -1.01325 barg (ambient pressure 1.01325 bar)")]
    [InlineData("p=9 baar", "p=9 baar: baar is not a unit here; did you mean bar?")]
    [InlineData("p=nan", "p=nan is not a finite number")]
    public void A_wrong_list_is_refused_with_its_reason(string text, string reason)
    {
        Refusal refusal = Refused("--inlet", StationLists.Inlet, text);
        Assert.Equal((RefusalKind.NotUnderstood, "--inlet", reason), (refusal.Kind, refusal.Place, refusal.Reason));
    }

    [Fact]
    public void A_decimal_comma_is_met_with_the_number_to_write() =>
        Assert.Equal("write p=1.5 bar", Refused("--inlet", StationLists.Inlet, "p=1,5 bar").NextStep);

    [Theory]
    [InlineData("p/p0=2.5:1", "p/p0=2.5:1 is a ratio of two numbers", "write p/p0=0.4 (this pressure over that of the inlet)")]
    [InlineData("p/p1=1:4", "p/p1=1:4 is a ratio of two numbers", "write p/p1=0.25 (this pressure over that of the inlet)")]
    public void A_ratio_with_a_colon_is_met_with_the_number_to_write(string text, string reason, string next)
    {
        Refusal refusal = Refused("--exit", StationLists.Exit, text);
        Assert.Equal((reason, next), (refusal.Reason, refusal.NextStep));
    }

    [Theory]
    [InlineData("p=0.1 barg", "p=0.1 barg: gauge and vacuum readings start from the ambient pressure itself", "give it absolute, in bar(a)")]
    [InlineData("p=1 inHg(vac)", "p=1 inHg(vac): gauge and vacuum readings start from the ambient pressure itself", "give it absolute, in inHg(a)")]
    public void An_ambient_pressure_is_absolute(string text, string reason, string next)
    {
        Refusal refusal = Refused("--ambient", StationLists.Ambient, text);
        Assert.Equal((reason, next), (refusal.Reason, refusal.NextStep));
    }

    [Theory]
    [InlineData("Ambient", "V=3 m/s", "V (velocity) is not taken here", "--list takes p, T, altitude")]
    [InlineData("Back", "T=20 degC", "T (static temperature) is not taken here", "--list takes p, dp, rise, p/p0, p/p1")]
    [InlineData("At", "d=20 mm", "d (diameter) is not taken here", "--list takes p, p0, T, T0, h, h0, s, u, v, rho, x, moisture, superheat, subcooling, V, M, humidity, dew-point, humidity-ratio")]
    public void A_list_names_what_it_takes(string list, string text, string reason, string next)
    {
        Refusal refusal = Refused("--list", Enum.Parse<StationLists>(list), text);
        Assert.Equal((reason, next), (refusal.Reason, refusal.NextStep));
    }

    [Theory]
    [InlineData("Throat", "d=18 mm")]
    [InlineData("Exit", "p/p0=0.4")]
    [InlineData("Exit", "dp=4 inH2O, z=-1.5 m")]
    [InlineData("Back", "p=1 atm")]
    [InlineData("Ambient", "altitude=600 m, T=15 degC")]
    [InlineData("At", "p=7 bar, superheat=20 K")]
    public void Each_list_takes_its_own_quantities(string list, string text) =>
        Assert.Equal(text.Split(',').Length, StationListParser.Parse("--list", Enum.Parse<StationLists>(list), text, Ambient).Count);

    [Fact]
    public void Every_example_of_the_catalogue_is_taken_wherever_the_row_says()
    {
        foreach (QuantityRow row in QuantityCatalogue.StationQuantities.Where(r => r.StationSlot is not null))
        {
            Assert.NotEqual(StationLists.None, row.TakenBy);
            foreach (StationLists list in Enum.GetValues<StationLists>().Where(l => l != StationLists.None))
            {
                if (row.TakenBy.HasFlag(list))
                    Assert.Same(row, Assert.Single(StationListParser.Parse("--list", list, row.Example, Ambient)).Row);
                else
                    Assert.Contains("not taken here", Refused("--list", list, row.Example).Reason, StringComparison.Ordinal);
            }
        }
    }

    private static Refusal Refused(string option, StationLists list, string text) =>
        Assert.Throws<FlowDuctException>(() => StationListParser.Parse(option, list, text, Ambient)).Refusal;
}
