using System.Globalization;

namespace FlowDuct.Fluids.Gases;

/// <summary>Names the limit behind an outcome; runs only to speak of a failure.</summary>
internal readonly struct IdealGasRefusal(Species species, CaloricCurve curve, double R)
{
    internal RangeViolation Of(Outcome outcome, StatePair pair, double first, double second) => outcome switch
    {
        Outcome.PressureTooLow => new("p", first, IdealGasLimits.LeastPressure, false, PressureSource),
        Outcome.PressureTooHigh => new("p", first, IdealGasLimits.GreatestPressure, true, PressureSource),
        Outcome.TemperatureTooLow => new("T", second, curve.Tlow, false, TemperatureSource(false)),
        Outcome.TemperatureTooHigh => new("T", second, curve.Thigh, true, TemperatureSource(true)),
        Outcome.PairTooLow => OfPair(pair, first, second, isUpper: false),
        Outcome.PairTooHigh => OfPair(pair, first, second, isUpper: true),
        Outcome.NoSaturation => new("x", pair is StatePair.PX or StatePair.TX ? second : 0, 0, false, NoSaturationSource),
        _ => new("T", 0, 0, false, $"no limit was crossed ({outcome})"),
    };

    private const string PressureSource = "ideal-gas model, limit chosen by this program";
    private const string NoSaturationSource = "ideal-gas model: no liquid, hence no quality";

    private RangeViolation OfPair(StatePair pair, double first, double second, bool isUpper)
    {
        Reduced end = isUpper ? curve.Highest : curve.Lowest;
        double T = isUpper ? curve.Thigh : curve.Tlow;
        return pair switch
        {
            StatePair.PH => new("h", second, R * end.h, isUpper, At(isUpper)),
            StatePair.PS => new("s", second, EntropyAt(first, end), isUpper, At(isUpper) + " at this pressure"),
            StatePair.HS => OfEnthalpyAndEntropy(first, second, isUpper),
            StatePair.PRho => new("rho", second, first / (R * T), !isUpper, At(isUpper) + " at this pressure"),
            _ => new("T", second, T, isUpper, TemperatureSource(isUpper)),
        };
    }

    private RangeViolation OfEnthalpyAndEntropy(double h, double s, bool isUpper)
    {
        double reduced = h / R;
        Reduced end = isUpper ? curve.Highest : curve.Lowest;
        Outcome ofEnthalpy = IdealGasLimits.OfPair(ref reduced, curve.Lowest.h, curve.Highest.h);
        if (ofEnthalpy != Outcome.Ok || !curve.TryTemperatureFromEnthalpy(reduced, out _, out Reduced at))
            return new("h", h, R * end.h, isUpper, At(isUpper));
        double p = isUpper ? IdealGasLimits.LeastPressure : IdealGasLimits.GreatestPressure;
        string condition = string.Create(CultureInfo.InvariantCulture, $" (p = {p} Pa at this enthalpy)");
        return new("s", s, EntropyAt(p, at), isUpper, PressureSource + condition);
    }

    private double EntropyAt(double p, in Reduced at) => R * (at.s0 - Math.Log(p / IdealGas.ReferencePressure));

    private string At(bool isUpper) => string.Create(
        CultureInfo.InvariantCulture, $"{TemperatureSource(isUpper)} at {(isUpper ? curve.Thigh : curve.Tlow)} K");

    private string TemperatureSource(bool isUpper) => isUpper || curve.Tlow >= curve.FitFrom
        ? $"NASA/TP-2002-211556 (2002), record {species.ReportRecord}"
        : string.Create(
            CultureInfo.InvariantCulture,
            $"continuation of NASA/TP-2002-211556 (2002), record {species.ReportRecord}, below its {curve.FitFrom} K");
}
