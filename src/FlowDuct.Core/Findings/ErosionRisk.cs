using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>More moisture than blades, bends and walls stand for long.</summary>
internal static class ErosionRisk
{
    // Common practice for turbine exhausts: 10 to 12 % moisture.
    private const double MoistureLimit = 0.12;

    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Inlet.State.Phase is Phase.Liquid or Phase.SaturatedLiquid || a.Exit.State.Phase != Phase.Wet) return null;
        double moisture = 1 - a.Exit.State.x;
        return moisture <= MoistureLimit ? null : new Finding("erosion-risk", Severity.Caution, moisture, MoistureLimit, "common practice", text =>
            $"moisture {text.Text(moisture, Dimension.Ratio, 3)} is above {text.Text(MoistureLimit, Dimension.Ratio, 2)}: droplets erode what the jet meets");
    }
}
