using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids.Gases;

/// <summary>The ideal gases by name. A new gas is one record in Coefficients and one line here.</summary>
public static class GasCatalogue
{
    /// <summary>Dry air, the record "Air" of NASA/TP-2002-211556 (2002).</summary>
    public static IdealGas Air { get; } = new(Nasa9Air.Record);

    /// <summary>Every gas of the catalogue.</summary>
    public static IReadOnlyList<IdealGas> All { get; } = [Air];
}
