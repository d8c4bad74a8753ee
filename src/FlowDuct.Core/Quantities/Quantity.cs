using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace FlowDuct.Quantities;

/// <summary>A value of one kind of quantity, in coherent SI: finite, and above the least value of its kind.</summary>
/// <typeparam name="TDimension">The kind, such as <see cref="AbsolutePressure"/>; kinds never mix.</typeparam>
/// <remarks>The default value means "never set": reading it throws, so that a forgotten figure cannot pass as zero.</remarks>
public readonly record struct Quantity<TDimension>
    where TDimension : struct, IDimensionMarker
{
    private readonly double si;
    private readonly bool isSet;

    private Quantity(double si)
    {
        this.si = si;
        isSet = true;
    }

    /// <summary>The value in the coherent SI unit that <see cref="IDimensionMarker.SiUnit"/> names.</summary>
    /// <exception cref="InvalidOperationException">The quantity was never set.</exception>
    public double Si => isSet ? si : throw new InvalidOperationException($"The {TDimension.Name} was never set.");

    /// <summary>True where a value was set.</summary>
    public bool IsSet => isSet;

    /// <summary>Makes a quantity from its value in coherent SI.</summary>
    /// <param name="si">The value, in <see cref="IDimensionMarker.SiUnit"/>; finite, in range.</param>
    /// <returns>The quantity.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite, or is outside the range of its kind.</exception>
    [SuppressMessage(
        "Design",
        "CA1000:Do not declare static members on generic types",
        Justification = "The factory belongs to the kind: Quantity<Velocity>.FromSi(25) says what it makes.")]
    public static Quantity<TDimension> FromSi(double si)
    {
        bool isAbove = TDimension.LeastIsInclusive ? si >= TDimension.Least : si > TDimension.Least;
        if (double.IsFinite(si) && isAbove)
            return new Quantity<TDimension>(si == 0 ? 0 : si);
        throw new ArgumentOutOfRangeException(nameof(si), si, RangeText());
    }

    /// <summary>The value with its SI unit, in shortest round-trip form; "not set" for the default.</summary>
    /// <returns>ASCII text, the same under every locale.</returns>
    public override string ToString() =>
        isSet ? string.Create(CultureInfo.InvariantCulture, $"{si} {TDimension.SiUnit}") : "not set";

    private static string RangeText()
    {
        if (double.IsNegativeInfinity(TDimension.Least))
            return $"The {TDimension.Name} must be finite.";
        string relation = TDimension.LeastIsInclusive ? "not below" : "above";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"The {TDimension.Name} must be finite and {relation} {TDimension.Least} {TDimension.SiUnit}.");
    }
}
