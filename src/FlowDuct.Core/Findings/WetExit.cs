using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Vapour at the inlet, moisture in the exit.</summary>
internal static class WetExit
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Inlet.State.Phase is Phase.Liquid or Phase.SaturatedLiquid || a.Exit.State.Phase != Phase.Wet) return null;
        double moisture = 1 - a.Exit.State.x;
        return new Finding("wet-exit", Severity.Caution, moisture, 0, $"{a.Fluid.Source}, equilibrium", text =>
            $"moisture {text.Text(moisture, Dimension.Ratio, 3)} in the exit at equilibrium; a fast expansion condenses later than that");
    }
}
