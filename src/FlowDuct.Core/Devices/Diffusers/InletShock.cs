using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Diffusers;

/// <summary>The normal shock through which a supersonic stream enters a diffuser: in the inlet plane, or in a throat that the stream starts through.</summary>
/// <param name="Shock">Both sides; its area ratio counts on the inlet.</param>
/// <param name="InThroat">True where it stands in a throat.</param>
internal readonly record struct InletShock(ShockAnswer Shock, bool InThroat)
{
    // A stream that is faster than sound by less is sonic to rounding.
    private const double Sonic = 1 + 1e-9;

    /// <summary>True of an inlet faster than sound.</summary>
    internal static bool IsNeeded(Inlet inlet) => inlet.V > inlet.State.w * Sonic;

    /// <summary>The shock of a case.</summary>
    internal static InletShock Of(DeviceCase c, Inlet inlet)
    {
        if (c.Throat.IsEmpty) return new InletShock(Behind(c.Fluid, inlet.State, inlet.V, 1), false);
        double ratio = ThroatOverInlet(c, inlet), G = inlet.V / inlet.State.v;
        Starting starting = Starting.Of(c.Fluid, inlet) ?? throw Refusals.NoShock();
        if (ratio > 1) throw Refusals.ThroatWiderThanInlet();
        if (ratio < starting.SelfStarting) throw Refusals.DoesNotStart(ratio, starting.SelfStarting);
        FluidState rest = inlet.Station.Stagnation!.Value;
        if (!Choking.TryFind(c.Fluid, rest.h, rest.s, rest.p, out FluidState sonic, out _)) throw Refusals.NoShock();
        var path = new LossPath(c.Fluid, rest.h, rest.h, rest.s, 1);
        if (!FluxRoot.TryFind(path, G / ratio, sonic.p, inlet.State.p, (sonic.p + inlet.State.p) / 2, out FluidState throat, out double V)) throw Refusals.NoShock();
        return new InletShock(Behind(c.Fluid, throat, V, ratio), true);
    }

    /// <summary>The inlet of the subsonic part.</summary>
    internal Inlet Passed(DeviceCase c, Inlet inlet) => inlet with
    {
        Station = StationAnswer.From(c.Fluid, Shock.Downstream, Shock.V2) with
        {
            Elevation = inlet.Station.Elevation,
            Openings = inlet.Station.Openings,
            Area = inlet.Station.Area * Shock.AreaRatio,
        },
    };

    private static ShockAnswer Behind(Fluid fluid, in FluidState before, double V, double ratio) =>
        NormalShock.TryFind(fluid, before, V, out FluidState behind, out double V2) ? new ShockAnswer(before, V, behind, V2, ratio) : throw Refusals.NoShock();

    private static double ThroatOverInlet(DeviceCase c, Inlet inlet)
    {
        StationFigures throat = StationFigures.Read(c.Throat, Station.Throat, c.Inlet);
        if (throat.Given != Figure.Section || inlet.Station.Area is not double A1) throw Refusals.DiffuserThroat();
        return throat[Figure.Section] * throat.Openings / (A1 * inlet.Station.Openings);
    }
}
