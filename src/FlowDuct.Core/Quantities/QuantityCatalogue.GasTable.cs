namespace FlowDuct.Quantities;

/// <content>The columns of an ideal-gas table.</content>
internal static partial class QuantityCatalogue
{
    /// <summary>T, h, u of a state, then what hangs on temperature alone in an ideal gas.</summary>
    public static IReadOnlyList<QuantityRow> GasTable => GasColumns.Table;

    /// <summary>Built on first use: reading a command line does not need it.</summary>
    private static class GasColumns
    {
        public static readonly QuantityRow[] Table =
        [
            Of(StationSymbol.Temperature),
            Of(StationSymbol.Enthalpy),
            Of(StationSymbol.InternalEnergy),
            Answer("s0", "s0", "entropy at 1 bar", Dimension.SpecificEntropy, "Specific entropy at 1 bar, which hangs on temperature alone."),
            Answer("p_r", "p_r", "relative pressure", Dimension.Ratio, "exp(s0/R) on a scale: along an isentrope pressures are as these."),
            Answer("v_r", "v_r", "relative volume", Dimension.Ratio, "T over relative pressure on a scale: along an isentrope volumes are as these."),
        ];
    }
}
