using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Humid air by relative humidity, dew point and humidity ratio.</summary>
public class HumidityTests
{
    private static readonly Fluid HumidAir = FluidCatalogue.Find("humid-air")!;

    // Saturation pressures: IAPWS R7-97(2012), Table 35, and R14-08(2011), Section 3; half a printed digit over dp/dT.
    [Theory]
    [InlineData(3536.58941, 300, 2.4e-8)]
    [InlineData(2638897.76, 500, 1.1e-7)]
    [InlineData(8.94735, 230, 5e-6)]
    public void A_dew_point_is_the_inverse_of_the_published_saturation_pressure(double partial, double T, double kelvin) =>
        Assert.Equal(T, Humidity.DewPoint(1, partial)!.Value, kelvin);

    [Fact]
    public void Ice_and_liquid_meet_at_the_triple_point()
    {
        double over = SaturationLine.Pressure(WaterConstants.Tt), below = IceLine.SublimationPressure(WaterConstants.Tt);
        Assert.Equal(611.657, below, 5e-4); // R14-08(2011), Section 3
        Assert.Equal(1, over / below, 1e-10);
        double frost = Humidity.DewPoint(1, below * (1 - 1e-6))!.Value, dew = Humidity.DewPoint(1, over * (1 + 1e-6))!.Value;
        Assert.True(frost < WaterConstants.Tt && dew > WaterConstants.Tt && dew - frost < 1e-4);
        Assert.Equal(WaterConstants.Tt, Humidity.DewPoint(1, (over + below) / 2)!.Value, 2e-5);
    }

    [Theory]
    [InlineData("p=1 atm, T=25 degC, humidity=60%")]
    [InlineData("p=7 bar, T=60 degC, humidity=3%")]
    [InlineData("p=0.2 bar, T=-45 degC, humidity=100%")]
    [InlineData("p=1 bar, T=99 degC, humidity=99%")]
    [InlineData("p=200 bar, T=300 degC, humidity=0.01%")]
    [InlineData("p=1 bar, T=0.01 degC, humidity=50%")]
    public void The_three_words_say_the_same(string at)
    {
        string pT = at[..at.LastIndexOf(',')];
        StateAnswer by = State(at);
        StateAnswer again = State(FormattableString.Invariant($"{pT}, dew-point={Figure(by, "dew-point"):R} K"));
        StateAnswer third = State(FormattableString.Invariant($"{pT}, humidity-ratio={Figure(again, "humidity-ratio"):R}"));
        foreach (string key in (string[])["humidity", "dew-point", "humidity-ratio"])
        {
            Assert.Equal(1, Figure(again, key) / Figure(by, key), 1e-9);
            Assert.Equal(1, Figure(third, key) / Figure(by, key), 1e-9);
        }

        Assert.NotEqual(1, Figure(State(FormattableString.Invariant($"{pT}, dew-point={Figure(by, "dew-point") - 1e-4:R} K")), "humidity") / Figure(by, "humidity"), 1e-9);
    }

    [Theory]
    [InlineData("humidity=0")]
    [InlineData("humidity-ratio=0")]
    public void Without_vapour_it_is_dry_air(string dry)
    {
        FluidState air = StateAnswer.Solve(GasCatalogue.Air, Cases.At("p=3 bar, T=150 K")).At.State, humid = State("p=3 bar, T=150 K, " + dry).At.State;
        Assert.Equal((air.h, air.s, air.rho, air.cp, air.w), (humid.h, humid.s, humid.rho, humid.cp, humid.w));
    }

