using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Liquid at the inlet, vapour in the exit.</summary>
internal static class Flashing
{
    internal static Finding? Check(DeviceAnswer a)
    {
        bool liquid = a.Inlet.State.Phase is Phase.Liquid or Phase.SaturatedLiquid;
        if (!liquid || a.Exit.State.Phase != Phase.Wet) return null;
        double x = a.Exit.State.x;
        return new Finding("flashing", Severity.Caution, x, 0, $"{a.Fluid.Source}, equilibrium", text =>
            $"the liquid flashes: {text.Text(x, Dimension.Ratio, 3)} of the mass leaves as vapour at equilibrium; a short nozzle passes more, unflashed");
    }
}
