namespace FlowDuct.Quantities;

/// <summary>Steps between the kinds of pressure and of temperature.</summary>
public static class QuantityExtensions
{
    /// <summary>The absolute pressure of a gauge reading.</summary>
    /// <param name="reading">The reading, Pa above ambient; may be negative down to minus the ambient pressure.</param>
    /// <param name="ambient">The absolute pressure around the gauge, Pa.</param>
    /// <returns>Reading plus ambient, Pa.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The sum is not above zero: no pressure is below a perfect vacuum.</exception>
    /// <exception cref="InvalidOperationException">One of the two was never set.</exception>
    public static Quantity<AbsolutePressure> ToAbsolute(this Quantity<GaugePressure> reading, Quantity<AbsolutePressure> ambient) =>
        Quantity<AbsolutePressure>.FromSi(ambient.Si + reading.Si);

    /// <summary>The gauge reading of an absolute pressure.</summary>
    /// <param name="pressure">The absolute pressure, Pa.</param>
    /// <param name="ambient">The absolute pressure around the gauge, Pa.</param>
    /// <returns>Pressure minus ambient, Pa; negative below ambient.</returns>
    /// <exception cref="InvalidOperationException">One of the two was never set.</exception>
    public static Quantity<GaugePressure> ToGauge(this Quantity<AbsolutePressure> pressure, Quantity<AbsolutePressure> ambient) =>
        Quantity<GaugePressure>.FromSi(pressure.Si - ambient.Si);

    /// <summary>The difference of two pressures.</summary>
    /// <param name="pressure">The pressure, Pa.</param>
    /// <param name="other">The pressure that is taken off, Pa.</param>
    /// <returns>Pressure minus other, Pa; any sign.</returns>
    /// <exception cref="InvalidOperationException">One of the two was never set.</exception>
    public static Quantity<PressureDifference> Minus(this Quantity<AbsolutePressure> pressure, Quantity<AbsolutePressure> other) =>
        Quantity<PressureDifference>.FromSi(pressure.Si - other.Si);

    /// <summary>The difference of two temperatures.</summary>
    /// <param name="temperature">The temperature, K.</param>
    /// <param name="other">The temperature that is taken off, K.</param>
    /// <returns>Temperature minus other, K; any sign.</returns>
    /// <exception cref="InvalidOperationException">One of the two was never set.</exception>
    public static Quantity<TemperatureDifference> Minus(
        this Quantity<ThermodynamicTemperature> temperature, Quantity<ThermodynamicTemperature> other) =>
        Quantity<TemperatureDifference>.FromSi(temperature.Si - other.Si);
}
