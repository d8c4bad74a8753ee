using FlowDuct.Devices.Rating;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>A place between two stations of a device.</summary>
/// <param name="At">The static state there.</param>
/// <param name="AreaRatio">Area there over that of the narrowest section; null where that is not known, or the stream hardly moves.</param>
/// <param name="Behind">True behind the throat.</param>
/// <param name="Position">Distance from the inlet, m; null where no lengths are known.</param>
internal readonly record struct PathPlace(FluidState At, double? AreaRatio, bool Behind, double? Position)
{
    // Below this part of the speed of sound an area says nothing: at rest it is infinite.
    private const double Slow = 1e-3;

    /// <summary>
    /// The first place along the flow at which an excess rises through zero; null where it is above zero at the first station already, or
    /// nowhere. Between two stations the state follows a line of constant loss: the isentrope up to the throat, what the rating took behind it.
    /// </summary>
    internal static PathPlace? FirstAbove(DeviceAnswer a, Func<FluidState, double> excess)
    {
        List<(FluidState State, bool Behind)> nodes = [.. Nodes(a)];
        for (int i = 1; i < nodes.Count; i++)
        {
            (FluidState from, FluidState to, bool behind) = (nodes[i - 1].State, nodes[i].State, nodes[i].Behind);
            (double before, double after) = (excess(from), excess(to));
            if (before > 0) return null;
            if (after <= 0) continue;
            return Between(a, from, to, behind, before, after, excess);
        }

        return null;
    }

    /// <summary>The states of a device along the flow, up to a shock where one stands in it.</summary>
    internal static IEnumerable<(FluidState State, bool Behind)> Nodes(DeviceAnswer a)
    {
        yield return (a.Inlet.State, false);
        if (a.Throat is StationAnswer throat) yield return (throat.State, false);
        if (a.Rating?.Shock is ShockAnswer shock) yield return (shock.Upstream, true);
        else if (a.Exit.HasState) yield return (a.Exit.State, a.Throat is not null);
    }

    // A compression or a cooled stream follows no expansion line: there the station itself is the place.
    private static PathPlace? Between(
        DeviceAnswer a, FluidState from, FluidState to, bool behind, double before, double after, Func<FluidState, double> excess)
    {
        if (to.p >= from.p || a.Case.Heat != 0 || a.ExpandingFluid.FromPS(to.p, from.s, default, out FluidState ideal) != Outcome.Ok) return null;
        double h0 = Auditor.TotalEnthalpyAtExit(a), drop = from.h - ideal.h;
        var path = new LossPath(a.ExpandingFluid, h0, from.h, from.s, drop > 0 ? (from.h - to.h) / drop : 1);
        double p = RootFinder.Find(at => State(path, at) is FluidState state ? excess(state) : before, from.p, to.p, before, after);
        return State(path, p) is FluidState place ? Of(a, place, behind, h0) : null;
    }

    private static FluidState? State(LossPath path, double p) => path.At(p, default, out FluidState state, out _) == Outcome.Ok ? state : null;

    // The flow of the throat is its flux times area times coefficient; behind it the whole area carries the flow.
    private static PathPlace Of(DeviceAnswer a, in FluidState at, bool behind, double h0)
    {
        StationAnswer narrow = a.Throat ?? a.Exit;
        double V = Energy.Velocity(h0, at.h), coefficient = behind ? a.Performance.DischargeCoefficient ?? 1 : 1;
        bool known = a.Case.Device == DeviceKind.Nozzle && narrow.Flux > 0 && V > Slow * at.w;
        double? ratio = known ? narrow.Flux * coefficient * at.v / V : null;
        return new PathPlace(at, ratio, behind, Distance(a, narrow, ratio, behind));
    }

    // Between two bores the wall is straight, as the included angles say.
    private static double? Distance(DeviceAnswer a, StationAnswer narrow, double? ratio, bool behind)
    {
        StationAnswer end = behind ? a.Exit : a.Inlet;
        if (ratio is not double r || narrow.Diameter is not double throat || end.Diameter is not double bore || bore == throat) return null;
        double share = throat * (Math.Sqrt(r) - 1) / (bore - throat);
        double? convergence = a.Performance.ConvergentLength;
        return share > 1 ? null : behind ? convergence + (share * a.Performance.DivergentLength) : convergence * (1 - share);
    }

    /// <summary>Where it is, in words that follow "it starts".</summary>
    internal string Words(IQuantityText text)
    {
        string state = $"at {text.Text(At.p, Dimension.Pressure, 4)}, {text.Text(At.T, Dimension.Temperature, 4)}";
        if (AreaRatio is not double ratio) return state;
        string where = $"{state}, where the area is {text.Text(ratio, Dimension.Ratio, 4)} times the narrowest, {(Behind ? "behind" : "before")} it";
        return Position is double x ? $"{where}, {text.Text(x, Dimension.Length, 4)} from the inlet" : where;
    }
}
