using FlowDuct.Devices;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The walls of a diffuser open so wide that the flow may leave them.</summary>
internal static class Stall
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Performance.Diffuser is not { Stall: StallLimit limit, IncludedAngle: double angle }) return null;
        bool stalled = angle > limit.Angle * (1 + limit.Spread);
        if (!stalled && angle <= limit.Angle * (1 - limit.Spread)) return null;
        string code = stalled ? "stalled" : "stall-risk";
        return new Finding(code, Severity.Caution, angle, limit.Angle, limit.Standing, text =>
            $"the walls open by {Angle(text, angle)}; stall begins at about {Angle(text, limit.Angle)}{(stalled ? ": the flow leaves the wall, and the loss and its unsteadiness are beyond any estimate here" : ", so the flow may leave the wall")}");
    }

    private static string Angle(IQuantityText text, double value) => text.Text(value, Dimension.Angle, 3);
}
