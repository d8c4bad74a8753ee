using FlowDuct.Quantities;
using UnitsNet.Units;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

/// <summary>An independent table of units as referee for ours; where it carries fewer digits its name and tolerance are told.</summary>
public sealed class UnitsNetRefereeTests
{
    /// <summary>
    /// Rounding only. Rows with another figure are those where the referee's factor has fewer digits or another definition
    /// (version 5.75.1); the exact rationals in <see cref="UnitTableTests"/> judge those to 1e-14.
    /// </summary>
    private const double Tight = 1e-14;

    private static readonly (string Spelling, Enum Unit, Enum Si, double Tolerance)[] Rows =
    [
        ("bar", PressureUnit.Bar, PressureUnit.Pascal, Tight),
        ("mbar", PressureUnit.Millibar, PressureUnit.Pascal, Tight),
        ("hPa", PressureUnit.Hectopascal, PressureUnit.Pascal, Tight),
        ("kPa", PressureUnit.Kilopascal, PressureUnit.Pascal, Tight),
        ("MPa", PressureUnit.Megapascal, PressureUnit.Pascal, Tight),
        ("psi", PressureUnit.PoundForcePerSquareInch, PressureUnit.Pascal, Tight),
        ("ksi", PressureUnit.KilopoundForcePerSquareInch, PressureUnit.Pascal, Tight),
        ("psf", PressureUnit.PoundForcePerSquareFoot, PressureUnit.Pascal, Tight),
        ("atm", PressureUnit.Atmosphere, PressureUnit.Pascal, Tight),
        ("at", PressureUnit.TechnicalAtmosphere, PressureUnit.Pascal, 2e-5),
        ("kgf/cm2", PressureUnit.KilogramForcePerSquareCentimeter, PressureUnit.Pascal, Tight),
        ("Torr", PressureUnit.Torr, PressureUnit.Pascal, 3e-6),
        ("mmHg", PressureUnit.MillimeterOfMercury, PressureUnit.Pascal, 2e-8),
        ("inHg", PressureUnit.InchOfMercury, PressureUnit.Pascal, 8e-9),
        ("mmH2O", PressureUnit.MillimeterOfWaterColumn, PressureUnit.Pascal, 3e-14),
        ("inH2O", PressureUnit.InchOfWaterColumn, PressureUnit.Pascal, 7e-9),
        ("degR", TemperatureDeltaUnit.DegreeRankine, TemperatureDeltaUnit.Kelvin, Tight),
        ("degF", TemperatureDeltaUnit.DegreeFahrenheit, TemperatureDeltaUnit.Kelvin, Tight),
        ("kJ/kg", SpecificEnergyUnit.KilojoulePerKilogram, SpecificEnergyUnit.JoulePerKilogram, Tight),
        ("MJ/kg", SpecificEnergyUnit.MegajoulePerKilogram, SpecificEnergyUnit.JoulePerKilogram, Tight),
        ("Btu/lb", SpecificEnergyUnit.BtuPerPound, SpecificEnergyUnit.JoulePerKilogram, 4e-8),
        ("kJ/(kg.K)", SpecificEntropyUnit.KilojoulePerKilogramKelvin, SpecificEntropyUnit.JoulePerKilogramKelvin, Tight),
        ("Btu/(lb.degF)", SpecificEntropyUnit.BtuPerPoundFahrenheit, SpecificEntropyUnit.JoulePerKilogramKelvin, Tight),
        ("ft3/lb", SpecificVolumeUnit.CubicFootPerPound, SpecificVolumeUnit.CubicMeterPerKilogram, 1e-8),
        ("g/cm3", DensityUnit.GramPerCubicCentimeter, DensityUnit.KilogramPerCubicMeter, Tight),
        ("g/L", DensityUnit.GramPerLiter, DensityUnit.KilogramPerCubicMeter, Tight),
        ("lb/ft3", DensityUnit.PoundPerCubicFoot, DensityUnit.KilogramPerCubicMeter, 7e-9),
        ("lb/in3", DensityUnit.PoundPerCubicInch, DensityUnit.KilogramPerCubicMeter, 2e-7),
        ("km/h", SpeedUnit.KilometerPerHour, SpeedUnit.MeterPerSecond, Tight),
        ("ft/s", SpeedUnit.FootPerSecond, SpeedUnit.MeterPerSecond, Tight),
        ("ft/min", SpeedUnit.FootPerMinute, SpeedUnit.MeterPerSecond, Tight),
        ("mph", SpeedUnit.MilePerHour, SpeedUnit.MeterPerSecond, Tight),
        ("kn", SpeedUnit.Knot, SpeedUnit.MeterPerSecond, Tight),
        ("mm", LengthUnit.Millimeter, LengthUnit.Meter, Tight),
        ("um", LengthUnit.Micrometer, LengthUnit.Meter, Tight),
        ("in", LengthUnit.Inch, LengthUnit.Meter, Tight),
        ("ft", LengthUnit.Foot, LengthUnit.Meter, Tight),
        ("mm2", AreaUnit.SquareMillimeter, AreaUnit.SquareMeter, Tight),
        ("cm2", AreaUnit.SquareCentimeter, AreaUnit.SquareMeter, Tight),
        ("in2", AreaUnit.SquareInch, AreaUnit.SquareMeter, Tight),
        ("ft2", AreaUnit.SquareFoot, AreaUnit.SquareMeter, Tight),
        ("kg/h", MassFlowUnit.KilogramPerHour, MassFlowUnit.KilogramPerSecond, Tight),
        ("kg/min", MassFlowUnit.KilogramPerMinute, MassFlowUnit.KilogramPerSecond, Tight),
        ("t/h", MassFlowUnit.TonnePerHour, MassFlowUnit.KilogramPerSecond, Tight),
        ("lb/s", MassFlowUnit.PoundPerSecond, MassFlowUnit.KilogramPerSecond, Tight),
        ("lb/min", MassFlowUnit.PoundPerMinute, MassFlowUnit.KilogramPerSecond, 3e-6),
        ("lb/h", MassFlowUnit.PoundPerHour, MassFlowUnit.KilogramPerSecond, 2e-7),
        ("m3/h", VolumeFlowUnit.CubicMeterPerHour, VolumeFlowUnit.CubicMeterPerSecond, Tight),
        ("L/min", VolumeFlowUnit.LiterPerMinute, VolumeFlowUnit.CubicMeterPerSecond, Tight),
        ("acfm", VolumeFlowUnit.CubicFootPerMinute, VolumeFlowUnit.CubicMeterPerSecond, 2e-11),
        ("ft3/h", VolumeFlowUnit.CubicFootPerHour, VolumeFlowUnit.CubicMeterPerSecond, 2e-14),
        ("hp", PowerUnit.MechanicalHorsepower, PowerUnit.Watt, 2e-5),
        ("Btu/h", PowerUnit.BritishThermalUnitPerHour, PowerUnit.Watt, 8e-12),
        ("m/s2", AccelerationUnit.MeterPerSecondSquared, AccelerationUnit.MeterPerSecondSquared, Tight),
        ("ft/s2", AccelerationUnit.FootPerSecondSquared, AccelerationUnit.MeterPerSecondSquared, Tight),
        ("lbf", ForceUnit.PoundForce, ForceUnit.Newton, Tight),
        ("kgf", ForceUnit.KilogramForce, ForceUnit.Newton, Tight),
        ("deg", AngleUnit.Degree, AngleUnit.Radian, Tight),
    ];

