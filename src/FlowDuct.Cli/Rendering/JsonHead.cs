using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>What every JSON answer begins with.</summary>
internal static class JsonHead
{
    private const int Schema = 1;

    internal static void Write(Utf8JsonWriter json, string verdict, Fluid fluid, JsonRow? row = null)
    {
        WriteTool(json, verdict, row);
        json.WriteStartObject("method");
        json.WriteString(fluid.Name, fluid.Formulation);
        json.WriteEndObject();
    }

    /// <summary>Schema, verdict and the program.</summary>
    internal static void WriteTool(Utf8JsonWriter json, string verdict, JsonRow? row = null)
    {
        json.WriteNumber("schema", Schema);
        if (row is not null) json.WriteNumber("row", row.Number);
        json.WriteString("verdict", verdict);
        json.WriteStartObject("tool");
        json.WriteString("name", "flowduct");
        json.WriteString("version", ToolVersion.Version);
        json.WriteString("commit", ToolVersion.Commit);
        json.WriteEndObject();
    }

    /// <summary>Tag and case of the row; null for a single answer.</summary>
    internal static void WriteName(Utf8JsonWriter json, JsonRow? row)
    {
        json.WriteString("tag", row?.Tag);
        json.WriteString("name", row?.Case);
    }

    /// <summary>The given figures of a station, SI.</summary>
    internal static void Given(Utf8JsonWriter json, string prefix, in GivenSlots slots)
    {
        foreach (QuantityRow row in QuantityCatalogue.StationQuantities)
        {
            if (row.StationSlot is StationSymbol slot && slots.Has((int)slot)) json.WriteNumber(prefix + row.JsonKey, slots.Value((int)slot));
        }
    }
}
