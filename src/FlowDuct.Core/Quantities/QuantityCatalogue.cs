using System.Diagnostics.CodeAnalysis;

namespace FlowDuct.Quantities;

/// <summary>The one table of quantities. Options, station lists, headers, JSON keys, help and docs are renderings of it.</summary>
internal static partial class QuantityCatalogue
{
    private static readonly QuantityRow[] StationTable = [.. StateRows(), .. FlowRows(), .. RelativeRows(), .. HumidityRows(), .. StationAnswerRows()];

    private static readonly QuantityRow[] OptionTable = OptionRows();

    /// <summary>Quantities of a station, given and answered; the slots first, in the order of <see cref="StationSymbol"/>.</summary>
    public static IReadOnlyList<QuantityRow> StationQuantities => StationTable;

    /// <summary>Numeric case options, in the order of <see cref="CaseOption"/>.</summary>
    public static IReadOnlyList<QuantityRow> Options => OptionTable;

    /// <summary>Results of the device, in the order of the JSON answer.</summary>
    public static IReadOnlyList<QuantityRow> Performance => Results.Table;

    /// <summary>Every row.</summary>
    public static IEnumerable<QuantityRow> Rows => StationTable.Concat(OptionTable).Concat(Results.Table);

    /// <summary>The row of a station slot.</summary>
    public static QuantityRow Of(StationSymbol symbol) => StationTable[(int)symbol];

    /// <summary>The row of an option slot.</summary>
    public static QuantityRow Of(CaseOption option) => OptionTable[(int)option];

    /// <summary>Finds a station quantity by symbol or word, case-sensitive.</summary>
    public static bool TryFindStationQuantity(ReadOnlySpan<char> name, [NotNullWhen(true)] out QuantityRow? row)
    {
        row = Find(StationTable, name);
        return row is not null;
    }

    /// <summary>Finds an option by name, with hyphens or underscores, without the leading hyphens.</summary>
    public static bool TryFindOption(ReadOnlySpan<char> name, [NotNullWhen(true)] out QuantityRow? row)
    {
        row = Find(OptionTable, name);
        return row is not null;
    }

    /// <summary>Finds a result by its key, such as "mass_flow" or "shock.area_ratio".</summary>
    public static bool TryFindPerformance(ReadOnlySpan<char> key, [NotNullWhen(true)] out QuantityRow? row)
    {
        row = Find(Results.Table, key);
        return row is not null;
    }

    private static QuantityRow? Find(QuantityRow[] table, ReadOnlySpan<char> name)
    {
        foreach (QuantityRow row in table)
        {
            if (name.SequenceEqual(row.Key) || (row.Word.Length > 0 && name.SequenceEqual(row.Word)))
                return row;
        }

        return null;
    }

    /// <summary>Built on first use: reading a command line does not need it.</summary>
    private static class Results
    {
        public static readonly QuantityRow[] Table = [.. DeviceRows(), .. CoefficientRows(), .. DiffuserRows(), .. ForceAndLimitRows(), .. ShockRows(), .. MetastableRows()];
    }
}
