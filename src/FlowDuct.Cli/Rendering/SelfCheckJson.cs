using System.Text.Json;
using FlowDuct.Fluids.Water.Verification;

namespace FlowDuct.Cli.Rendering;

/// <summary>The check values as JSON, in the units of the releases, which each row names.</summary>
internal static class SelfCheckJson
{
    internal static void Write(Stream to, IReadOnlyList<CheckResult> results)
    {
        using var json = new Utf8JsonWriter(to, JsonNumbers.Options);
        json.WriteStartObject();
        JsonHead.WriteTool(json, results.All(result => result.Met) ? "pass" : "fail");
        json.WriteStartArray("values");
        foreach (CheckResult result in results) Value(json, result);
        json.WriteEndArray();
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }

    private static void Value(Utf8JsonWriter json, CheckResult result)
    {
        CheckRow row = result.Row;
        json.WriteStartObject();
        json.WriteString("source", row.Source);
        json.WriteString("table", row.Table);
        json.WriteString("equation", row.Equation);
        json.WriteStartArray("inputs");
        Input(json, row.Name1, row.Value1, row.Unit1);
        if (row.Name2.Length > 0) Input(json, row.Name2, row.Value2, row.Unit2);
        json.WriteEndArray();
        json.WriteString("quantity", row.Output);
        json.WriteString("unit", row.Unit);
        json.WriteString("printed", row.Printed);
        json.WriteNumber("computed", result.Computed);
        json.WriteNumber("deviation", result.Units);
        json.WriteBoolean("met", result.Met);
        json.WriteEndObject();
    }

    private static void Input(Utf8JsonWriter json, string name, string value, string unit)
    {
        json.WriteStartObject();
        json.WriteString("quantity", name);
        json.WriteString("value", value);
        json.WriteString("unit", unit);
        json.WriteEndObject();
    }
}
