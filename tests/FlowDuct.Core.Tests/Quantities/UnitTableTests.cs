using System.Numerics;
using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Quantities;

public sealed class UnitTableTests
{
    /// <summary>Names of the reference table, and ours; what is not here has no unit of ours (viscosity, energy, mass, ...).</summary>
    private static readonly (string Reference, string Spelling, Dimension Dimension)[] Counterparts =
    [
        ("lbf", "lbf", Dimension.Force),
        ("kgf", "kgf", Dimension.Force),
        ("ft", "ft", Dimension.Length),
        ("in", "in", Dimension.Length),
        ("psi", "psi", Dimension.Pressure),
        ("psf", "psf", Dimension.Pressure),
        ("bar", "bar", Dimension.Pressure),
        ("MPa", "MPa", Dimension.Pressure),
        ("kgf/cm2 (technical atmosphere)", "kgf/cm2", Dimension.Pressure),
        ("kgf/cm2 (technical atmosphere)", "at", Dimension.Pressure),
        ("atm", "atm", Dimension.Pressure),
        ("torr", "Torr", Dimension.Pressure),
        ("mmHg (conventional)", "mmHg", Dimension.Pressure),
        ("inHg (conventional)", "inHg", Dimension.Pressure),
        ("mmH2O (conventional)", "mmH2O", Dimension.Pressure),
        ("inH2O (conventional)", "inH2O", Dimension.Pressure),
        ("ftH2O (conventional)", "ftH2O", Dimension.Pressure),
        ("Btu_IT/lb", "Btu/lb", Dimension.SpecificEnergy),
        ("Btu_IT/(lb R)", "Btu/(lb.degR)", Dimension.SpecificEntropy),
        ("Btu_IT/(lb R)", "Btu/(lb.degF)", Dimension.SpecificEntropy),
        ("kcal_IT/kg", "kcal/kg", Dimension.SpecificEnergy),
        ("ft lbf/lb", "ft.lbf/lb", Dimension.SpecificEnergy),
        ("hp (550 ft lbf/s)", "hp", Dimension.HeatRate),
        ("Btu_IT/h", "Btu/h", Dimension.HeatRate),
        ("degree R (interval)", "degR", Dimension.Temperature),
        ("degree R (interval)", "degF", Dimension.Temperature),
        ("cfm", "acfm", Dimension.VolumeFlow),
        ("cfm", "ft3/min", Dimension.VolumeFlow),
        ("cfm", "scfm", Dimension.ReferenceVolumeFlow),
        ("lb", "lb/s", Dimension.MassFlow),
        ("ft3", "ft3/s", Dimension.VolumeFlow),
        ("lb/h", "lb/h", Dimension.MassFlow),
        ("lb/ft3", "lb/ft3", Dimension.Density),
        ("ft3/lb", "ft3/lb", Dimension.SpecificVolume),
        ("ft2/s2", "ft2/s2", Dimension.SpecificEnergy),
        ("lb/(s ft2)", "lb/(ft2.s)", Dimension.MassFlux),
        ("lb/(ft s)", "lb/(ft.s)", Dimension.DynamicViscosity),
        ("cP", "cP", Dimension.DynamicViscosity),
        ("Btu_IT/(h ft F)", "Btu/(h.ft.degF)", Dimension.ThermalConductivity),
    ];

