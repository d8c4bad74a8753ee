using FlowDuct.Devices.Coefficients;
using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>Answers a nozzle that is given by sections and back pressure.</summary>
internal static class RatedNozzle
{
    // Unit areas serve a nozzle without sections: the flow follows from nothing then, and stays unknown.
    private const double UnitArea = 1;

    internal static DeviceAnswer Solve(DeviceCase c)
    {
        Refuse(c);
        ApproachedInlet approached = RatedInlet.Solve(c);
        Inlet inlet = approached.Inlet;
        if (inlet.V > inlet.State.w) throw Refusals.SupersonicInlet();
        FluidState rest = inlet.Station.Stagnation ?? throw Refusals.NoSuchInlet(inlet.Given.Given);
        NozzleGeometryReader geometry = NozzleGeometryReader.Read(c, inlet.State.p, rest.p);
        NozzleRating rating = Rate(c, rest, geometry, approached.MassFlow);
        if (approached.ReferenceFlow is double reference) rating = rating with { IsentropicFlow = reference };
        return Assemble(c, inlet, geometry, rating, approached.ReferenceFlow is not null);
    }

    /// <summary>The rating at an inlet; a flow that is known already, kg/s, implies the coefficient.</summary>
    internal static NozzleRating Rate(DeviceCase c, in FluidState rest, NozzleGeometryReader geometry, double? massFlow)
    {
        double? coefficient = c.Has(CaseOption.DischargeCoefficient) ? c.Value(CaseOption.DischargeCoefficient) : null;
        bool throat = geometry.Throat.Has(Figure.Section), exit = geometry.Exit.Has(Figure.Section);
        double exitArea = exit ? NozzleGeometryReader.Area(geometry.Exit) : throat ? NozzleGeometryReader.Area(geometry.Throat) : UnitArea;
        double throatArea = throat ? NozzleGeometryReader.Area(geometry.Throat) : exitArea;
        var nozzle = new NozzleGeometry(throatArea, exitArea, c.GivenEfficiency ?? 1, massFlow is null ? coefficient : null);
        var inlet = new RatingInlet(HeldFluid(c, rest), rest.h, rest.s, rest.p);
        if (massFlow is null && c.DischargeCorrelation is CriticalFlowCd) return ByCorrelation(c, inlet, rest, nozzle, geometry);
        NozzleRating rating = One(inlet, nozzle, geometry);
        if (massFlow is not double flow || !(throat || exit) || rating.IsentropicFlow == 0) return rating;
        return One(inlet, nozzle with { DischargeCoefficient = flow / rating.IsentropicFlow }, geometry);
    }

    private static NozzleRating ByCorrelation(DeviceCase c, in RatingInlet inlet, in FluidState rest, NozzleGeometry nozzle, NozzleGeometryReader geometry)
    {
        if (!geometry.Narrow.Has(Figure.Section)) throw Refusals.CorrelationWithoutSection();
        double mu = Viscosity(c, rest), coefficient = 1;
        NozzleRating rating = default;
        for (int i = 0; i < DischargeCorrelation.Rounds; i++)
        {
            rating = One(inlet, nozzle with { DischargeCoefficient = coefficient }, geometry);
            coefficient = c.DischargeCorrelation!.At(new ThroatFlow(geometry.Reynolds(rating.MassFlow, mu), 0, 0, 1, rating.Choked));
        }

        return rating;
    }

    /// <summary>The viscosity that a correlation needs, Pa.s.</summary>
    internal static double Viscosity(DeviceCase c, in FluidState rest) =>
        c.Fluid.TryTransport(rest, out Transport transport) ? transport.mu : throw Refusals.NoViscosity(c.Fluid);

    /// <summary>The fluid that expands: the one of the case, or it with the phase of the inlet held.</summary>
    internal static Fluid HeldFluid(DeviceCase c, in FluidState rest)
    {
        if (c.Expansion == ExpansionModel.Equilibrium) return c.Fluid;
        bool liquid = rest.Phase is Phase.Liquid or Phase.SaturatedLiquid;
        if (liquid != (c.Expansion == ExpansionModel.SinglePhase) || !c.Fluid.TryHeld(rest, c.Onset, out Fluid? held)) throw Refusals.ExpansionDoesNotFit(c.Expansion);
        return held;
    }

    private static NozzleRating One(in RatingInlet inlet, in NozzleGeometry nozzle, NozzleGeometryReader geometry)
    {
        bool divergent = geometry.Shape == NozzleShape.ConvergentDivergent && nozzle.ExitArea > nozzle.ThroatArea;
        RatingOutcome outcome = divergent
            ? DivergentNozzle.Rate(inlet, nozzle, geometry.Back, out NozzleRating rating)
            : ConvergentNozzle.Rate(inlet, nozzle, geometry.Back, out rating);
        return outcome == RatingOutcome.Ok ? rating : throw Refusals.NotRated(outcome, inlet.Fluid, geometry.Back, inlet.p0);
    }

    private static void Refuse(DeviceCase c)
    {
        if (c.Has(CaseOption.Heat) || c.Has(CaseOption.HeatLoss)) throw Refusals.HeatWithChoking();
        if (c.DischargeCorrelation is not null && c.Has(CaseOption.Flow)) throw Refusals.CorrelationWithFlow();
        if (c.Has(CaseOption.LossCoefficient)) throw Refusals.LossWithSections();
        if (c.Has(CaseOption.Efficiency) && c.Has(CaseOption.VelocityCoefficient)) throw Refusals.LossTwice("efficiency, velocity coefficient");
        if (c.Has(CaseOption.Onset)) RefuseOnset(c);
        foreach (GivenSlots slots in (GivenSlots[])[c.Inlet, c.Throat, c.Exit])
        {
            if (slots.Has((int)StationSymbol.Elevation) && slots.Value((int)StationSymbol.Elevation) != 0) throw Refusals.ElevationWithThroat();
        }
    }

