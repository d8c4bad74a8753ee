using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The figures of the device as a JSON object; a key with a point opens an object, null where nothing in it is known.</summary>
internal static class JsonPerformance
{
    internal static void Write(Utf8JsonWriter json, Performance performance)
    {
        json.WriteStartObject("performance");
        string open = string.Empty;
        foreach (QuantityRow row in QuantityCatalogue.Performance)
        {
            int point = row.JsonKey.IndexOf('.', StringComparison.Ordinal);
            string group = point < 0 ? string.Empty : row.JsonKey[..point];
            if (open.Length > 0 && group != open) json.WriteEndObject();
            if (group.Length > 0 && group != open && !AnyKnown(performance, group))
            {
                if (IsFirst(row, group)) json.WriteNull(group);
                open = string.Empty;
                continue;
            }

            if (group.Length > 0 && group != open) json.WriteStartObject(group);
            open = group;
            Figure(json, row, row.JsonKey[(point + 1)..], performance);
        }

        if (open.Length > 0) json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void Figure(Utf8JsonWriter json, QuantityRow row, string key, Performance performance)
    {
        if (row.Key == "regime") json.WriteString(key, performance.Regime);
        else if (row.Key != "choked") JsonNumbers.Write(json, key, PerformanceFigures.Read(performance, row.Key));
        else if (performance.Choked is bool choked) json.WriteBoolean(key, choked);
        else json.WriteNull(key);
    }

    private static bool AnyKnown(Performance performance, string group) => QuantityCatalogue.Performance.Any(row =>
        row.Key.StartsWith(group + ".", StringComparison.Ordinal) && PerformanceFigures.Read(performance, row.Key) is not null);

    private static bool IsFirst(QuantityRow row, string group) => ReferenceEquals(
        row, QuantityCatalogue.Performance.First(other => other.JsonKey.StartsWith(group + ".", StringComparison.Ordinal)));
}
