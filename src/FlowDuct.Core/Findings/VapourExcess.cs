using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>Water vapour of a gas against its saturation, at the stations and at the place where the flow passes it.</summary>
internal static class VapourExcess
{
    // Relative: air that is given as saturated is, and no more.
    private const double Slack = 1e-9;

    /// <summary>Partial over saturation pressure, less one; negative above the critical temperature.</summary>
    internal static double Above(double x, in FluidState at) => Humidity.Relative(x, at.p, at.T) is double humidity ? humidity - 1 - Slack : -1;

    /// <summary>The same where ice forms: negative above the triple point.</summary>
    internal static double AboveIce(double x, in FluidState at) => Math.Min(Above(x, at), (WaterConstants.Tt - at.T) / WaterConstants.Tt);

    /// <summary>The first state along the flow with an excess, the side of a shock before it too; null where none has.</summary>
    internal static FluidState? First(IStations stations, Func<FluidState, double> excess)
    {
        IEnumerable<FluidState> states = stations.Known.Select(at => at.State);
        if (stations is DeviceAnswer { Rating.Shock: not null } shocked) states = PathPlace.Nodes(shocked).Select(node => node.State).Concat(states);
        foreach (FluidState state in states)
        {
            if (excess(state) > 0) return state;
        }

        return null;
    }

    /// <summary>Words on where the excess starts; empty for a state by itself.</summary>
    internal static string Start(IStations stations, Func<FluidState, double> excess, IQuantityText text)
    {
        if (stations is not DeviceAnswer device) return string.Empty;
        if (excess(device.Inlet.State) > 0) return "; it is there at the inlet already";
        return PathPlace.FirstAbove(device, excess) is PathPlace place ? $"; it starts {place.Words(text)}" : string.Empty;
    }
}
