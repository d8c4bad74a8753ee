using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A normal shock stands in the divergence or in the exit plane.</summary>
internal static class Shock
{
    // What a message will need is set aside where its method begins, so that method begins only for a rated nozzle.
    internal static Finding? Check(DeviceAnswer a) => a.Rating is null ? null : OfRated(a);

    private static Finding? OfRated(DeviceAnswer a)
    {
        if (a.Performance.Shock is not ShockAnswer shock) return null;
        double M = shock.V1 / shock.Upstream.w;
        string place = a.Diffuser?.Shock is not Devices.Diffusers.InletShock inlet ? string.Empty : inlet.InThroat ? "in the throat" : "in the inlet plane";
        return new Finding("shock", Severity.Caution, shock.AreaRatio, M, "balances of mass, momentum and energy", text =>
            $"a normal shock stands {(place.Length > 0 ? place : $"at {text.Text(shock.AreaRatio, Dimension.Ratio, 4)} times the throat area")}, M {text.Text(M, Dimension.Ratio, 4)} before it; a real one is a train of waves that moves and shakes");
    }
}
