namespace FlowDuct.Fluids.Gases;

/// <summary>The range of a reference equation of state as code. Comparisons are written so that a NaN fails them.</summary>
internal static class HelmholtzRange
{
    /// <summary>Least pressure, Pa. A limit of this program: the equations have none, yet brackets need a positive floor.</summary>
    internal const double LeastPressure = 1;

    // What a given pair may pass an end of the range by, relative: rounding.
    private const double Rounding = 1e-12;

    internal static Outcome OfPressure(HelmholtzEquation of, double p) =>
        !(p >= LeastPressure) ? Outcome.PressureTooLow
        : !(p <= of.Parameters.pMost) ? Outcome.PressureTooHigh
        : Outcome.Ok;

    /// <summary>Least temperature, K, at p, Pa: the triple point or, above its pressure, the melting line.</summary>
    internal static double LeastTemperature(HelmholtzEquation of, double p) => Math.Max(of.Parameters.Tleast, of.Melting.Temperature(p));

    internal static Outcome Check(HelmholtzEquation of, double p, double T)
    {
        Outcome outcome = OfPressure(of, p);
        if (outcome != Outcome.Ok) return outcome;
        if (!(T <= of.Parameters.Tmost * (1 + Rounding))) return Outcome.TemperatureTooHigh;
        return T >= LeastTemperature(of, p) * (1 - Rounding) ? Outcome.Ok : Outcome.TemperatureTooLow;
    }
}
