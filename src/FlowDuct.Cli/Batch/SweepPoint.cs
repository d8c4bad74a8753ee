using FlowDuct.Cli.CommandLine;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Sweep;

namespace FlowDuct.Cli.Batch;

/// <summary>The options of one point of a sweep, as they would be typed.</summary>
internal static class SweepPoint
{
    /// <summary>The option that a variation writes to.</summary>
    internal static string OptionOf(Variation variation) => "--" + (variation.Station.Length > 0 ? variation.Station : variation.Symbol.Replace('_', '-'));

    /// <summary>The options that differ from those given.</summary>
    internal static Dictionary<string, string> Options(Arguments arguments, SweepGrid grid, int[] indices)
    {
        Dictionary<string, string> options = [];
        for (int i = 0; i < indices.Length; i++)
        {
            Variation variation = grid.Variations[i];
            string option = OptionOf(variation), value = variation.Typed(indices[i]);
            options[option] = variation.Station.Length == 0
                ? value
                : WithItem(options.TryGetValue(option, out string? changed) ? changed : arguments.Value(option), variation.Symbol, value);
        }

        return options;
    }

    // A varied figure takes the place of one that is given too.
    private static string WithItem(string? list, string symbol, string value)
    {
        QuantityCatalogue.TryFindStationQuantity(symbol, out QuantityRow? varied);
        IEnumerable<string> kept = (list ?? string.Empty).Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries).Where(item => !IsOf(item, varied));
        return string.Join(", ", kept.Append($"{symbol}={value}"));
    }

    private static bool IsOf(string item, QuantityRow? varied)
    {
        int equals = item.IndexOf('=', StringComparison.Ordinal);
        return equals > 0 && QuantityCatalogue.TryFindStationQuantity(item.AsSpan(0, equals).TrimEnd(), out QuantityRow? row) && ReferenceEquals(row, varied);
    }
}
