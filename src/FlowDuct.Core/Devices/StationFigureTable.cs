using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;

namespace FlowDuct.Devices;

/// <summary>Reads the numbers of a <see cref="StationAnswer"/> by their key in the catalogue of quantities.</summary>
internal static class StationFigureTable
{
    /// <summary>Every number of a station, by key, in the order of the JSON answer.</summary>
    internal static readonly (string Key, Func<Fluid, StationAnswer, double?> Read)[] All =
    [
        ("p", (_, at) => at.State.p),
        ("T", (_, at) => at.State.T),
        ("x", (_, at) => at.State.HasQuality ? at.State.x : null),
        ("h", (_, at) => at.HasState ? at.State.h : null),
        ("s", (_, at) => at.HasState ? at.State.s : null),
        ("u", (_, at) => at.HasState ? at.State.u : null),
        ("rho", (_, at) => at.HasState ? at.State.rho : null),
        ("cp", (_, at) => at.State.HasIsobaricHeatCapacity ? at.State.cp : null),
        ("cv", (_, at) => at.State.HasHeatCapacities ? at.State.cv : null),
        ("w", (_, at) => at.HasState ? at.State.w : null),
        ("V", (_, at) => at.Velocity),
        ("M", (_, at) => at.Mach),
        ("A", (_, at) => at.Area),
        ("d", (_, at) => at.Diameter),
        ("n", (_, at) => at.Openings),
        ("z", (_, at) => at.Elevation),
        ("p0", (_, at) => at.Stagnation?.p),
        ("T0", (_, at) => at.Stagnation?.T),
        ("h0", (_, at) => at.StagnationEnthalpy),
        ("superheat", Superheat),
        ("kappa", (_, at) => at.HasState && at.State.w > 0 ? at.State.kappa : null),
        ("w_wet", (fluid, at) => at.HasState && fluid.TryWetSideSpeedOfSound(at.State, out double w) ? w : null),
        ("mu", (fluid, at) => TransportOf(fluid, at)?.mu),
        ("nu", (fluid, at) => TransportOf(fluid, at)?.mu * at.State.v),
        ("lambda", (fluid, at) => TransportOf(fluid, at)?.lambda),
        ("prandtl", (fluid, at) => TransportOf(fluid, at) is Transport flow ? flow.mu * at.State.cp / flow.lambda : null),
        ("sigma", (fluid, at) => at.HasState && at.State.HasQuality && fluid.TrySurfaceTension(at.State.T, out double sigma) ? sigma : null),
        ("humidity", (fluid, at) => WaterVapour(fluid) is double x ? Humidity.Relative(x, at.State.p, at.State.T) : null),
        ("dew-point", (fluid, at) => WaterVapour(fluid) is double x ? Humidity.DewPoint(x, at.State.p) : null),
        ("humidity-ratio", (fluid, _) => WaterVapour(fluid) is null ? null : Humidity.Ratio((IdealGas)fluid)),
    ];

    /// <summary>The number of a key, or null where it cannot be known.</summary>
    internal static double? Read(Fluid fluid, StationAnswer at, string key)
    {
        foreach ((string known, Func<Fluid, StationAnswer, double?> read) in All)
        {
            if (known == key) return read(fluid, at);
        }

        return null;
    }

    // Of a gas that holds water vapour, or is said to be humid.
    private static double? WaterVapour(Fluid fluid) =>
        fluid is IdealGas gas && (gas.FractionOf("H2O") > 0 || gas.Mixture is { IsHumidAir: true }) ? gas.FractionOf("H2O") : null;

    private static Transport? TransportOf(Fluid fluid, StationAnswer at) =>
        at.HasState && at.State.HasIsobaricHeatCapacity && fluid.TryTransport(at.State, out Transport transport) ? transport : null;

    private static double? Superheat(Fluid fluid, StationAnswer at) =>
        at.HasState && !at.State.HasQuality && fluid.TrySaturationTemperature(at.State.p, out double T) ? at.State.T - T : null;
}
