namespace FlowDuct.Fluids.Gases;

/// <summary>Entropy of mixing of ideal gases over the gas constant: -sum x ln x over the gases that can be told apart.</summary>
internal static class MixingEntropy
{
    // Mole fractions in the record "Air", as its comment prints them, NASA/TP-2002-211556 (2002); its entropy holds their mixing.
    private static ReadOnlySpan<double> AirFractions => [0.78084, 0.209476, 0.009365, 0.000319];

    /// <summary>Of a mixture of these gases, beyond what the entropies of its components hold.</summary>
    internal static double Of(IReadOnlyList<GasComponent> components)
    {
        double sum = 0;
        foreach (GasComponent gas in components)
            sum -= XLnX(gas.x);
        return sum + SharedWithAir(components);
    }

    // Nitrogen beside air is not told apart from the nitrogen in it: both count as one gas.
    private static double SharedWithAir(IReadOnlyList<GasComponent> components)
    {
        double air = FractionOf(components, "Air");
        if (air == 0)
            return 0;
        double change = 0;
        for (int i = 0; i < AirFractions.Length; i++)
        {
            double inAir = air * AirFractions[i];
            double beside = FractionOf(components, FormulaInAir(i));
            if (beside > 0)
                change += XLnX(inAir) + XLnX(beside) - XLnX(inAir + beside);
        }

        return change;
    }

    private static string FormulaInAir(int i) => i switch { 0 => "N2", 1 => "O2", 2 => "Ar", _ => "CO2" };

    private static double FractionOf(IReadOnlyList<GasComponent> components, string formula) =>
        components.FirstOrDefault(gas => gas.Species.Formula == formula)?.x ?? 0;

    private static double XLnX(double x) => x * Math.Log(x);
}
