using FlowDuct.Fluids.Water;

namespace FlowDuct.Fluids.Gases;

/// <summary>How much water vapour a gas holds: mole fraction against relative humidity, dew point and humidity ratio.</summary>
/// <remarks>
/// The vapour is taken as alone: its partial pressure is x p, and it is saturated where that reaches the saturation pressure of pure water.
/// In air the saturated vapour holds a little more, by the enhancement factor, 1.004 to 1.005 at atmospheric pressure (common practice): it is left out.
/// </remarks>
internal static class Humidity
{
    /// <summary>Relative humidity, partial over saturation pressure; null at and above the critical temperature, where there is none.</summary>
    internal static double? Relative(double x, double p, double T) => T < WaterConstants.Tc ? x * p / VapourSaturation.Pressure(T) : null;

    /// <summary>Dew point, below 273.16 K frost point, K, at a pressure, Pa; null of a gas too dry to have one.</summary>
    internal static double? DewPoint(double x, double p) => VapourSaturation.TryTemperature(x * p, out double T) ? T : null;

    /// <summary>Mass of water vapour over mass of the other gases; null where there are none.</summary>
    internal static double? Ratio(IdealGas gas)
    {
        double water = gas.FractionOf("H2O") * GasMixture.Water.MolarMass;
        return water < gas.MolarMass ? water / (gas.MolarMass - water) : null;
    }

    /// <summary>Mole fraction of the vapour in air from its mass per mass of dry air.</summary>
    internal static double FractionFromRatio(double ratio)
    {
        double moles = ratio / GasMixture.Water.MolarMass;
        return moles / (moles + (1 / GasMixture.DryAir.MolarMass));
    }
}
