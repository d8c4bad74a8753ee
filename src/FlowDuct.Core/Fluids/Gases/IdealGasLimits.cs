using System.Globalization;

namespace FlowDuct.Fluids.Gases;

/// <summary>The range of the ideal-gas model as code. Comparisons are written so that a NaN fails them.</summary>
internal static class IdealGasLimits
{
    /// <summary>Least pressure, Pa. A limit of this program: an ideal gas has none, yet brackets need a positive floor.</summary>
    internal const double LeastPressure = 1;

    /// <summary>Greatest pressure, Pa. A limit of this program: an ideal gas has none; no real gas is one long before this.</summary>
    internal const double GreatestPressure = 1e9;

    // Relative; h / R and p from exp(ln p) come back within a few units of the last place, times ln p.
    private const double RoundingSlack = 1e-13;

    internal static string RangeText(CaloricCurve curve) => string.Create(
        CultureInfo.InvariantCulture,
        $"{curve.Tlow} K to {curve.Thigh} K, {LeastPressure} Pa to 1 GPa{Continued(curve)}");

    internal static Outcome OfPressure(double p) =>
        !(p >= LeastPressure) ? Outcome.PressureTooLow
        : p > GreatestPressure ? Outcome.PressureTooHigh
        : Outcome.Ok;

    internal static Outcome OfTemperature(double T, CaloricCurve curve) =>
        !(T >= curve.Tlow) ? Outcome.TemperatureTooLow
        : T > curve.Thigh ? Outcome.TemperatureTooHigh
        : Outcome.Ok;

    /// <summary>
    /// Where the temperature that belongs to a pair lies, seen through a quantity that rises with it. A value that passes an end
    /// by rounding alone is put on the end, so that the states at the ends survive a round trip.
    /// </summary>
    internal static Outcome OfPair(ref double value, double least, double greatest)
    {
        if (!(value >= least * (1 - RoundingSlack)))
            return Outcome.PairTooLow;
        if (value > greatest * (1 + RoundingSlack))
            return Outcome.PairTooHigh;
        value = Math.Clamp(value, least, greatest);
        return Outcome.Ok;
    }

    /// <summary>(h,s): the pressure falls as the entropy rises.</summary>
    internal static Outcome OfEntropyByPressure(ref double p) => OfPair(ref p, LeastPressure, GreatestPressure) switch
    {
        Outcome.PairTooLow => Outcome.PairTooHigh,
        Outcome.PairTooHigh => Outcome.PairTooLow,
        Outcome other => other,
    };

    private static string Continued(CaloricCurve curve) => curve.Tlow < curve.FitFrom
        ? string.Create(CultureInfo.InvariantCulture, $"; below {curve.FitFrom} K the heat capacity keeps its {curve.FitFrom} K value")
        : string.Empty;
}
