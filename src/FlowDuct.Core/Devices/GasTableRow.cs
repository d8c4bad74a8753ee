using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>One row of an ideal-gas table as handbooks print it: what hangs on temperature alone.</summary>
/// <param name="T">Temperature, K.</param>
/// <param name="h">Specific enthalpy, J/kg, zero at 0 K.</param>
/// <param name="u">Specific internal energy, J/kg, zero at 0 K.</param>
/// <param name="s0">Specific entropy at 1 bar, J/(kg.K).</param>
/// <param name="p_r">Relative pressure: along an isentrope pressures are as these.</param>
/// <param name="v_r">Relative volume: along an isentrope volumes are as these.</param>
internal readonly record struct GasTableRow(double T, double h, double u, double s0, double p_r, double v_r)
{
    /// <summary>Temperature, K, at which the scale of p_r is fixed.</summary>
    internal const double ScaleTemperature = 300;

    /// <summary>p_r at that temperature: the value of the usual air table (common practice), here for every gas.</summary>
    internal const double ScalePressure = 1.3860;

    /// <summary>v_r is this times T, K, over p_r; the usual air table (common practice).</summary>
    internal const double VolumePerKelvin = 2.87;

    /// <summary>v_r is this times T, degR, over p_r; the usual air table in US units (common practice).</summary>
    internal const double VolumePerRankine = 0.3704;

    /// <summary>The row of a state at the pressure of s0; <paramref name="scale"/> is that at the temperature of the scale.</summary>
    internal static GasTableRow Of(IdealGas gas, in FluidState at, in FluidState scale, UnitSystem system)
    {
        double pressure = ScalePressure * Math.Exp((at.s - scale.s) / gas.R);
        double volume = (system == UnitSystem.Us ? VolumePerRankine * 1.8 : VolumePerKelvin) * at.T / pressure;
        return new GasTableRow(at.T, at.h, at.u, at.s, pressure, volume);
    }
}
