using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Fluids;

/// <summary>Normal and standard volumes: amounts of ideal gas, told as the volume that they fill at a reference state.</summary>
internal static class ReferenceVolume
{
    private const double Pressure = 101325;

    /// <summary>Mass of a normal (0 degC, DIN 1343) or standard (15 degC, ISO 13443) cubic metre, kg/m3; null where the fluid is no gas. A real gas is counted as the ideal one of its molar mass.</summary>
    internal static double? Density(Fluid fluid, Dimension flow)
    {
        double T = flow == Dimension.NormalVolumeFlow ? 273.15 : 288.15;
        if (fluid is HelmholtzFluid real) return Pressure * real.Equation.Parameters.M / (IdealGas.MolarGasConstant * T);
        return !fluid.HasSaturation && fluid.FromPT(Pressure, T, out FluidState reference) == Outcome.Ok ? reference.rho : null;
    }
}
