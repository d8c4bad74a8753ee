using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Findings;

namespace FlowDuct.Cli.Rendering;

/// <summary>The answer of a property question as JSON, coherent SI.</summary>
internal static class StateJson
{
    internal static void Write(Stream to, StateAnswer answer, RenderOptions options)
    {
        using var json = new Utf8JsonWriter(to, JsonNumbers.OptionsOf(options));
        json.WriteStartObject();
        JsonHead.Write(json, FindingRules.Pass(answer.Findings, options.Strict) ? "pass" : "fail", answer.Fluid, options.Row);
        json.WriteStartObject("case");
        JsonHead.WriteName(json, options.Row);
        json.WriteString("device", "state");
        json.WriteString("fluid", answer.Fluid.Name);
        json.WriteStartObject("given");
        JsonHead.Given(json, "at.", answer.Given);
        json.WriteEndObject();
        json.WriteStartObject("assumed");
        json.WriteEndObject();
        json.WriteEndObject();
        json.WriteStartObject("units");
        JsonStation.WriteUnits(json);
        json.WriteEndObject();
        json.WriteStartObject("stations");
        JsonStation.Write(json, "at", answer.Fluid, answer.At);
        json.WriteEndObject();
        JsonAnswer.Findings(json, answer.Findings, options);
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }
}
