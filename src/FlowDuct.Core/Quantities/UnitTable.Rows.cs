namespace FlowDuct.Quantities;

/// <content>The rows: factors are expressions of exact constituents, so that a reader can check each at a glance.</content>
internal static partial class UnitTable
{
    private const double Inch = 0.0254;
    private const double Foot = 0.3048;
    private const double Mile = 1609.344;
    private const double Pound = 0.45359237;
    private const double G0 = 9.80665;
    private const double PoundForce = Pound * G0;
    private const double BtuPerPound = 2326;
    private const double Btu = BtuPerPound * Pound;
    private const double CalorieIt = 4.1868;
    private const double DegreeFahrenheit = 1 / 1.8;
    private const double Minute = 60;
    private const double Hour = 3600;
    private const double CubicFoot = Foot * Foot * Foot;
    private const double Mercury = 13595.1;
    private const double Water = 1000;

    private const string Si = "SI Brochure, 9th edition (2019)";
    private const string Sp811 = "NIST SP 811 (2008), Appendix B; constituents exact";
    private const string Head = "NIST SP 811 (2008), Appendix B; conventional column, density 13595.1 or 1000 kg/m3, g 9.80665 m/s2";
    private const string Din1343 = "DIN 1343: 0 degC, 101.325 kPa";
    private const string Iso13443 = "ISO 13443: 15 degC, 101.325 kPa";

    private const string GivenReference = "volume of NIST SP 811; its state by --reference-state";

