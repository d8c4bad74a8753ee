using FlowDuct.Devices.Coefficients;
using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>The inlet of a rated nozzle. A section without a flow finds its velocity together with the flow of the throat.</summary>
/// <remarks>
/// Where a pipe gives a static pressure alone, the discharge coefficient of a convergent nozzle compares two flows between the same static
/// pressures, each with its own approach velocity: the convention of ISO 5167. Where the stagnation state is known, or a correlation of
/// ISO 9300 asks for it, both flows start from it.
/// </remarks>
internal static class RatedInlet
{
    // Just below the speed of sound: an inlet wider than the throat is slower.
    private const double Fastest = 0.999999;

    // An inlet hardly wider than the throat carries more than it in a narrow band below sonic only: searched downwards in thin steps.
    private const double Slower = 0.999;
    private const double Slowest = 0.5;

    // A liquid that fast would have a stagnation pressure outside its formulation.
    private const double MuchSlower = 0.8;

    // Slow enough to be at rest for all that is read from it here.
    private const double Slow = 1e-3;

    internal static ApproachedInlet Solve(DeviceCase c)
    {
        StationFigures given = StationFigures.Read(c.Inlet, Station.Inlet);
        bool pipe = given.Has(Figure.Section) && !given.Has(Figure.V) && !given.Has(Figure.M) && !(given.Has(Figure.P) && given.Has(Figure.P0));
        if (pipe && !given.Has(Figure.P0) && RefersToOwnApproach(c, given)) return BetweenTaps(c, given);
        if (c.DischargeCorrelation is { NeedsPipe: true }) throw Refusals.CorrelationWithoutPipe();
        Inlet inlet = pipe && !c.Has(CaseOption.Flow) ? WithThroat(c, given) : Inlet.Solve(c);
        return new ApproachedInlet(inlet, c.GivenMassFlow(inlet.State.rho), null);
    }

    private static bool RefersToOwnApproach(DeviceCase c, StationFigures given)
    {
        if (c.DischargeCorrelation is CriticalFlowCd) return false;
        Inlet slow = Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, Slow));
        NozzleGeometryReader geometry = NozzleGeometryReader.Read(c, slow.State.p, slow.State.p);
        return geometry.Shape == NozzleShape.Convergent && geometry.Narrow.Has(Figure.Section);
    }

    private static ApproachedInlet BetweenTaps(DeviceCase c, StationFigures given)
    {
        DeviceCase ideal = c with { DischargeCorrelation = null };
        foreach (CaseOption option in (CaseOption[])[CaseOption.Flow, CaseOption.DischargeCoefficient, CaseOption.Efficiency, CaseOption.VelocityCoefficient])
            ideal.Options.Clear((int)option);
        Inlet free = WithThroat(ideal, given);
        double area = given[Figure.Section] * given.Openings, reference = free.Station.Flux!.Value * area;
        if (c.Has(CaseOption.Flow))
        {
            Inlet measured = Inlet.Solve(c);
            return new ApproachedInlet(measured, measured.MassFlow, reference);
        }

        if (c.DischargeCorrelation is not null) return ByCorrelation(c, given, reference);
        if (!c.Has(CaseOption.DischargeCoefficient)) return new ApproachedInlet(c.GivenEfficiency is null ? free : WithThroat(c, given), null, reference);
        double flow = c.Value(CaseOption.DischargeCoefficient) * reference;
        return new ApproachedInlet(Carrying(c, given, flow), flow, reference);
    }

    private static ApproachedInlet ByCorrelation(DeviceCase c, StationFigures given, double reference)
    {
        double flow = reference;
        Inlet inlet = Carrying(c, given, flow);
        NozzleGeometryReader geometry = NozzleGeometryReader.Read(c, inlet.State.p, inlet.Station.Stagnation!.Value.p);
        double pipe = NozzleGeometryReader.Bore(given), beta = NozzleGeometryReader.Bore(geometry.Narrow) / pipe;
        if (geometry.Narrow.Openings != given.Openings) throw Refusals.CorrelationWithoutPipe();
        for (int i = 0; i < DischargeCorrelation.Rounds; i++)
        {
            double Re = geometry.Reynolds(flow, RatedNozzle.Viscosity(c, inlet.Station.Stagnation!.Value));
            flow = reference * c.DischargeCorrelation!.At(new ThroatFlow(Re, pipe, beta, geometry.Back / inlet.State.p, false));
            inlet = Carrying(c, given, flow);
        }

        return new ApproachedInlet(inlet, flow, reference);
    }

    private static Inlet Carrying(DeviceCase c, StationFigures given, double flow) =>
        Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Flux, flow / (given[Figure.Section] * given.Openings)));

    // More velocity carries more through the inlet section, while the flow of the throat changes little: one root.
    private static Inlet WithThroat(DeviceCase c, StationFigures given)
    {
        Inlet slow = Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, Slow));
        double area = given[Figure.Section] * given.Openings, low = Slow, high = slow.State.w * Fastest;
        double atLow = Excess(low), atHigh = Excess(high);
        if (atLow > 0) throw Refusals.InletSectionTooWide();
        while (!(atHigh >= 0))
        {
            high *= double.IsNaN(atHigh) ? MuchSlower : Slower;
            if (high < (slow.State.Phase == Phase.Liquid ? low : Slowest * slow.State.w)) throw Refusals.InletSectionTooNarrow();
            atHigh = Excess(high);
        }

        double V = RootFinder.Find(Excess, low, high, atLow, atHigh);
        return Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, V));

        double Excess(double V)
        {
            Inlet trial = Inlet.SolveAt(c, given, new VelocityDatum(VelocityKind.Velocity, V));
            if (trial.Station.Stagnation is not FluidState rest) return double.NaN;
            NozzleGeometryReader geometry = NozzleGeometryReader.Read(c, trial.State.p, rest.p);
            return (trial.State.rho * V * area) - RatedNozzle.Rate(c, rest, geometry, null).MassFlow;
        }
    }
}
