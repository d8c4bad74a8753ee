using FlowDuct.Flow;
using FlowDuct.Fluids.Water;

namespace FlowDuct.Fluids.Gases;

/// <summary>Saturation of pure water vapour: over liquid from the triple point up, over ice below it, 50 K to the critical temperature.</summary>
/// <remarks>IAPWS R7-97(2012), Eqs. (30) and (31), and R14-08(2011), Eq. (6). At 273.16 K both have 611.657 Pa, to 2e-11 of it.</remarks>
internal static class VapourSaturation
{
    /// <summary>Least temperature, K, of the sublimation line.</summary>
    internal const double LeastTemperature = 50;

    /// <summary>Saturation pressure, Pa, at T, K, below the critical temperature.</summary>
    internal static double Pressure(double T) => T < WaterConstants.Tt ? IceLine.SublimationPressure(T) : SaturationLine.Pressure(T);

    /// <summary>Dew point, below 273.16 K frost point, K, of a partial pressure, Pa; false where there is none in the range.</summary>
    internal static bool TryTemperature(double partial, out double T)
    {
        T = 0;
        if (!(partial >= IceLine.SublimationPressure(LeastTemperature) && partial <= WaterConstants.pc))
            return false;
        T = partial >= SaturationLine.Pressure(WaterConstants.Tt) ? SaturationLine.Temperature(partial) : FrostPoint(partial);
        return true;
    }

    // Seen through logarithms the sublimation line is all but straight in 1/T.
    private static double FrostPoint(double partial)
    {
        double wanted = Math.Log(partial), atTop = Miss(WaterConstants.Tt);
        return atTop <= 0 ? WaterConstants.Tt : RootFinder.Find(Miss, LeastTemperature, WaterConstants.Tt, Miss(LeastTemperature), atTop);

        double Miss(double at) => Math.Log(IceLine.SublimationPressure(at)) - wanted;
    }
}
