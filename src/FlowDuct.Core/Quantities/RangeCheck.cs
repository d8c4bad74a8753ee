using FlowDuct.Errors;

namespace FlowDuct.Quantities;

/// <summary>Refuses a value outside the range that its quantity has by nature, in the unit that was typed.</summary>
internal static class RangeCheck
{
    private const int LimitDigits = 6;

    /// <summary>Throws where the value is outside the limits of its row.</summary>
    /// <param name="context">Where the value stands.</param>
    /// <param name="given">The value.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa.</param>
    /// <exception cref="FlowDuctException">The value is outside; kind NotUnderstood.</exception>
    public static void Require(in ValueContext context, in GivenValue given, double ambientPressure)
    {
        if (!double.IsFinite(given.Si))
            throw context.Refuse($"{context.Named(given.Text)} is too large");
        if (!context.Row.Limits.Contains(given.Si))
            throw Outside(context, given, ambientPressure);
        if (context.Row.Dimension == Dimension.Count && given.Si != Math.Floor(given.Si))
            throw context.Refuse($"{context.Named(given.Text)} is not a whole number");
    }

    private static FlowDuctException Outside(in ValueContext context, in GivenValue given, double ambientPressure)
    {
        QuantityLimits limits = context.Row.Limits;
        string named = context.Named(given.Text);
        if (context.Row.Dimension == Dimension.Pressure)
            return context.Refuse(VacuumReason(named, given, ambientPressure));
        string least = double.IsFinite(limits.Least) ? Limit(limits.Least, given, ambientPressure) : string.Empty;
        string reason = (context.Row.Dimension, double.IsFinite(limits.Least), double.IsFinite(limits.Greatest)) switch
        {
            (Dimension.Temperature, _, _) => $"{named} is not above absolute zero, {least}",
            (_, true, true) => $"{named} is outside {Range(limits, given, ambientPressure)}",
            (_, true, false) => limits.IncludesLeast ? $"{named} is below {least}" : $"{named} is not above {least}",
            _ => $"{named} is above {Limit(limits.Greatest, given, ambientPressure)}",
        };
        return context.Refuse(reason);
    }

    private static string VacuumReason(string named, in GivenValue given, double ambientPressure)
    {
        string zero = Limit(0, given, ambientPressure);
        string ambient = $"(ambient pressure {NumberFormatter.Shortest(ambientPressure / 1e5, LimitDigits)} bar)";
        return given.Unit.Basis switch
        {
            UnitBasis.Gauge => $"{named} is not above perfect vacuum, {zero} {ambient}",
            UnitBasis.Vacuum => $"{named} is not short of perfect vacuum, {zero} {ambient}",
            _ when given.Si < 0 => $"{named} is not above 0: a bare unit is absolute; for gauge write {GaugeForm(given)}",
            _ => $"{named} is not above 0",
        };
    }

    private static string GaugeForm(in GivenValue given) =>
        given.Unit.BasisIsWritten ? "its unit with (g)" : given.Unit.Unit.Spelling + "(g)";

    private static string Range(QuantityLimits limits, in GivenValue given, double ambientPressure)
    {
        string least = NumberFormatter.Shortest(UnitConverter.FromSi(limits.Least, given.Unit, ambientPressure), LimitDigits);
        string greatest = Limit(limits.Greatest, given, ambientPressure);
        return limits.IncludesLeast || given.Si != limits.Least ? $"{least} to {greatest}" : $"{least} (excluded) to {greatest}";
    }

    private static string Limit(double si, in GivenValue given, double ambientPressure)
    {
        string number = NumberFormatter.Shortest(UnitConverter.FromSi(si, given.Unit, ambientPressure), LimitDigits);
        return given.Unit.Spelling == "1" ? number : $"{number} {given.Unit.Spelling}";
    }
}
