using FlowDuct.Fluids.Gases;

namespace FlowDuct.Fluids;

/// <summary>The fluids by the names that the command line and datasheets use.</summary>
public static class FluidCatalogue
{
    private static readonly FluidName[] s_names =
    [
        new("water", "water and steam", () => Water.WaterFluid.Instance),
        new("steam", "the same as water", () => Water.WaterFluid.Instance),
        new("air", "dry air as an ideal gas", () => GasCatalogue.Air),
    ];

    /// <summary>Every accepted name with a word about the fluid.</summary>
    internal static IReadOnlyList<FluidName> Names => s_names;

    /// <summary>Finds a fluid by name; names are lower case with hyphens.</summary>
    /// <param name="name">The name.</param>
    /// <returns>The fluid, or null where no fluid has that name.</returns>
    public static Fluid? Find(string name) => Array.Find(s_names, row => row.Name == name)?.Fluid();
}

/// <summary>A name of a fluid.</summary>
/// <param name="Name">As typed.</param>
/// <param name="Description">What it is.</param>
/// <param name="Fluid">Gives the fluid; built when first asked for.</param>
internal sealed record FluidName(string Name, string Description, Func<Fluid> Fluid);
