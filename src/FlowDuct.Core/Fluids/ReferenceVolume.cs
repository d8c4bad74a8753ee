using FlowDuct.Quantities;

namespace FlowDuct.Fluids;

/// <summary>Normal and standard volumes: amounts of ideal gas, told as the volume that they fill at a reference state.</summary>
internal static class ReferenceVolume
{
    private const double Pressure = 101325;

    /// <summary>Mass of a normal (0 degC, DIN 1343) or standard (15 degC, ISO 13443) cubic metre, kg/m3; null where the fluid is no ideal gas.</summary>
    internal static double? Density(Fluid fluid, Dimension flow)
    {
        double T = flow == Dimension.NormalVolumeFlow ? 273.15 : 288.15;
        return !fluid.HasSaturation && fluid.FromPT(Pressure, T, out FluidState reference) == Outcome.Ok ? reference.rho : null;
    }
}
