using FlowDuct.Devices.Coefficients;

namespace FlowDuct.Devices.Diffusers;

/// <summary>What is worked out of a diffuser beside its stations.</summary>
/// <param name="Geometry">Its form; null where its area ratio is not known.</param>
/// <param name="Shock">The shock of a supersonic inlet; null of a subsonic one, and where the figures imply the loss.</param>
/// <param name="Loss">The loss coefficient of a correlation; null where none is asked for.</param>
/// <param name="Friction">Darcy friction factor of the inlet.</param>
/// <param name="FrictionKnown">False where a usual factor stands in for an unknown Reynolds number.</param>
/// <param name="Crossed">The limit of the correlation that is crossed; null inside.</param>
internal sealed record DiffuserAnswer(
    DiffuserGeometry? Geometry, InletShock? Shock, double? Loss, double Friction, bool FrictionKnown, Crossing? Crossed);
