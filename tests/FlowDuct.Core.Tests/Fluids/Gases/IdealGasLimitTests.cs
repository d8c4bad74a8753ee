using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Each side of each limit: the outcome, and the sentence behind it.</summary>
public class IdealGasLimitTests
{
    private static readonly IdealGas Air = GasCatalogue.Air;

    [Theory]
    [InlineData(1, 300, nameof(Outcome.Ok))]
    [InlineData(0.999, 300, nameof(Outcome.PressureTooLow))]
    [InlineData(double.NaN, 300, nameof(Outcome.PressureTooLow))]
    [InlineData(-1e5, 300, nameof(Outcome.PressureTooLow))]
    [InlineData(1e9, 300, nameof(Outcome.Ok))]
    [InlineData(1.001e9, 300, nameof(Outcome.PressureTooHigh))]
    [InlineData(double.PositiveInfinity, 300, nameof(Outcome.PressureTooHigh))]
    [InlineData(1e5, 50, nameof(Outcome.Ok))]
    [InlineData(1e5, 49.999, nameof(Outcome.TemperatureTooLow))]
    [InlineData(1e5, double.NaN, nameof(Outcome.TemperatureTooLow))]
    [InlineData(1e5, 6000, nameof(Outcome.Ok))]
    [InlineData(1e5, 6000.001, nameof(Outcome.TemperatureTooHigh))]
    public void Pressure_and_temperature(double p, double T, string outcome) =>
        Assert.Equal(outcome, Air.FromPT(p, T, out _).ToString());

    [Theory]
    [InlineData(nameof(StatePair.PH), 50, -1, nameof(Outcome.PairTooLow))]
    [InlineData(nameof(StatePair.PH), 6000, 1, nameof(Outcome.PairTooHigh))]
    [InlineData(nameof(StatePair.PS), 50, -0.001, nameof(Outcome.PairTooLow))]
    [InlineData(nameof(StatePair.PS), 6000, 0.001, nameof(Outcome.PairTooHigh))]
    [InlineData(nameof(StatePair.PRho), 50, 0.001, nameof(Outcome.PairTooLow))]
    [InlineData(nameof(StatePair.PRho), 6000, -1e-6, nameof(Outcome.PairTooHigh))]
    public void Pairs_just_beyond_the_end_are_refused_and_explained(string pair, double T, double beyond, string outcome)
    {
        Assert.Equal(Outcome.Ok, Air.FromPT(1e5, T, out FluidState end));
        StatePair which = Enum.Parse<StatePair>(pair);
        double limit = which switch { StatePair.PH => end.h, StatePair.PS => end.s, _ => end.rho };
        double value = limit + beyond;
        Outcome got = From(which, value);
        Assert.Equal(outcome, got.ToString());

        RangeViolation why = Air.Explain(got, which, 1e5, value);
        Assert.Equal(value, why.Value);
        Assert.Equal(limit, why.Limit, 1e-12 * limit);
        Assert.Equal(beyond > 0, why.IsUpper);
        Assert.Contains("NASA/TP-2002-211556", why.Source, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(1.0, 0.01, nameof(Outcome.PairTooHigh), true)]
    [InlineData(1e9, -0.01, nameof(Outcome.PairTooLow), false)]
    public void Entropy_of_an_enthalpy_is_bounded_by_the_pressure_limits(double p, double beyond, string outcome, bool isUpper)
    {
        Assert.Equal(Outcome.Ok, Air.FromPT(p, 400, out FluidState end));
        Outcome got = Air.FromHS(end.h, end.s + beyond, default, out _);
        Assert.Equal(outcome, got.ToString());
        RangeViolation why = Air.Explain(got, StatePair.HS, end.h, end.s + beyond);
        Assert.Equal(("s", isUpper), (why.Symbol, why.IsUpper));
        Assert.Equal(end.s, why.Limit, 1e-11 * end.s);
    }

    [Fact]
    public void Enthalpy_outside_is_named_for_an_enthalpy_entropy_pair()
    {
        Assert.Equal(Outcome.PairTooLow, Air.FromHS(1000, 6000, default, out _));
        Assert.Equal("h", Air.Explain(Outcome.PairTooLow, StatePair.HS, 1000, 6000).Symbol);
    }

    [Fact]
    public void Not_a_number_never_comes_out()
    {
        double nan = double.NaN;
        Assert.NotEqual(Outcome.Ok, Air.FromPH(1e5, nan, default, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromPS(1e5, nan, default, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromHS(3e5, nan, default, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromHS(nan, 6000, default, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromPRho(1e5, nan, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromPRho(1e5, 0, out _));
        Assert.NotEqual(Outcome.Ok, Air.FromPRho(1e5, -1, out _));
    }

    [Fact]
    public void Temperature_limits_name_the_report_or_its_continuation()
    {
        RangeViolation low = Air.Explain(Outcome.TemperatureTooLow, StatePair.PT, 1e5, 40);
        Assert.Equal(("T", 40.0, 50.0, false), (low.Symbol, low.Value, low.Limit, low.IsUpper));
        Assert.Equal("continuation of NASA/TP-2002-211556 (2002), record Air, below its 200 K", low.Source);
        RangeViolation high = Air.Explain(Outcome.TemperatureTooHigh, StatePair.PT, 1e5, 7000);
        Assert.Equal(("T", 7000.0, 6000.0, true), (high.Symbol, high.Value, high.Limit, high.IsUpper));
        Assert.Equal("NASA/TP-2002-211556 (2002), record Air", high.Source);
    }

    [Theory]
    [InlineData(nameof(Outcome.PressureTooLow), 0.5, 1.0, false)]
    [InlineData(nameof(Outcome.PressureTooHigh), 2e9, 1e9, true)]
    public void Pressure_limits_are_owned_by_this_program(string outcome, double p, double limit, bool isUpper)
    {
        RangeViolation why = Air.Explain(Enum.Parse<Outcome>(outcome), StatePair.PT, p, 300);
        Assert.Equal(new RangeViolation("p", p, limit, isUpper, "ideal-gas model, limit chosen by this program"), why);
    }

    [Fact]
    public void There_is_no_saturation()
    {
        Assert.False(Air.HasSaturation);
        Assert.Equal(Outcome.NoSaturation, Air.FromPX(1e5, 0.5, out _));
        Assert.Equal(Outcome.NoSaturation, Air.FromTX(300, 0.5, out _));
        Assert.False(Air.TrySaturationTemperature(1e5, out _));
        Assert.False(Air.TrySaturationPressure(300, out _));
        Assert.False(Air.TrySaturationOnIsentrope(6800, out _));
        Assert.Equal("x", Air.Explain(Outcome.NoSaturation, StatePair.PX, 1e5, 0.5).Symbol);
    }

    [Fact]
    public void It_says_what_it_is()
    {
        Assert.Equal("air", Air.Name);
        Assert.Equal("NASA/TP-2002-211556 (2002), record Air, ideal gas", Air.Formulation);
        Assert.Equal("50 K to 6000 K, 1 Pa to 1 GPa; below 200 K the heat capacity keeps its 200 K value", Air.RangeText);
        Assert.Contains(Air, GasCatalogue.All);
    }

    private static Outcome From(StatePair pair, double value) => pair switch
    {
        StatePair.PH => Air.FromPH(1e5, value, default, out _),
        StatePair.PS => Air.FromPS(1e5, value, default, out _),
        _ => Air.FromPRho(1e5, value, out _),
    };
}