    /// <summary>Independent of the expressions of the table: SI prefixes, minutes and hours, international foot, yard and nautical mile.</summary>
    private static readonly (string Spelling, double Factor)[] Literals =
    [
        ("kn", 0.51444444444444444),
        ("mph", 0.44704),
        ("km/h", 0.27777777777777778),
        ("ft/min", 0.00508),
        ("m/min", 0.016666666666666667),
        ("in2", 0.00064516),
        ("ft2", 0.09290304),
        ("lb/in3", 27679.904710203122),
        ("ksi", 6894757.2931683613),
        ("klb/h", 0.12599788055555556),
        ("lb/min", 0.0075598728333333333),
        ("t/h", 0.27777777777777778),
        ("ft3/h", 7.8657907199999998e-6),
        ("Btu/s", 1055.05585262),
        ("cal/g", 4186.8),
        ("kcal/(kg.K)", 4186.8),
        ("deg", 0.017453292519943296),
        ("L/min", 1.6666666666666667e-5),
        ("Nm3/h", 0.00027777777777777778),
        ("Sm3/min", 0.016666666666666667),
        ("kg/min", 0.016666666666666667),
        ("g/min", 1.6666666666666667e-5),
        ("%", 0.01),
        ("kg/(m2.s)", 1),
        ("bara", 100000),
        ("barg", 100000),
        ("mbar", 100),
        ("hPa", 100),
        ("kPa", 1000),
        ("psia", 6894.7572931683613),
        ("psig", 6894.7572931683613),
        ("degC", 1),
        ("kJ/kg", 1000),
        ("MJ/kg", 1000000),
        ("J/g", 1000),
        ("m2/s2", 1),
        ("kJ/(kg.K)", 1000),
        ("J/(g.K)", 1000),
        ("L/kg", 0.001),
        ("cm3/g", 0.001),
        ("kg/L", 1000),
        ("g/cm3", 1000),
        ("g/L", 1),
        ("km/s", 1000),
        ("mm/s", 0.001),
        ("ft/s", 0.3048),
        ("mm", 0.001),
        ("cm", 0.01),
        ("km", 1000),
        ("um", 0.000001),
        ("mm2", 0.000001),
        ("cm2", 0.0001),
        ("kg/h", 0.00027777777777777778),
        ("g/s", 0.001),
        ("m3/min", 0.016666666666666667),
        ("m3/h", 0.00027777777777777778),
        ("L/s", 0.001),
        ("Nm3/min", 0.016666666666666667),
        ("Sm3/h", 0.00027777777777777778),
        ("m3/h(ref)", 0.00027777777777777778),
        ("NL/h", 2.7777777777777778e-7),
        ("NL/min", 1.6666666666666667e-5),
        ("NL/s", 0.001),
        ("nlpm", 1.6666666666666667e-5),
        ("SL/min", 1.6666666666666667e-5),
        ("slpm", 1.6666666666666667e-5),
        ("sccm", 1.6666666666666667e-8),
        ("scfh", 7.86579072e-6),
        ("MMscfd", 0.32774128),
        ("kW", 1000),
        ("MW", 1000000),
        ("ft/s2", 0.3048),
        ("kN", 1000),
        ("mPa.s", 0.001),
        ("uPa.s", 0.000001),
        ("lb/(ft.h)", 0.00041337887321376453),
        ("mm2/s", 0.000001),
        ("cSt", 0.000001),
        ("ft2/s", 0.09290304),
        ("mW/(m.K)", 0.001),
        ("mN/m", 0.001),
        ("lbf/ft", 14.593902937206365),
    ];

    private static readonly string[] WithoutCounterpart =
    [
        "Btu_IT", "cal_IT", "cal_th", "ft lbf", "metric horsepower", "ton of refrigeration (12000 Btu_IT/h)", "US gallon",
        "lbf s/ft2", "lb/(s in2)",
    ];

    [Fact]
    public void Factors_agree_with_the_exact_rationals_of_the_reference_table()
    {
        Dictionary<string, double> exact = ReferenceTable.Read("flow/unit_factors.csv").ToDictionary(r => r["unit"], r => Rational(r["rational"]));
        Assert.Equal(exact.Keys.Order(), Counterparts.Select(c => c.Reference).Distinct().Concat(WithoutCounterpart).Order());
        Assert.All(Counterparts, c => AssertClose(exact[c.Reference], Row(c.Spelling, c.Dimension).Factor, 1e-14));
    }

    [Fact]
    public void Factors_agree_with_independent_literals() =>
        Assert.All(Literals, literal => AssertClose(literal.Factor, UnitTable.All.ToArray().Single(u => u.Spelling == literal.Spelling).Factor, 1e-14));

    [Fact]
    public void No_unit_goes_without_a_check_of_its_factor()
    {
        HashSet<string> known = [.. Counterparts.Select(c => c.Spelling), .. Literals.Select(l => l.Spelling)];
        known.UnionWith(Enum.GetValues<Dimension>().Select(DimensionWords.SiUnit)); // checked to be 1 below
        Assert.DoesNotContain(UnitTable.All.ToArray(), unit => !known.Contains(unit.Spelling));
    }

    [Fact]
    public void Spellings_are_ascii_and_unique_in_their_dimension()
    {
        Unit[] units = UnitTable.All.ToArray();
        Assert.True(units.Length >= 110);
        Assert.All(units, u => Assert.True(u.Spelling.All(c => c is > ' ' and <= '~') && u.Source.Length > 0 && u.Factor > 0));
        Assert.Equal(units.Length, units.Select(u => (u.Spelling, u.Dimension)).Distinct().Count());
        Assert.Equal(units.Length - 1, units.Select(u => u.Spelling).Distinct().Count()); // "1" serves ratios and counts
    }

    [Fact]
    public void Every_dimension_has_its_si_unit_and_its_display_units()
    {
        foreach (Dimension dimension in Enum.GetValues<Dimension>())
        {
            Assert.True(UnitTable.TryFind(DimensionWords.SiUnit(dimension), dimension, out UnitReading si));
            Assert.Equal(1, si.Unit.Factor);
            Assert.NotEmpty(DimensionWords.Of(dimension));
            foreach (UnitSystem system in Enum.GetValues<UnitSystem>())
                Assert.True(UnitTable.TryFind(DisplayUnits.Of(dimension, system), dimension, out _), $"{dimension} {system}");
        }
    }

