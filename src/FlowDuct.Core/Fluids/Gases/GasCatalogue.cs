using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids.Gases;

/// <summary>The ideal gases by name and formula, each built when first asked for: start-up pays for none of the others.</summary>
public static class GasCatalogue
{
    /// <summary>Dry air, the record "Air" of NASA/TP-2002-211556 (2002).</summary>
    public static IdealGas Air { get; } = new(Nasa9Records.Air());

    /// <summary>Every gas of the catalogue, in the order of gas_names.csv.</summary>
    public static IReadOnlyList<IdealGas> All => [.. Nasa9Records.Words().Select(gas => Find(gas.Name)!)];

    /// <summary>Finds a gas by name (nitrogen) or formula (N2); both are case-sensitive.</summary>
    /// <param name="word">The name or formula.</param>
    /// <returns>The same gas at every call, or null where no gas has that word.</returns>
    public static IdealGas? Find(string word)
    {
        ArgumentNullException.ThrowIfNull(word);
        if (word is "air" or "Air")
            return Air;
        return Nasa9Records.Find(word) is Species species ? Built.Of(species) : null;
    }

    // A class of its own, so that water and air never make the dictionary.
    private static class Built
    {
        private static readonly Dictionary<string, IdealGas> s_gases = [];

        internal static IdealGas Of(Species species)
        {
            lock (s_gases)
            {
                if (!s_gases.TryGetValue(species.Name, out IdealGas? gas))
                    s_gases.Add(species.Name, gas = new IdealGas(species));
                return gas;
            }
        }
    }
}
