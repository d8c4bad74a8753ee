using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class QuantityTests
{
    [Fact]
    public void Every_kind_holds_its_range()
    {
        Check<AbsolutePressure>();
        Check<GaugePressure>();
        Check<PressureDifference>();
        Check<ThermodynamicTemperature>();
        Check<TemperatureDifference>();
        Check<SpecificEnthalpy>();
        Check<SpecificInternalEnergy>();
        Check<SpecificHeat>();
        Check<SpecificEntropy>();
        Check<SpecificHeatCapacity>();
        Check<SpecificVolume>();
        Check<Density>();
        Check<Velocity>();
        Check<Length>();
        Check<Elevation>();
        Check<Area>();
        Check<MassFlowRate>();
        Check<VolumeFlowRate>();
        Check<HeatRate>();
        Check<Acceleration>();
        Check<Force>();
        Check<PlaneAngle>();
        Check<Ratio>();
    }

    [Fact]
    public void A_quantity_shows_its_value_and_unit_and_compares_by_value()
    {
        Assert.Equal("900000 Pa", Quantity<AbsolutePressure>.FromSi(9e5).ToString());
        Assert.Equal("0 m/s", Quantity<Velocity>.FromSi(-0.0).ToString());
        Assert.Equal(Quantity<Velocity>.FromSi(25), Quantity<Velocity>.FromSi(25));
        Assert.NotEqual(default, Quantity<Velocity>.FromSi(0));
    }

    [Fact]
    public void Gauge_and_absolute_convert_with_the_ambient_pressure()
    {
        Quantity<AbsolutePressure> ambient = Quantity<AbsolutePressure>.FromSi(101325);
        Assert.Equal(801325, Quantity<GaugePressure>.FromSi(7e5).ToAbsolute(ambient).Si);
        Assert.Equal(-51325, Quantity<AbsolutePressure>.FromSi(5e4).ToGauge(ambient).Si);
        Assert.Equal(-51325, Quantity<AbsolutePressure>.FromSi(5e4).Minus(ambient).Si);
        Assert.Throws<ArgumentOutOfRangeException>(() => Quantity<GaugePressure>.FromSi(-101325).ToAbsolute(ambient));
        Assert.Throws<InvalidOperationException>(() => Quantity<GaugePressure>.FromSi(1).ToAbsolute(default));
        Assert.Throws<InvalidOperationException>(() => default(Quantity<GaugePressure>).ToAbsolute(ambient));
    }

    [Fact]
    public void Temperatures_differ_without_an_offset() =>
        Assert.Equal(-20, Quantity<ThermodynamicTemperature>.FromSi(280).Minus(Quantity<ThermodynamicTemperature>.FromSi(300)).Si);

    private static void Check<T>()
        where T : struct, IDimensionMarker
    {
        Assert.False(default(Quantity<T>).IsSet);
        Assert.Equal("not set", default(Quantity<T>).ToString());
        Assert.Contains("was never set", Assert.Throws<InvalidOperationException>(() => default(Quantity<T>).Si).Message, StringComparison.Ordinal);
        Assert.All([double.NaN, double.PositiveInfinity, double.NegativeInfinity], Refuse<T>);
        Assert.Equal(1.5, Quantity<T>.FromSi(1.5).Si);
        Assert.True(Enum.GetValues<Dimension>().Any(d => DimensionWords.SiUnit(d) == T.SiUnit), T.Name);
        if (double.IsNegativeInfinity(T.Least))
        {
            Assert.Equal(-1.5, Quantity<T>.FromSi(-1.5).Si);
            return;
        }

        Refuse<T>(double.BitDecrement(T.Least));
        if (T.LeastIsInclusive)
            Assert.Equal(T.Least, Quantity<T>.FromSi(T.Least).Si);
        else
            Refuse<T>(T.Least);
    }

    private static void Refuse<T>(double si)
        where T : struct, IDimensionMarker
    {
        string message = Assert.Throws<ArgumentOutOfRangeException>(() => Quantity<T>.FromSi(si)).Message;
        Assert.Contains(T.Name, message, StringComparison.Ordinal);
    }
}
