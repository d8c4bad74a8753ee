using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Fluids;

/// <summary>Normal, standard and other reference volumes: amounts of ideal gas, told as the volume that they fill at a reference state.</summary>
internal static class ReferenceVolume
{
    /// <summary>Pressure of normal and standard volumes, Pa (DIN 1343, ISO 13443).</summary>
    internal const double Pressure = 101325;

    /// <summary>Temperature of normal volumes, K (DIN 1343).</summary>
    internal const double NormalTemperature = 273.15;

    /// <summary>Temperature of standard volumes, K (ISO 13443).</summary>
    internal const double StandardTemperature = 288.15;

    /// <summary>Mass of a normal (0 degC, DIN 1343) or standard (15 degC, ISO 13443) cubic metre, kg/m3; null where the fluid is no ideal gas.</summary>
    internal static double? Density(Fluid fluid, Dimension flow) =>
        Density(fluid, Pressure, flow == Dimension.NormalVolumeFlow ? NormalTemperature : StandardTemperature);

    /// <summary>Mass of a cubic metre of ideal gas at p, Pa, and T, K; kg/m3; null where the fluid is no gas. A real gas is counted as the ideal one of its molar mass.</summary>
    internal static double? Density(Fluid fluid, double p, double T) => fluid switch
    {
        IdealGas gas => p / (gas.R * T),
        HelmholtzFluid real => p * real.Equation.Parameters.M / (IdealGas.MolarGasConstant * T),
        _ => null,
    };
}
