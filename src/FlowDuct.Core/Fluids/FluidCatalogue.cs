using FlowDuct.Errors;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids;

/// <summary>The fluids by the names that the command line and datasheets use.</summary>
public static class FluidCatalogue
{
    // A stand-in: the composition follows from the humidity, which is a figure of the inlet.
    private const double UntilTheInletSays = 0.01;

    private static readonly FluidName[] s_names =
    [
        new("water", "water and steam", () => Water.WaterFluid.Instance),
        new("steam", "the same as water", () => Water.WaterFluid.Instance),
        new("air", "dry air as an ideal gas", () => GasCatalogue.Air),
        new("humid-air", "air and water vapour as ideal gases; the inlet says how humid", () => GasMixture.HumidAir(UntilTheInletSays).Gas),
    ];

    /// <summary>Every accepted name with a word about the fluid; the gases follow in the order of their table.</summary>
    internal static IReadOnlyList<FluidName> Names =>
        [.. s_names, .. Nasa9Records.Words().Where(gas => gas.Name != "air").Select(OfGas)];

    /// <summary>Every word that names a fluid, formulas among them.</summary>
    internal static IEnumerable<string> Words => Names.Select(row => row.Name).Concat(Nasa9Records.Words().Select(gas => gas.Formula));

    /// <summary>
    /// Finds a fluid by name (lower case with hyphens), a gas by its formula (case-sensitive) too, a mixture of gases by its
    /// composition, such as "N2=0.72,CO2=0.13,H2O=0.15".
    /// </summary>
    /// <param name="name">The name or composition.</param>
    /// <param name="basis">What the fractions of a composition count.</param>
    /// <returns>The fluid, or null where no fluid has that name.</returns>
    /// <exception cref="FlowDuctException">A composition that is not understood.</exception>
    public static Fluid? Find(string name, FractionBasis basis = FractionBasis.Mole)
    {
        ArgumentNullException.ThrowIfNull(name);
        return Array.Find(s_names, row => row.Name == name)?.Fluid()
            ?? (GasMixtureParser.IsMixture(name) ? GasMixtureParser.Parse("--fluid", name, basis).Gas : GasCatalogue.Find(name));
    }

    private static FluidName OfGas(GasWord gas) => new(
        gas.Name, $"{gas.Formula}, as an ideal gas", () => GasCatalogue.Find(gas.Name)!);
}

/// <summary>A name of a fluid.</summary>
/// <param name="Name">As typed.</param>
/// <param name="Description">What it is.</param>
/// <param name="Fluid">Gives the fluid; built when first asked for.</param>
internal sealed record FluidName(string Name, string Description, Func<Fluid> Fluid);