    // The composition closes whatever fixes the state: the same state by another pair has the same air in it.
    [Theory]
    [InlineData("p=1 bar, T=320 K", "humidity=80%")]
    [InlineData("p=1 bar, T=370 K", "humidity=95%")]
    [InlineData("p=1 bar, T=260 K", "humidity=70%")]
    [InlineData("p=1 bar, T=320 K", "dew-point=300 K")]
    [InlineData("p=1 bar, T=320 K", "humidity-ratio=0.02")]
    public void Other_pairs_lead_to_the_same_air(string pT, string humidity)
    {
        StateAnswer by = State($"{pT}, {humidity}");
        FluidState at = by.At.State;
        string[] pairs =
        [
            FormattableString.Invariant($"p={at.p:R} Pa, h={at.h:R} J/kg"), FormattableString.Invariant($"p={at.p:R} Pa, s={at.s:R} J/(kg.K)"),
            FormattableString.Invariant($"p={at.p:R} Pa, rho={at.rho:R} kg/m3"), FormattableString.Invariant($"T={at.T:R} K, rho={at.rho:R} kg/m3"),
        ];
        foreach (string pair in pairs)
        {
            StateAnswer other = State($"{pair}, {humidity}");
            Assert.Equal(1, Figure(other, "humidity-ratio") / Figure(by, "humidity-ratio"), 1e-9);
            Assert.Equal(at.T, other.At.State.T, 1e-7);
        }
    }

    // Saturated air at 101.325 kPa, ASHRAE Fundamentals (2009), Chapter 1, Table 2, kg/kg, from memory. The table holds the enhancement factor,
    // 1.0039 to 1.0046 here, which this model leaves out: it is that much short, and by no more.
    [Theory]
    [InlineData(-10, 0.001606)]
    [InlineData(0.01, 0.003793)]
    [InlineData(20, 0.014758)]
    [InlineData(30, 0.027333)]
    public void Saturated_air_is_short_of_the_psychrometric_table_by_the_enhancement_factor(double celsius, double ratio)
    {
        double ours = Figure(State(FormattableString.Invariant($"p=101.325 kPa, T={celsius} degC, humidity=100%")), "humidity-ratio");
        Assert.InRange(ratio / ours, 1.0032, 1.0056);
    }

    // CIPM-2007: A. Picard, R. S. Davis, M. Glaser, K. Fujii, Metrologia 45 (2008) 149-155, its range 60 to 110 kPa, 15 to 27 degC; coefficients from
    // memory. An ideal mixture lacks its compressibility factor Z (0.9995 to 0.9998) and its enhancement factor, which at 27 degC moves the
    // density by 5.5e-5; the molar masses of dry air differ by 1.2e-5.
    [Theory]
    [InlineData(101325, 20, 0.5)]
    [InlineData(101325, 20, 0)]
    [InlineData(60000, 15, 1)]
    [InlineData(110000, 15, 0.2)]
    [InlineData(101325, 27, 1)]
    [InlineData(95000, 23, 0.7)]
    public void Density_agrees_with_that_of_metrology_but_for_its_real_gas(double p, double t, double humidity)
    {
        (double rho, double Z) = Cipm2007(p, t, humidity);
        double ours = State(FormattableString.Invariant($"p={p} Pa, T={t} degC, humidity={humidity}")).At.State.rho;
        Assert.Equal(1, ours / (rho * Z), 8e-5);
        Assert.InRange(ours / rho, 0.9994, 1);
        Assert.True(humidity == 0 || Math.Abs((State(FormattableString.Invariant($"p={p} Pa, T={t} degC, humidity=0")).At.State.rho / (rho * Z)) - 1) > 5e-4);
    }

    private static (double rho, double Z) Cipm2007(double p, double t, double humidity)
    {
        double T = t + 273.15;
        double saturation = Math.Exp((1.2378847e-5 * T * T) - (1.9121316e-2 * T) + 33.93711047 - (6.3431645e3 / T));
        double x = humidity * (1.00062 + (3.14e-8 * p) + (5.6e-7 * t * t)) * saturation / p;
        double first = 1.58123e-6 - (2.9331e-8 * t) + (1.1043e-10 * t * t) + ((5.707e-6 - (2.051e-8 * t)) * x) + ((1.9898e-4 - (2.376e-6 * t)) * x * x);
        double Z = 1 - (p / T * first) + (p * p / (T * T) * (1.83e-11 - (0.765e-8 * x * x)));
        return (3.483740e-3 * p / (Z * T) * (1 - (0.3780 * x)), Z);
    }

    private static StateAnswer State(string at) => StateAnswer.Solve(HumidAir, Cases.At(at));

    private static double Figure(StateAnswer answer, string key) => StationFigureTable.Read(answer.Fluid, answer.At, key)!.Value;
}
