using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>One station as a JSON object, coherent SI.</summary>
internal static class JsonStation
{
    internal static void Write(Utf8JsonWriter json, string name, Fluid fluid, StationAnswer? at)
    {
        if (at is null)
        {
            json.WriteNull(name);
            return;
        }

        json.WritePropertyName(name);
        WriteElement(json, fluid, at);
    }

    /// <summary>The object without a name before it.</summary>
    internal static void WriteElement(Utf8JsonWriter json, Fluid fluid, StationAnswer at)
    {
        json.WriteStartObject();
        foreach ((string key, Func<Fluid, StationAnswer, double?> read) in StationFigureTable.All)
        {
            JsonNumbers.Write(json, KeyOf(key), read(fluid, at));
            if (key == "x") json.WriteString("phase", PhaseWords.Of(at.State.Phase));
        }

        json.WriteEndObject();
    }

    /// <summary>The units of the station keys that have one.</summary>
    internal static void WriteUnits(Utf8JsonWriter json)
    {
        foreach ((string key, _) in StationFigureTable.All)
        {
            if (QuantityCatalogue.TryFindStationQuantity(key, out QuantityRow? row) && row.Dimension is not (Dimension.Ratio or Dimension.Count))
                json.WriteString(row.JsonKey, DimensionWords.SiUnit(row.Dimension));
        }
    }

    private static string KeyOf(string key) => QuantityCatalogue.TryFindStationQuantity(key, out QuantityRow? row) ? row.JsonKey : key;
}
