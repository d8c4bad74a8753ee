using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>The inlet of a rated nozzle. A section without a flow finds its velocity together with the flow of the throat.</summary>
internal static class RatedInlet
{
    // Just below the speed of sound: an inlet wider than the throat is slower.
    private const double Fastest = 0.999999;

    // An inlet hardly wider than the throat carries more than it in a narrow band below sonic only: searched downwards in thin steps.
    private const double Slower = 0.999;
    private const double Slowest = 0.5;

    internal static Inlet Solve(DeviceCase c)
    {
        StationFigures given = StationFigures.Read(c.Inlet, Station.Inlet);
        bool pitot = given.Has(Figure.P) && given.Has(Figure.P0);
        bool open = given.Has(Figure.Section) && !given.Has(Figure.V) && !given.Has(Figure.M) && !pitot && !c.Has(CaseOption.Flow);
        return open ? WithThroat(c, given) : Inlet.Solve(c);
    }

    // More velocity carries more through the inlet section, while the flow of the throat changes little: one root.
    private static Inlet WithThroat(DeviceCase c, StationFigures given)
    {
        Inlet slow = Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, 1e-3));
        double area = given[Figure.Section] * given.Openings, low = 1e-3, high = slow.State.w * Fastest;
        double atLow = Excess(low), atHigh = Excess(high);
        if (atLow > 0) throw Refusals.InletSectionTooWide();
        while (atHigh < 0)
        {
            high *= Slower;
            if (high < Slowest * slow.State.w) throw Refusals.InletSectionTooNarrow();
            atHigh = Excess(high);
        }

        double V = RootFinder.Find(Excess, low, high, atLow, atHigh);
        return Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, V));

        double Excess(double V)
        {
            Inlet trial = Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, V));
            FluidState rest = trial.Station.Stagnation ?? throw Refusals.NoSuchInlet(given.Given);
            NozzleGeometryReader geometry = NozzleGeometryReader.Read(c, trial.State.p, rest.p);
            return (trial.State.rho * V * area) - RatedNozzle.Rate(c, rest, geometry).MassFlow;
        }
    }
}
