using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Which part of a humid gas its reference volume counts.</summary>
internal enum GasMoisture
{
    /// <summary>Not said: all of it.</summary>
    Unsaid,

    /// <summary>The gas without its water vapour.</summary>
    Dry,

    /// <summary>All of it.</summary>
    Wet,
}

/// <summary>A flow that was given as a volume of ideal gas at a reference state.</summary>
/// <param name="Typed">The flow as typed.</param>
/// <param name="Dimension">Normal, standard, or at a reference state that was given.</param>
/// <param name="Volume">The volume flow at the reference state, m3/s.</param>
/// <param name="p">Reference pressure, Pa.</param>
/// <param name="T">Reference temperature, K.</param>
/// <param name="Moisture">What it counts of a humid gas.</param>
internal sealed record FlowReference(string Typed, Dimension Dimension, double Volume, double p, double T, GasMoisture Moisture)
{
    /// <summary>Where the reference state comes from.</summary>
    internal string Source => Dimension switch
    {
        Dimension.NormalVolumeFlow => "DIN 1343",
        Dimension.StandardVolumeFlow => "ISO 13443",
        _ => "given",
    };

    /// <summary>True where the reference state was given, false where the unit says it.</summary>
    internal bool IsGiven => Dimension == Dimension.ReferenceVolumeFlow;

    /// <summary>Mass of all the gas that goes with a reference volume, kg/m3; null where the fluid is no ideal gas.</summary>
    internal double? MassPerVolume(Fluid fluid) =>
        ReferenceVolume.Density(fluid, p, T) / (Moisture == GasMoisture.Dry ? 1 - WaterVapour(fluid) : 1);

    /// <summary>Mole fraction of the water vapour in a gas.</summary>
    internal static double WaterVapour(Fluid fluid) => (fluid as IdealGas)?.FractionOf("H2O") ?? 0;
}