    private static void RefuseOnset(DeviceCase c)
    {
        if (c.Expansion == ExpansionModel.Equilibrium) throw Refusals.OnsetWithoutHeldPhase();
        const double most = Fluids.Water.SupersaturatedWater.MostMoisture;
        if (c.Expansion == ExpansionModel.Supersaturated && c.Onset.Fraction is < double.PositiveInfinity and > most) throw Refusals.OnsetBeyondEquation(c.Onset.Fraction, most);
    }

    private static DeviceAnswer Assemble(DeviceCase c, Inlet inlet, NozzleGeometryReader geometry, in NozzleRating rating, bool ownApproach)
    {
        bool sections = geometry.Throat.Has(Figure.Section) || geometry.Exit.Has(Figure.Section);
        double? flow = sections ? rating.MassFlow : inlet.MassFlow;
        bool divergent = geometry.Shape == NozzleShape.ConvergentDivergent && geometry.Throat.Has(Figure.Section) && geometry.Exit.Has(Figure.Section);
        StationFigures exitSection = geometry.Exit.Has(Figure.Section) ? geometry.Exit : geometry.Throat;
        Fluid fluid = HeldFluid(c, inlet.Station.Stagnation!.Value);
        List<string> assumptions = [];
        if (!ReferenceEquals(fluid, c.Fluid)) assumptions.Add("expansion: " + fluid.Formulation);
        if (geometry.ShapeWords.Length > 0) assumptions.Add(geometry.ShapeWords);
        if (rating.AtKink && rating.Choked && ReferenceEquals(fluid, c.Fluid)) assumptions.Add("the flux is greatest where the flow meets saturation, not where M = 1");
        if (c.Back.IsEmpty) assumptions.Add("back pressure: the given exit pressure");
        if (sections) assumptions.Add(CoefficientWords(inlet, ownApproach));
        var answer = new DeviceAnswer
        {
            Case = c,
            Inlet = inlet.Station.Carrying(flow),
            Throat = divergent ? At(fluid, rating.Throat, rating.ThroatVelocity, geometry.Throat) : null,
            Exit = At(fluid, rating.Exit, rating.ExitVelocity, exitSection).Carrying(flow),
            Performance = Figures(c, rating, sections) with
            {
                ReynoldsThroat = sections && c.Fluid.TryTransport(inlet.Station.Stagnation!.Value, out Transport transport)
                    ? geometry.Reynolds(rating.MassFlow, transport.mu)
                    : null,
                MassFlow = flow,
                CriticalPressureRatio = rating.CriticalPressure > 0 ? rating.CriticalPressure / inlet.Station.Stagnation!.Value.p : null,
            },
            Audit = new Audit(),
            InletTakenAtRest = inlet.TakenAtRest,
            TakenIdeal = c.GivenEfficiency is null,
            EfficiencyImplied = rating.Regime is Regime.ShockInDivergence or Regime.ShockAtExit or Regime.ChokedSubsonicExit,
            Assumptions = assumptions,
            Rating = rating,
            BackPressure = geometry.Back,
            ExpandingFluid = fluid,
        };
        double V1 = inlet.V, V2 = rating.ExitVelocity;
        return answer with { Ledger = new Ledger(inlet.State.h, V1 * V1 / 2, 0, 0, rating.Exit.h, V2 * V2 / 2, 0) };
    }

    private static string CoefficientWords(Inlet inlet, bool ownApproach) => ownApproach
        ? "discharge coefficient: on the isentropic flow between the same pressures, with the approach velocity of that flow"
        : inlet.V > 0 ? "discharge coefficient: on the isentropic flow from the stagnation state of the inlet" : "discharge coefficient: on the isentropic flow from rest";

    // A state in equilibrium is slowed down in equilibrium.
    private static StationAnswer At(Fluid fluid, in FluidState state, double V, StationFigures section) => StationAnswer.From(
        (state.Notices & Notices.Metastable) == 0 ? fluid.Relaxed : fluid, state, V) with
    {
        Openings = section.Openings,
        Area = section.Has(Figure.Section) ? section[Figure.Section] : null,
    };

    private static Performance Figures(DeviceCase c, in NozzleRating rating, bool sections)
    {
        double? coefficient = sections && rating.IsentropicFlow > 0 ? rating.MassFlow / rating.IsentropicFlow : null;
        return new Performance
        {
            Regime = RegimeWords.Of(rating.Regime),
            Choked = rating.Choked,
            DischargeCoefficient = coefficient,
            Limits = rating.Limits,
            Shock = rating.Shock,
            ShockStagnationPressureRatio = rating.Shock is ShockAnswer shock ? StagnationRatio(c.Fluid, shock) : null,
        };
    }

    private static double? StagnationRatio(Fluid fluid, in ShockAnswer shock) =>
        Stagnation.Of(fluid, shock.Upstream, shock.V1, out FluidState before) == Outcome.Ok
        && Stagnation.Of(fluid, shock.Downstream, shock.V2, out FluidState behind) == Outcome.Ok ? behind.p / before.p : null;
}
