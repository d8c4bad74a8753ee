using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Findings;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>A table of states as JSON, coherent SI; the range stands in the given figures as typed.</summary>
internal static class StateTableJson
{
    internal static void Write(Stream to, StateTable table, RenderOptions options)
    {
        using var json = new Utf8JsonWriter(to, JsonNumbers.Options);
        json.WriteStartObject();
        JsonHead.Write(json, FindingRules.Pass(table.Findings, options.Strict) ? "pass" : "fail", table.Fluid, null);
        Case(json, table);
        json.WriteStartObject("units");
        JsonStation.WriteUnits(json);
        if (table.GasRows.Count > 0) json.WriteString("s0", DimensionWords.SiUnit(Dimension.SpecificEntropy));
        json.WriteEndObject();
        json.WriteStartObject("stations");
        json.WriteNull("at");
        json.WriteEndObject();
        json.WriteStartArray("table");
        foreach (GasTableRow row in table.GasRows) GasRow(json, row);
        foreach (StateAnswer state in table.States) JsonStation.WriteElement(json, state.Fluid, state.At);
        json.WriteEndArray();
        JsonAnswer.Findings(json, table.Findings, options);
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }

    private static void Case(Utf8JsonWriter json, StateTable table)
    {
        json.WriteStartObject("case");
        json.WriteNull("tag");
        json.WriteNull("name");
        json.WriteString("device", "state");
        json.WriteString("fluid", table.Fluid.Name);
        json.WriteStartObject("given");
        JsonHead.Given(json, "at.", table.Given);
        json.WriteString("at." + table.Range.Row.JsonKey, Echo.Ascii(table.Range.Typed));
        json.WriteEndObject();
        json.WriteStartObject("assumed");
        if (table.GasRows.Count > 0)
        {
            json.WriteNumber("gas_table.p_r_at_300_K", GasTableRow.ScalePressure);
            json.WriteNumber("gas_table.v_r_times_p_r_over_T", GasTableRow.VolumePerKelvin);
        }

        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void GasRow(Utf8JsonWriter json, in GasTableRow row)
    {
        json.WriteStartObject();
        JsonNumbers.Write(json, "T", row.T);
        JsonNumbers.Write(json, "h", row.h);
        JsonNumbers.Write(json, "u", row.u);
        JsonNumbers.Write(json, "s0", row.s0);
        JsonNumbers.Write(json, "p_r", row.p_r);
        JsonNumbers.Write(json, "v_r", row.v_r);
        json.WriteEndObject();
    }
}
