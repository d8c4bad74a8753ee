using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>The answer to a property question: one station.</summary>
internal sealed record StateAnswer(Fluid Fluid, GivenSlots Given, StationAnswer At) : IStations
{
    /// <summary>What the state shows.</summary>
    internal IReadOnlyList<Finding> Findings => FindingRules.Apply(this);

    /// <inheritdoc/>
    public StationAnswer? StationWith(Notices notice) => (At.State.Notices & notice) != 0 ? At : null;

    /// <inheritdoc/>
    public IEnumerable<StationAnswer> Known => [At];

    /// <summary>Saturation temperature at this pressure, K; null where there is none.</summary>
    internal double? SaturationTemperature => Fluid.TrySaturationTemperature(At.State.p, out double T) ? T : null;

    /// <summary>Solves the station, or refuses.</summary>
    internal static StateAnswer Solve(Fluid fluid, in GivenSlots slots)
    {
        StationFigures given = StationFigures.Read(slots, Station.At);
        fluid = HumidAirCase.Resolve(fluid, slots, of => State(of, given));
        FluidState state = State(fluid, given);
        double V = given.Has(Figure.V) ? given[Figure.V] : given.Has(Figure.M) ? given[Figure.M] * state.w : 0;
        return new StateAnswer(fluid, slots, StationAnswer.From(fluid, state, V));
    }

    private static FluidState State(Fluid fluid, StationFigures given)
    {
        Figure figures = given.Given & (Figures.Static | Figures.Stagnation);
        StatePairs.Pair pair = StatePairs.Find(figures) ?? throw NoPair(given, figures);
        if (pair.Mask == (Figure.P | Figure.T)
            && Inlet.IsSaturatedReading(fluid, given[Figure.P], given[Figure.T], given.TemperatureHalfPlace, out double Tsat))
            throw Refusals.SaturatedInlet(Station.At, given[Figure.P], given[Figure.T], Tsat);
        return StatePairs.Solve(fluid, pair, given, Station.At);
    }

    private static FlowDuctException NoPair(StationFigures given, Figure figures)
    {
        StatePairs.Pair? smaller = Array.Find(StatePairs.All, pair => (pair.Mask & ~figures) == 0);
        if (smaller is not null) return Refusals.InletRedundant(Station.At, figures, smaller.Mask);
        bool single = figures != Figure.None && (figures & (figures - 1)) == 0;
        Figure partners = figures == Figure.None ? Figures.Static : single ? StatePairs.PartnersOf(figures) : Figure.None;
        return partners == Figure.None ? Refusals.PairNotSolved(Station.At, figures) : Refusals.InletMissing(Station.At, given, partners);
    }
}
