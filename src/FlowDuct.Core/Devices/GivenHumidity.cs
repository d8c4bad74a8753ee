using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>How humid the air of a station is said to be: one of humidity, dew point and humidity ratio.</summary>
/// <param name="Station">The station, for messages.</param>
/// <param name="Symbol">Which of the three.</param>
/// <param name="Value">Its value, SI.</param>
internal readonly record struct GivenHumidity(Station Station, StationSymbol Symbol, double Value)
{
    // Of a pressure: a dew point typed equal to the temperature is saturated, not above.
    private const double Slack = 1e-9;

    private static readonly StationSymbol[] s_symbols = [StationSymbol.Humidity, StationSymbol.DewPoint, StationSymbol.HumidityRatio];

    /// <summary>Reads it; null where the fluid is no humid air.</summary>
    /// <exception cref="FlowDuctException">None or several for humid air, any for another fluid; kind NotUnderstood.</exception>
    internal static GivenHumidity? Read(Fluid fluid, in GivenSlots slots, Station station)
    {
        bool humid = fluid is IdealGas { Mixture.IsHumidAir: true };
        GivenSlots given = slots;
        StationSymbol[] said = Array.FindAll(s_symbols, symbol => given.Has((int)symbol));
        if (!humid) return said.Length == 0 ? null : throw HumidityRefusals.NotHumid(station, fluid, said[0]);
        return said.Length switch
        {
            0 => throw HumidityRefusals.Missing(station),
            1 => new GivenHumidity(station, said[0], slots.Value((int)said[0])),
            _ => throw HumidityRefusals.Several(station, said),
        };
    }

    /// <summary>
    /// Mole fraction of the vapour where the static state is p, Pa, and T, K; 1 where the vapour alone would have more than p, or where
    /// nothing saturates it: a state on the way to one that has an answer.
    /// </summary>
    internal double FractionAt(double p, double T) => Symbol switch
    {
        StationSymbol.HumidityRatio => Humidity.FractionFromRatio(Value),
        StationSymbol.DewPoint => Math.Min(1, Saturation(Value) / p),
        _ when Value == 0 => 0,
        _ => T < WaterConstants.Tc ? Math.Min(1, Value * VapourSaturation.Pressure(T) / p) : 1,
    };

    /// <summary>Refuses a static state that cannot hold the vapour.</summary>
    /// <exception cref="FlowDuctException">More vapour than saturation, or than the static pressure allows; kind NoAnswer.</exception>
    internal void Require(double x, double p, double T)
    {
        if (Symbol == StationSymbol.Humidity && Value > 0) Saturation(T);
        if (x >= 1) throw HumidityRefusals.NoAirLeft(this, p, T);
        if (T < WaterConstants.Tc && x * p > VapourSaturation.Pressure(T) * (1 + Slack))
            throw HumidityRefusals.AboveSaturation(this, x * p, p, T);
    }

    // Above the critical temperature vapour and liquid are one: there is nothing to be saturated with.
    private double Saturation(double T) => T is >= VapourSaturation.LeastTemperature and < WaterConstants.Tc
        ? VapourSaturation.Pressure(T)
        : throw HumidityRefusals.NoSaturation(this, T);
}
