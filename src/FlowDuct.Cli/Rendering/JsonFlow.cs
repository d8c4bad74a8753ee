using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>A flow that was given as a volume at a reference state: the volume as given, the state where it belongs.</summary>
internal static class JsonFlow
{
    internal static void Given(Utf8JsonWriter json, FlowReference flow)
    {
        json.WriteNumber(Key(flow.Dimension), flow.Volume);
        if (flow.IsGiven) State(json, flow);
        if (flow.Moisture != GasMoisture.Unsaid) json.WriteString("flow_basis", flow.Moisture == GasMoisture.Dry ? "dry" : "wet");
    }

    internal static void Assumed(Utf8JsonWriter json, FlowReference flow, Fluid fluid)
    {
        if (!flow.IsGiven) State(json, flow);
        if (flow.Moisture == GasMoisture.Unsaid && FlowReference.WaterVapour(fluid) > 0) json.WriteString("flow_basis", "wet");
    }

    private static void State(Utf8JsonWriter json, FlowReference flow)
    {
        json.WriteNumber("reference_state.p", flow.p);
        json.WriteNumber("reference_state.T", flow.T);
    }

    private static string Key(Dimension dimension) => dimension switch
    {
        Dimension.NormalVolumeFlow => "normal_volume_flow",
        Dimension.StandardVolumeFlow => "standard_volume_flow",
        _ => "reference_volume_flow",
    };
}
