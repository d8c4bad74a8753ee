using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The ideal gas is a poor stand-in for the real one at a station.</summary>
internal static class RealGas
{
    // What the other figures of a nozzle are known to: common practice.
    private const double Limit = 0.01;
    private const string Standing = "estimate by C. Tsonopoulos, AIChE J. 20 (1974) 263";

    // Below this compressibility factor the series of one term stands for no gas.
    private const double LeastFactor = 0.5;

    // What a message will need is set aside where its method begins, so that method begins only for a gas.
    internal static Finding? Check(Fluid fluid, IStations stations) => fluid is IdealGas { Virial: SecondVirial virial } gas ? OfGas(virial, gas, stations) : null;

    private static Finding? OfGas(SecondVirial virial, IdealGas gas, IStations stations)
    {
        double M = gas.MolarMass / 1000;
        RealGasEstimate estimate = Worst(virial, M, stations, out FluidState at);
        double? flux = FluxDeviation(virial, M, gas, stations);
        double worst = Math.Max(estimate.Worst, Math.Abs(flux ?? 0));
        return worst <= Limit && !estimate.SeriesFails ? null : new Finding("real-gas", Severity.Caution, worst, Limit, Standing, text =>
            $"{gas.Name} is taken as an ideal gas; at {text.Text(at.p, Dimension.Pressure, 4)}, {text.Text(at.T, Dimension.Temperature, 4)} {Words(estimate, flux)}");
    }

    // A state beyond the estimate is worse than any within it.
    private static RealGasEstimate Worst(SecondVirial virial, double M, IStations stations, out FluidState at)
    {
        (RealGasEstimate worst, at) = (default, default);
        foreach (StationAnswer station in stations.Known)
        {
            RealGasEstimate estimate = RealGasEstimate.Of(virial, M, station.State);
            bool first = at.Phase == Phase.None, worse = estimate.SeriesFails == worst.SeriesFails ? estimate.Worst > worst.Worst : estimate.SeriesFails;
            if (first || worse) (worst, at) = (estimate, station.State);
        }

        return worst;
    }

    // Of a nozzle that has a critical pressure, whether it chokes or not.
    private static double? FluxDeviation(SecondVirial virial, double M, IdealGas gas, IStations stations) =>
        stations is DeviceAnswer { Performance.CriticalPressureRatio: double ratio, Inlet.Stagnation: FluidState rest }
        && gas.FromPS(ratio * rest.p, rest.s, default, out FluidState throat) == Outcome.Ok
            ? RealGasEstimate.CriticalFluxDeviation(virial, M, rest, throat)
            : null;

    private static string Words(in RealGasEstimate estimate, double? flux)
    {
        if (estimate.Z < LeastFactor) return "it is near condensation or already liquid, and these figures are none of its own";
        string choked = flux is double f ? $", choked flux {Percent(f)}" : string.Empty;
        string beyond = estimate.SeriesFails ? "; the pressure is too high for this estimate to be trusted" : string.Empty;
        return $"its compressibility factor is about {NumberFormatter.Significant(estimate.Z, 3)}: density {Percent(estimate.DensityDeviation)}, speed of sound {Percent(estimate.SoundDeviation)}{choked}{beyond}";
    }

    private static string Percent(double deviation) => $"{(deviation < 0 ? string.Empty : "+")}{NumberFormatter.Significant(100 * deviation, 2)} %";
}
