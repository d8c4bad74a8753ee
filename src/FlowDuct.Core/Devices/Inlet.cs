using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>The solved inlet: state, velocity, and the mass flow where it is known already.</summary>
internal sealed record Inlet(StationAnswer Station, StationFigures Given, double? MassFlow, bool TakenAtRest)
{
    internal FluidState State => Station.State;

    internal double V => Station.Velocity!.Value;

    /// <summary>Solves the inlet of a case, or refuses.</summary>
    internal static Inlet Solve(DeviceCase c)
    {
        StationFigures given = StationFigures.Read(c.Inlet, Quantities.Station.Inlet);
        return SolveAt(c, given, Datum(c, given));
    }

    /// <summary>The same at a velocity that is known or tried.</summary>
    internal static Inlet SolveAt(DeviceCase c, StationFigures given, VelocityDatum datum)
    {
        Figure figures = given.Given & (Figures.Static | Figures.Stagnation);
        InletRecipe recipe = InletRecipes.Find(figures, datum.Kind != VelocityKind.None) ?? throw NoRecipe(given, datum);
        RefuseSaturatedReading(c.Fluid, given);

        Outcome outcome = recipe.Solve(c.Fluid, given, datum, out FluidState state, out double V);
        if (outcome != Outcome.Ok) throw Failure(c, given, outcome, datum);
        double alpha = c.ValueOr(CaseOption.KineticEnergyCoefficient, 1);
        if (alpha != 1 && (figures & Figures.Stagnation) != 0) throw Refusals.ProfileOfStagnation();
        StationAnswer station = StationAnswer.From(c.Fluid, state, V, alpha) with
        {
            Elevation = given.Elevation,
            Openings = given.Openings,
            Area = given.Has(Figure.Section) ? given[Figure.Section] : null,
        };
        bool atRest = datum.Kind == VelocityKind.None && (figures & Figures.Stagnation) == 0;
        double? flow = Flow(c, station);
        return new Inlet(station.Carrying(flow), given, flow, atRest);
    }

    /// <summary>p and T within their rounding of saturation are one figure.</summary>
    internal static bool IsSaturatedReading(Fluid fluid, double p, double T, double halfPlace, out double Tsat) =>
        fluid.TrySaturationTemperature(p, out Tsat) && Math.Abs(T - Tsat) <= SaturationTolerance(halfPlace);

    // Below a tenth of a kelvin no plant thermometer tells wet from dry: common practice.
    internal static double SaturationTolerance(double halfPlace) => Math.Max(0.1, halfPlace * (1 + 1e-9));

    private static VelocityDatum Datum(DeviceCase c, StationFigures given)
    {
        if (given.Has(Figure.V) && given.Has(Figure.M)) throw Refusals.VelocityTwice(Figure.V | Figure.M);
        if (given.Has(Figure.V)) return new VelocityDatum(VelocityKind.Velocity, given[Figure.V]);
        if (given.Has(Figure.M)) return new VelocityDatum(VelocityKind.Mach, given[Figure.M]);
        bool pitot = given.Has(Figure.P) && given.Has(Figure.P0);
        if (!given.Has(Figure.Section) || pitot) return default;
        if (!c.Has(CaseOption.Flow)) throw Refusals.SectionWithoutFlow();
        double perOpening = c.Value(CaseOption.Flow) / (given[Figure.Section] * given.Openings);
        return new VelocityDatum(c.FlowIsVolume ? VelocityKind.Velocity : VelocityKind.Flux, perOpening);
    }

    private static double? Flow(DeviceCase c, StationAnswer station)
    {
        if (c.GivenMassFlow(station.State.rho) is double given) return given;
        return station.Area is double A && station.Velocity > 0 ? station.Flux * A * station.Openings : null;
    }

    private static void RefuseSaturatedReading(Fluid fluid, StationFigures given)
    {
        Figure p = given.Has(Figure.P) ? Figure.P : Figure.P0;
        Figure T = given.Has(Figure.T) ? Figure.T : Figure.T0;
        if (!given.Has(p) || !given.Has(T) || (p == Figure.P0) != (T == Figure.T0)) return;
        if (IsSaturatedReading(fluid, given[p], given[T], given.TemperatureHalfPlace, out double Tsat))
            throw Refusals.SaturatedInlet(Quantities.Station.Inlet, given[p], given[T], Tsat);
    }

    private static FlowDuctException NoRecipe(StationFigures given, VelocityDatum datum)
    {
        Figure figures = given.Given & (Figures.Static | Figures.Stagnation);
        if (InletRecipes.Find(figures, datum.Kind == VelocityKind.None) is not null)
            return datum.Kind == VelocityKind.None ? Refusals.VelocityMissing(figures) : Refusals.VelocityRedundant(figures);
        InletRecipe? smaller = InletRecipes.All.FirstOrDefault(row => row.Required != figures && (row.Required & ~figures) == 0);
        if (smaller is not null) return Refusals.InletRedundant(Quantities.Station.Inlet, figures, smaller.Required);
        Figure additions = InletRecipes.All.Where(row => (figures & ~row.Required) == 0).Aggregate(Figure.None, (set, row) => set | row.Required);
        return additions == Figure.None
            ? Refusals.PairNotSolved(Quantities.Station.Inlet, figures)
            : Refusals.InletMissing(Quantities.Station.Inlet, given, additions & ~figures);
    }

    private static FlowDuctException Failure(DeviceCase c, StationFigures given, Outcome outcome, VelocityDatum datum)
    {
        Figure figures = given.Given & (Figures.Static | Figures.Stagnation);
        StatePairs.Pair? pair = StatePairs.Find(figures);
        if (pair is not null) return Refusals.OutsideRange(Quantities.Station.Inlet, c.Fluid, outcome, pair, given[pair.First], given[pair.Second]);
        if (figures == (Figure.P0 | Figure.T0) && datum.Kind == VelocityKind.None)
            return Refusals.OutsideRange("--inlet", c.Fluid, outcome, StatePair.PT, given[Figure.P0], given[Figure.T0]);
        return Refusals.NoSuchInlet(given.Given);
    }
}