    private static readonly Unit[] Rows =
    [
        new("1", Dimension.Ratio, 1, Si),
        new("%", Dimension.Ratio, 0.01, Si),
        new("1", Dimension.Count, 1, Si),

        new("bar", Dimension.Pressure, 1e5, Si),
        new("bara", Dimension.Pressure, 1e5, Si, basis: UnitBasis.Absolute),
        new("barg", Dimension.Pressure, 1e5, Si, basis: UnitBasis.Gauge),
        new("mbar", Dimension.Pressure, 100, Si),
        new("Pa", Dimension.Pressure, 1, Si),
        new("hPa", Dimension.Pressure, 100, Si),
        new("kPa", Dimension.Pressure, 1e3, Si),
        new("MPa", Dimension.Pressure, 1e6, Si),
        new("psi", Dimension.Pressure, PoundForce / (Inch * Inch), Sp811),
        new("psia", Dimension.Pressure, PoundForce / (Inch * Inch), Sp811, basis: UnitBasis.Absolute),
        new("psig", Dimension.Pressure, PoundForce / (Inch * Inch), Sp811, basis: UnitBasis.Gauge),
        new("ksi", Dimension.Pressure, 1000 * PoundForce / (Inch * Inch), Sp811),
        new("psf", Dimension.Pressure, PoundForce / (Foot * Foot), Sp811),
        new("atm", Dimension.Pressure, 101325, Sp811),
        new("at", Dimension.Pressure, G0 * 1e4, Sp811),
        new("kgf/cm2", Dimension.Pressure, G0 * 1e4, Sp811),
        new("Torr", Dimension.Pressure, 101325.0 / 760, Sp811),
        new("mmHg", Dimension.Pressure, Mercury * G0 / 1000, Head, basis: UnitBasis.Head),
        new("inHg", Dimension.Pressure, Mercury * G0 * Inch, Head, basis: UnitBasis.Head),
        new("mmH2O", Dimension.Pressure, Water * G0 / 1000, Head, basis: UnitBasis.Head),
        new("inH2O", Dimension.Pressure, Water * G0 * Inch, Head, basis: UnitBasis.Head),
        new("ftH2O", Dimension.Pressure, Water * G0 * Foot, Head, basis: UnitBasis.Head),

        new("K", Dimension.Temperature, 1, Si),
        new("degC", Dimension.Temperature, 1, Si, offset: 273.15),
        new("degF", Dimension.Temperature, DegreeFahrenheit, Sp811, offset: 459.67),
        new("degR", Dimension.Temperature, DegreeFahrenheit, Sp811),

        new("kJ/kg", Dimension.SpecificEnergy, 1e3, Si),
        new("J/kg", Dimension.SpecificEnergy, 1, Si),
        new("MJ/kg", Dimension.SpecificEnergy, 1e6, Si),
        new("J/g", Dimension.SpecificEnergy, 1e3, Si),
        new("Btu/lb", Dimension.SpecificEnergy, BtuPerPound, Sp811),
        new("kcal/kg", Dimension.SpecificEnergy, CalorieIt * 1e3, Sp811),
        new("cal/g", Dimension.SpecificEnergy, CalorieIt * 1e3, Sp811),
        new("ft.lbf/lb", Dimension.SpecificEnergy, Foot * G0, Sp811),
        new("m2/s2", Dimension.SpecificEnergy, 1, Si),
        new("ft2/s2", Dimension.SpecificEnergy, Foot * Foot, Sp811),

        new("kJ/(kg.K)", Dimension.SpecificEntropy, 1e3, Si),
        new("J/(kg.K)", Dimension.SpecificEntropy, 1, Si),
        new("J/(g.K)", Dimension.SpecificEntropy, 1e3, Si),
        new("Btu/(lb.degF)", Dimension.SpecificEntropy, BtuPerPound * 1.8, Sp811),
        new("Btu/(lb.degR)", Dimension.SpecificEntropy, BtuPerPound * 1.8, Sp811),
        new("kcal/(kg.K)", Dimension.SpecificEntropy, CalorieIt * 1e3, Sp811),

        new("m3/kg", Dimension.SpecificVolume, 1, Si),
        new("L/kg", Dimension.SpecificVolume, 1e-3, Si),
        new("cm3/g", Dimension.SpecificVolume, 1e-3, Si),
        new("ft3/lb", Dimension.SpecificVolume, CubicFoot / Pound, Sp811),

        new("kg/m3", Dimension.Density, 1, Si),
        new("kg/L", Dimension.Density, 1e3, Si),
        new("g/cm3", Dimension.Density, 1e3, Si),
        new("g/L", Dimension.Density, 1, Si),
        new("lb/ft3", Dimension.Density, Pound / CubicFoot, Sp811),
        new("lb/in3", Dimension.Density, Pound / (Inch * Inch * Inch), Sp811),

        new("m/s", Dimension.Velocity, 1, Si),
        new("km/s", Dimension.Velocity, 1e3, Si),
        new("mm/s", Dimension.Velocity, 1e-3, Si),
        new("m/min", Dimension.Velocity, 1 / Minute, Si),
        new("km/h", Dimension.Velocity, 1 / 3.6, Si),
        new("ft/s", Dimension.Velocity, Foot, Sp811),
        new("ft/min", Dimension.Velocity, Foot / Minute, Sp811),
        new("mph", Dimension.Velocity, Mile / Hour, Sp811),
        new("kn", Dimension.Velocity, 1852 / Hour, Si),

        new("mm", Dimension.Length, 1e-3, Si),
        new("m", Dimension.Length, 1, Si),
        new("cm", Dimension.Length, 1e-2, Si),
        new("km", Dimension.Length, 1e3, Si),
        new("um", Dimension.Length, 1e-6, Si),
        new("in", Dimension.Length, Inch, Sp811),
        new("ft", Dimension.Length, Foot, Sp811),

        new("mm2", Dimension.Area, 1e-6, Si),
        new("m2", Dimension.Area, 1, Si),
        new("cm2", Dimension.Area, 1e-4, Si),
        new("in2", Dimension.Area, Inch * Inch, Sp811),
        new("ft2", Dimension.Area, Foot * Foot, Sp811),

        new("kg/s", Dimension.MassFlow, 1, Si),
        new("kg/min", Dimension.MassFlow, 1 / Minute, Si),
        new("kg/h", Dimension.MassFlow, 1 / Hour, Si),
        new("g/s", Dimension.MassFlow, 1e-3, Si),
        new("g/min", Dimension.MassFlow, 1e-3 / Minute, Si),
        new("t/h", Dimension.MassFlow, 1e3 / Hour, Si),
        new("lb/s", Dimension.MassFlow, Pound, Sp811),
        new("lb/min", Dimension.MassFlow, Pound / Minute, Sp811),
        new("lb/h", Dimension.MassFlow, Pound / Hour, Sp811),
        new("klb/h", Dimension.MassFlow, 1e3 * Pound / Hour, Sp811),

        new("m3/s", Dimension.VolumeFlow, 1, Si),
        new("m3/min", Dimension.VolumeFlow, 1 / Minute, Si),
        new("m3/h", Dimension.VolumeFlow, 1 / Hour, Si),
        new("L/s", Dimension.VolumeFlow, 1e-3, Si),
        new("L/min", Dimension.VolumeFlow, 1e-3 / Minute, Si),
        new("ft3/s", Dimension.VolumeFlow, CubicFoot, Sp811),
        new("ft3/h", Dimension.VolumeFlow, CubicFoot / Hour, Sp811),
        new("ft3/min", Dimension.VolumeFlow, CubicFoot / Minute, Sp811),
        new("acfm", Dimension.VolumeFlow, CubicFoot / Minute, Sp811),

        new("Nm3/h", Dimension.NormalVolumeFlow, 1 / Hour, Din1343),
        new("Nm3/min", Dimension.NormalVolumeFlow, 1 / Minute, Din1343),
        new("Nm3/s", Dimension.NormalVolumeFlow, 1, Din1343),

        new("Sm3/h", Dimension.StandardVolumeFlow, 1 / Hour, Iso13443),
        new("Sm3/min", Dimension.StandardVolumeFlow, 1 / Minute, Iso13443),
        new("Sm3/s", Dimension.StandardVolumeFlow, 1, Iso13443),

        new("m3/h(ref)", Dimension.ReferenceVolumeFlow, 1 / Hour, GivenReference),
        new("m3/s(ref)", Dimension.ReferenceVolumeFlow, 1, GivenReference),
        new("NL/h", Dimension.ReferenceVolumeFlow, 1e-3 / Hour, GivenReference),
        new("NL/min", Dimension.ReferenceVolumeFlow, 1e-3 / Minute, GivenReference),
        new("NL/s", Dimension.ReferenceVolumeFlow, 1e-3, GivenReference),
        new("nlpm", Dimension.ReferenceVolumeFlow, 1e-3 / Minute, GivenReference),
        new("SL/min", Dimension.ReferenceVolumeFlow, 1e-3 / Minute, GivenReference),
        new("slpm", Dimension.ReferenceVolumeFlow, 1e-3 / Minute, GivenReference),
        new("sccm", Dimension.ReferenceVolumeFlow, 1e-6 / Minute, GivenReference),
        new("scfh", Dimension.ReferenceVolumeFlow, CubicFoot / Hour, GivenReference),
        new("scfm", Dimension.ReferenceVolumeFlow, CubicFoot / Minute, GivenReference),
        new("MMscfd", Dimension.ReferenceVolumeFlow, 1e6 * CubicFoot / (24 * Hour), GivenReference),

        new("kW", Dimension.HeatRate, 1e3, Si),
        new("W", Dimension.HeatRate, 1, Si),
        new("MW", Dimension.HeatRate, 1e6, Si),
        new("Btu/h", Dimension.HeatRate, Btu / Hour, Sp811),
        new("Btu/s", Dimension.HeatRate, Btu, Sp811),
        new("hp", Dimension.HeatRate, 550 * Foot * PoundForce, Sp811),

        new("m/s2", Dimension.Acceleration, 1, Si),
        new("ft/s2", Dimension.Acceleration, Foot, Sp811),

        new("N", Dimension.Force, 1, Si),
        new("kN", Dimension.Force, 1e3, Si),
        new("lbf", Dimension.Force, PoundForce, Sp811),
        new("kgf", Dimension.Force, G0, Sp811),

        new("deg", Dimension.Angle, Math.PI / 180, Si),
        new("rad", Dimension.Angle, 1, Si),

        new("kg/(m2.s)", Dimension.MassFlux, 1, Si),
        new("lb/(ft2.s)", Dimension.MassFlux, Pound / (Foot * Foot), Sp811),

        new("Pa.s", Dimension.DynamicViscosity, 1, Si),
        new("mPa.s", Dimension.DynamicViscosity, 1e-3, Si),
        new("uPa.s", Dimension.DynamicViscosity, 1e-6, Si),
        new("cP", Dimension.DynamicViscosity, 1e-3, Sp811),
        new("lb/(ft.s)", Dimension.DynamicViscosity, Pound / Foot, Sp811),
        new("lb/(ft.h)", Dimension.DynamicViscosity, Pound / (Foot * Hour), Sp811),

        new("m2/s", Dimension.KinematicViscosity, 1, Si),
        new("mm2/s", Dimension.KinematicViscosity, 1e-6, Si),
        new("cSt", Dimension.KinematicViscosity, 1e-6, Sp811),
        new("ft2/s", Dimension.KinematicViscosity, Foot * Foot, Sp811),

        new("W/(m.K)", Dimension.ThermalConductivity, 1, Si),
        new("mW/(m.K)", Dimension.ThermalConductivity, 1e-3, Si),
        new("Btu/(h.ft.degF)", Dimension.ThermalConductivity, Btu / (Hour * Foot * DegreeFahrenheit), Sp811),

        new("N/m", Dimension.SurfaceTension, 1, Si),
        new("mN/m", Dimension.SurfaceTension, 1e-3, Si),
        new("lbf/ft", Dimension.SurfaceTension, PoundForce / Foot, Sp811),
    ];
}
