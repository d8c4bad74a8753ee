using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>An exit reading (p, T) on the saturation line: one figure, and the set of states that it allows.</summary>
internal static class SaturatedExit
{
    /// <summary>The exit with what the reading does say: p and T.</summary>
    internal static StationAnswer Station(Fluid fluid, StationFigures given) => new()
    {
        State = new FluidState(given[Figure.P], given[Figure.T], 0, 0, 0, 0, 0, 0, 0, Phase.None, Notices.None),
    };

    /// <summary>The least and the greatest static enthalpy, and the greatest entropy, of the states that the reading allows.</summary>
    internal static (FluidState Wettest, FluidState Driest) Bounds(DeviceAnswer a)
    {
        double p = a.Exit.State.p, T = a.Exit.State.T;
        double tolerance = Inlet.SaturationTolerance(a.Case.Exit.HalfPlace((int)StationSymbol.Temperature));
        a.Fluid.FromPX(p, 0, out FluidState wettest);
        a.Fluid.FromPX(p, 1, out FluidState driest);
        if (T + tolerance > driest.T && a.Fluid.FromPT(p, T + tolerance, out FluidState hotter) == Outcome.Ok) driest = hotter;
        return (wettest, driest);
    }
}
