namespace FlowDuct.Fluids.Gases;

/// <summary>The gases that have a published reference equation of state here, each built when first asked for.</summary>
public static class ReferenceEquations
{
    private static readonly Lazy<HelmholtzFluid> s_air = new(() => new HelmholtzFluid(
        "air", "Air", "Lemmon, Jacobsen, Penoncello, Friend (2000)", "J. Phys. Chem. Ref. Data 29 (2000) 331", new AirBoundary(new AirEquation())));

    private static readonly Lazy<HelmholtzFluid> s_nitrogen = new(() => new HelmholtzFluid(
        "nitrogen", "N2", "Span, Lemmon, Jacobsen, Wagner, Yokozeki (2000)", "J. Phys. Chem. Ref. Data 29 (2000) 1361", new SaturatedBoundary(new NitrogenEquation())));

    private static readonly Lazy<HelmholtzFluid> s_carbonDioxide = new(() => new HelmholtzFluid(
        "carbon-dioxide", "CO2", "Span, Wagner (1996)", "J. Phys. Chem. Ref. Data 25 (1996) 1509", new SaturatedBoundary(new CarbonDioxideEquation())));

    /// <summary>Dry air, J. Phys. Chem. Ref. Data 29 (2000) 331.</summary>
    public static HelmholtzFluid Air => s_air.Value;

    /// <summary>Nitrogen, J. Phys. Chem. Ref. Data 29 (2000) 1361.</summary>
    public static HelmholtzFluid Nitrogen => s_nitrogen.Value;

    /// <summary>Carbon dioxide, J. Phys. Chem. Ref. Data 25 (1996) 1509.</summary>
    public static HelmholtzFluid CarbonDioxide => s_carbonDioxide.Value;

    /// <summary>The names of the gases that have one.</summary>
    internal static IReadOnlyList<string> Names { get; } = ["air", "nitrogen", "carbon-dioxide"];

    /// <summary>Finds the equation of a gas by name or formula, both case-sensitive; null where it has none.</summary>
    /// <param name="word">The name or formula.</param>
    /// <returns>The fluid, or null.</returns>
    public static HelmholtzFluid? Find(string word) => word switch
    {
        "air" or "Air" => Air,
        "nitrogen" or "N2" => Nitrogen,
        "carbon-dioxide" or "CO2" => CarbonDioxide,
        _ => null,
    };
}