    [Fact]
    public void Factors_agree_with_an_independent_table()
    {
        string[] off =
        [
            .. Rows.Select(r => (r.Spelling, r.Tolerance, Off: Math.Abs((Factor(r.Spelling) / Referee(r.Unit, r.Si)) - 1)))
                .Where(r => !(r.Off <= r.Tolerance))
                .Select(r => FormattableString.Invariant($"{r.Spelling} {r.Off:e2}")),
        ];
        Assert.True(off.Length == 0, string.Join(", ", off));
    }

    [Theory]
    [InlineData(230.0, "degC", TemperatureUnit.DegreeCelsius)]
    [InlineData(-40.0, "degF", TemperatureUnit.DegreeFahrenheit)]
    [InlineData(700.0, "degF", TemperatureUnit.DegreeFahrenheit)]
    [InlineData(900.0, "degR", TemperatureUnit.DegreeRankine)]
    public void Temperatures_agree_with_an_independent_table(double value, string spelling, TemperatureUnit unit)
    {
        Assert.True(UnitTable.TryFind(spelling, Dimension.Temperature, out UnitReading reading));
        Assert.Equal(UnitsNet.Temperature.From(value, unit).Kelvins, UnitConverter.ToSi(value, reading, 0), 1e-11);
    }

    private static double Factor(string spelling) => UnitTable.All.ToArray().First(u => u.Spelling == spelling).Factor;

    private static double Referee(Enum unit, Enum si) => UnitsNet.UnitConverter.Convert(1, unit, si);
}
