using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Below the pressure of the surroundings air leaks in, not fluid out.</summary>
internal static class SubAtmospheric
{
    internal static Finding? Check(DeviceAnswer a)
    {
        double p = a.Exit.State.p, ambient = a.Case.AmbientPressure;
        return p >= ambient ? null : new Finding("sub-atmospheric", Severity.Note, p, ambient, "ambient pressure", text =>
            $"the exit pressure is below the ambient pressure {text.Text(ambient, Dimension.Pressure)}: leaks draw air in");
    }
}
