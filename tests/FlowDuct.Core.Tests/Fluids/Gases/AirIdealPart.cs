using System.Globalization;
using FlowDuct.Core.Tests.Support;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>
/// The ideal-gas part of the air equation of Lemmon, Jacobsen, Penoncello and Friend, J. Phys. Chem. Ref. Data 29 (2000) 331,
/// as a referee: an origin of its own (spectroscopic heat capacities), no NASA polynomial in it.
/// </summary>
internal static class AirIdealPart
{
    private const double ReducingTemperature = 132.6312;

    private static readonly Term[] Terms = [.. ReferenceTable.Read("gas/air_ideal_part_jpcrd2000.csv").Select(Term.From)];

    /// <summary>cp/R.</summary>
    internal static double Cp(double T) => 1 - (Tau(T) * Tau(T) * Terms.Sum(term => term.Second(Tau(T))));

    /// <summary>h/R, K.</summary>
    internal static double H(double T) => T * (1 + (Tau(T) * Terms.Sum(term => term.First(Tau(T)))));

    /// <summary>s/R at constant pressure, up to a constant.</summary>
    internal static double S(double T) =>
        (Tau(T) * Terms.Sum(term => term.First(Tau(T)))) - Terms.Sum(term => term.Value(Tau(T))) + Math.Log(T);

    private static double Tau(double T) => ReducingTemperature / T;

    private sealed record Term(string Form, double N, double Exponent, double C, double D)
    {
        internal static Term From(IReadOnlyDictionary<string, string> row)
        {
            bool general = row["form"] == "planck_einstein_general";
            double t = Number(row["t"]);
            return row["form"] == "planck_einstein"
                ? new Term("exponential", Number(row["n"]), -t, 1, -1)
                : new Term(general ? "exponential" : row["form"], Number(row["n"]), t, Number(row["c"]), Number(row["d"]));
        }

        internal double Value(double tau) => Form switch
        {
            "power" => N * Math.Pow(tau, Exponent),
            "log_tau" => N * Math.Log(tau),
            _ => N * Math.Log(C + (D * Math.Exp(Exponent * tau))),
        };

        internal double First(double tau) => Form switch
        {
            "power" => N * Exponent * Math.Pow(tau, Exponent - 1),
            "log_tau" => N / tau,
            _ => N * Exponent * Share(tau),
        };

        internal double Second(double tau) => Form switch
        {
            "power" => N * Exponent * (Exponent - 1) * Math.Pow(tau, Exponent - 2),
            "log_tau" => -N / (tau * tau),
            _ => N * Exponent * Exponent * Share(tau) * (1 - Share(tau)),
        };

        private double Share(double tau) => D * Math.Exp(Exponent * tau) / (C + (D * Math.Exp(Exponent * tau)));

        private static double Number(string text) =>
            text.Length == 0 ? 0 : double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
    }
}
