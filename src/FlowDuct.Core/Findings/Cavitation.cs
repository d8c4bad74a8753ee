using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A liquid that is kept from flashing lies below its vapour pressure.</summary>
internal static class Cavitation
{
    internal static Finding? Check(DeviceAnswer a)
    {
        StationAnswer? low = a.Known.Where(at => at.State.Phase == Phase.Liquid).MinBy(at => at.State.p);
        if (low is null || !a.Fluid.TrySaturationPressure(low.State.T, out double vapour) || low.State.p >= vapour) return null;
        return new Finding("cavitation", Severity.Caution, low.State.p, vapour, "vapour pressure", text =>
            $"the static pressure falls to {text.Text(low.State.p, Dimension.Pressure)}, below the vapour pressure {text.Text(vapour, Dimension.Pressure)}: bubbles form, and collapse where it rises again");
    }
}
