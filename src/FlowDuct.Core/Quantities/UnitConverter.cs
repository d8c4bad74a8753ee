namespace FlowDuct.Quantities;

/// <summary>Turns numbers in a unit into SI and back. The only place where a factor is applied.</summary>
internal static class UnitConverter
{
    /// <summary>SI value of a number in a unit.</summary>
    /// <param name="value">The number.</param>
    /// <param name="unit">Its unit.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa; used for gauge and vacuum readings only.</param>
    public static double ToSi(double value, in UnitReading unit, double ambientPressure)
    {
        double si = Scale(value + OffsetOf(unit), unit.Unit);
        return unit.Basis switch
        {
            UnitBasis.Gauge => ambientPressure + si,
            UnitBasis.Vacuum => ambientPressure - si,
            _ => si,
        };
    }

    /// <summary>The number, in a unit, of an SI value.</summary>
    /// <param name="si">The SI value.</param>
    /// <param name="unit">The unit wanted.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa; used for gauge and vacuum readings only.</param>
    public static double FromSi(double si, in UnitReading unit, double ambientPressure)
    {
        double based = unit.Basis switch
        {
            UnitBasis.Gauge => si - ambientPressure,
            UnitBasis.Vacuum => ambientPressure - si,
            _ => si,
        };
        return Unscale(based, unit.Unit) - OffsetOf(unit);
    }

    /// <summary>SI size of an interval in a unit, such as a half-width: factor only.</summary>
    /// <param name="value">The interval.</param>
    /// <param name="unit">Its unit.</param>
    public static double IntervalToSi(double value, in UnitReading unit) => Scale(value, unit.Unit);

    private static double OffsetOf(in UnitReading unit) => unit.Dimension == Dimension.Temperature ? unit.Unit.Offset : 0;

    private static double Scale(double value, Unit unit)
    {
        double divisor = unit.Divisor;
        return divisor > 1 ? value / divisor : value * unit.Factor;
    }

    private static double Unscale(double si, Unit unit)
    {
        double divisor = unit.Divisor;
        return divisor > 1 ? si * divisor : si / unit.Factor;
    }
}