    [Fact]
    public void Every_pressure_unit_takes_every_basis_once()
    {
        foreach (Unit unit in UnitTable.All.ToArray().Where(u => u.Dimension == Dimension.Pressure))
        {
            bool saysBasis = unit.Basis is UnitBasis.Absolute or UnitBasis.Gauge;
            foreach (string suffix in (string[])["(a)", "(g)", "(vac)"])
            {
                Assert.Equal(!saysBasis, UnitTable.TryFind(unit.Spelling + suffix, Dimension.Pressure, out _));
                Assert.False(UnitTable.TryFind(unit.Spelling + suffix, Dimension.PressureDifference, out _));
            }

            Assert.Equal(unit.Basis != UnitBasis.Head, UnitTable.TryFind(unit.Spelling, Dimension.Pressure, out _));
            Assert.Equal(!saysBasis, UnitTable.TryFind(unit.Spelling, Dimension.PressureDifference, out _));
        }
    }

    [Theory]
    [InlineData("bar", "Absolute", false)]
    [InlineData("bara", "Absolute", true)]
    [InlineData("bar(a)", "Absolute", true)]
    [InlineData("psig", "Gauge", true)]
    [InlineData("inH2O(g)", "Gauge", true)]
    [InlineData("inHg(vac)", "Vacuum", true)]
    public void A_pressure_unit_reads_with_its_basis(string spelling, string basis, bool isWritten)
    {
        Assert.True(UnitTable.TryFind(spelling, Dimension.Pressure, out UnitReading reading));
        Assert.Equal((basis, isWritten, spelling), (reading.Basis.ToString(), reading.BasisIsWritten, reading.Spelling));
        Assert.Equal(basis != "Absolute", reading.NeedsAmbient);
    }

    [Fact]
    public void Values_survive_the_way_to_si_and_back()
    {
        foreach (Unit unit in UnitTable.All)
        {
            UnitReading reading = new(unit, unit.Dimension, UnitBasis.None, unit.Spelling, true);
            Gen.Double[1e-3, 1e6].Sample(
                value =>
                {
                    double back = UnitConverter.FromSi(UnitConverter.ToSi(value, reading, 0), reading, 0);
                    Assert.True(Math.Abs(back - value) <= 1e-15 * (value + unit.Offset), $"{unit.Spelling} {value:R}");
                },
                iter: 200);
        }
    }

    [Theory]
    [InlineData("18", "mm", "Length", 0.018)]
    [InlineData("96", "%", "Ratio", 0.96)]
    [InlineData("7.3", "mm", "Length", 0.0073)]
    [InlineData("450", "mm2", "Area", 0.00045)]
    [InlineData("29", "mm", "Length", 0.029)]
    public void Decimal_fractions_of_si_units_convert_to_the_last_bit(string number, string spelling, string dimension, double si)
    {
        Assert.True(UnitTable.TryFind(spelling, Enum.Parse<Dimension>(dimension), out UnitReading reading));
        Assert.True(NumberParser.TryParse(number, out PrintedNumber printed, out _));
        Assert.Equal(si, UnitConverter.ToSi(printed.Value, reading, 0));
    }

    [Theory]
    [InlineData(100.0, "degC", "Temperature", 373.15)]
    [InlineData(32.0, "degF", "Temperature", 273.15)]
    [InlineData(491.67, "degR", "Temperature", 273.15)]
    [InlineData(-40.0, "degF", "Temperature", 233.15)]
    [InlineData(18.0, "degF", "TemperatureDifference", 10.0)]
    [InlineData(20.0, "degC", "TemperatureDifference", 20.0)]
    [InlineData(7.0, "bar(g)", "Pressure", 801325.0)]
    [InlineData(-0.5, "barg", "Pressure", 51325.0)]
    [InlineData(10.0, "inHg(vac)", "Pressure", 67461.11359659)]
    [InlineData(4.0, "inH2O", "PressureDifference", 996.35564)]
    public void Offsets_and_bases_apply_where_they_should_only(double value, string spelling, string dimension, double si)
    {
        Assert.True(UnitTable.TryFind(spelling, Enum.Parse<Dimension>(dimension), out UnitReading reading));
        AssertClose(si, UnitConverter.ToSi(value, reading, 101325), 1e-14);
        AssertClose(value, UnitConverter.FromSi(si, reading, 101325), 1e-11);
    }

    private static Unit Row(string spelling, Dimension dimension) => UnitTable.FindRow(spelling, dimension)!;

    private static double Rational(string text)
    {
        BigInteger[] parts = [.. text.Split('/').Select(p => BigInteger.Parse(p, System.Globalization.CultureInfo.InvariantCulture))];
        return parts.Length == 1 ? (double)parts[0] : (double)parts[0] / (double)parts[1];
    }

    private static void AssertClose(double expected, double actual, double relative) =>
        Assert.True(Math.Abs(actual - expected) <= relative * Math.Abs(expected), $"expected {expected:R}, got {actual:R}");
}
