using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Diffusers;

/// <summary>Solves a diffuser: form, shock of a supersonic inlet, loss by correlation, then the exit like any other.</summary>
internal static class DiffuserSolver
{
    // Smooth-walled ducts of plant size: used where no Reynolds number is known, and said.
    private const double UsualFriction = 0.02;

    // The loss hangs on the exit section only where that follows from the exit velocity, and weakly.
    private const int MostRounds = 60;
    private const double Closure = 1e-12;

    internal static DeviceAnswer Stations(DeviceCase c, Inlet inlet)
    {
        if (inlet.V == 0) throw Refusals.DiffuserAtRest();
        if (!c.Throat.IsEmpty && !InletShock.IsNeeded(inlet)) throw Refusals.ThroatOfSubsonicDiffuser();
        if (c.LossWord is null) return WithForm(c, Once(c, inlet, null));
        if (c.Has(CaseOption.LossCoefficient) || c.GivenEfficiency is not null || c.Has(CaseOption.Recovery)) throw Refusals.LossTwice("recovery, efficiency, loss coefficient");
        return c.LossWord == DiffuserLoss.Sudden ? Sudden(c, inlet) : ByCorrelation(c, inlet, DiffuserLoss.Find(c.LossWord)!);
    }

    private static DeviceAnswer ByCorrelation(DeviceCase c, Inlet inlet, DiffuserLoss row)
    {
        double K = 0;
        for (int i = 0; i < MostRounds; i++)
        {
            DeviceAnswer answer = WithForm(c, Once(c, inlet, K));
            DiffuserFlow flow = FlowOf(c, answer, row);
            double next = row.At(flow);
            if (Math.Abs(next - K) <= Closure) return answer with { Diffuser = answer.Diffuser! with { Loss = K, Crossed = row.CrossedBy(flow) } };
            K = next;
        }

        throw Refusals.NoExit("the loss", "no exit has the loss that its own form gives");
    }

    private static DiffuserFlow FlowOf(DeviceCase c, DeviceAnswer answer, DiffuserLoss row)
    {
        if (answer.Diffuser!.Geometry is not DiffuserGeometry geometry) throw Refusals.LossWithoutForm();
        if (row.Cone == (geometry.Shape == DiffuserShape.Planar)) throw Refusals.LossOfAnotherShape(row);
        if (row.Cone && geometry.IncludedAngle is null) throw Refusals.LossWithoutForm();
        StationAnswer entry = Entry(answer);
        return new DiffuserFlow(geometry, answer.Diffuser.Friction, c.Has(CaseOption.InletBlockage) ? c.Value(CaseOption.InletBlockage) : null, entry.Mach!.Value);
    }

    /// <summary>The station at which the subsonic part begins: the inlet, or the far side of its shock.</summary>
    internal static StationAnswer Entry(DeviceAnswer a) =>
        a.Diffuser?.Shock is InletShock shock ? StationAnswer.From(a.Fluid, shock.Shock.Downstream, shock.Shock.V2) with { Area = a.Inlet.Area * shock.Shock.AreaRatio, Openings = a.Inlet.Openings } : a.Inlet;

    // Mass, momentum and energy fix the exit; its pressure then implies the loss.
    private static DeviceAnswer Sudden(DeviceCase c, Inlet inlet)
    {
        if (InletShock.IsNeeded(inlet)) throw Refusals.SuddenOfSupersonic();
        StationFigures given = Read(c, inlet);
        if (given.Given != Figure.Section || inlet.Station.Area is not double A1) throw Refusals.LossWithoutForm();
        double ratio = given[Figure.Section] * given.Openings / (A1 * inlet.Station.Openings);
        if (!SuddenExpansion.TryFind(c.Fluid, inlet.State, inlet.V, inlet.Station.StagnationEnthalpy!.Value, ratio, out FluidState exit, out _))
            throw Refusals.NoExit("the section", "no stream fills it behind a sudden expansion");
        given.Add(Figure.P, exit.p, Station.Exit);
        return WithForm(c, DeviceSolver.Expand(c, inlet, inlet, given)) with { EfficiencyImplied = false };
    }

    private static DeviceAnswer Once(DeviceCase c, Inlet inlet, double? K)
    {
        StationFigures given = Read(c, inlet);
        if (K is double loss) given.Add(Figure.Loss, loss, Station.Exit);
        bool shocked = InletShock.IsNeeded(inlet) && !DeviceSolver.Implies(c, inlet, given);
        if (!shocked) return DeviceSolver.Expand(c, inlet, inlet, given);
        InletShock shock = InletShock.Of(c, inlet);
        DeviceAnswer answer = DeviceSolver.Expand(c, inlet, shock.Passed(c, inlet), given);
        string where = shock.InThroat ? "a normal shock stands in the throat" : "a normal shock stands in the inlet plane";
        return answer with
        {
            Diffuser = new DiffuserAnswer(null, shock, null, 0, false, null),
            Throat = shock.InThroat ? StationAnswer.From(c.Fluid, shock.Shock.Upstream, shock.Shock.V1) with { Area = inlet.Station.Area * shock.Shock.AreaRatio, Openings = inlet.Station.Openings } : null,
            Assumptions = [.. answer.Assumptions, $"{where}; a given loss or efficiency is that of the subsonic part behind it"],
        };
    }

    private static StationFigures Read(DeviceCase c, Inlet inlet)
    {
        StationFigures given = ExitFigures.Read(c, inlet);
        if (inlet.Station.Area is double A1 && DiffuserGeometry.ExitArea(c, A1) is double A2 && !given.Has(Figure.Section)) given.Add(Figure.Section, A2, Station.Exit);
        return given;
    }

    internal static DeviceAnswer WithForm(DeviceCase c, DeviceAnswer answer)
    {
        var found = answer.Diffuser ?? new DiffuserAnswer(null, null, null, 0, false, null);
        answer = answer with { Diffuser = found };
        double? ratio = AreaRatio(answer);
        (double friction, bool known) = Friction(c, answer);
        return answer with
        {
            Diffuser = found with { Geometry = ratio is double AR and >= 1 ? DiffuserGeometry.Of(c, AR) : null, Friction = friction, FrictionKnown = known },
        };
    }

    // Of the subsonic part; where no section is known the fluxes give it.
    private static double? AreaRatio(DeviceAnswer a)
    {
        StationAnswer entry = Entry(a);
        return a.Exit.Area * a.Exit.Openings / (entry.Area * entry.Openings) ?? Performances.Quotient(entry.Flux, a.Exit.Flux);
    }

    private static (double Friction, bool Known) Friction(DeviceCase c, DeviceAnswer answer)
    {
        StationAnswer entry = Entry(answer);
        if (HydraulicDiameter(c, entry) is not double D || !c.Fluid.TryTransport(entry.State, out Transport transport)) return (UsualFriction, false);
        double Re = entry.State.rho * entry.Velocity!.Value * D / transport.mu;
        return (FrictionFactor.Darcy(Re, c.ValueOr(CaseOption.Roughness, 0) / D), true);
    }

    private static double? HydraulicDiameter(DeviceCase c, StationAnswer entry)
    {
        GivenSlots inlet = c.Inlet;
        if (inlet.Has(StationSymbol.Annulus)) return inlet.Value((int)StationSymbol.Annulus) - inlet.Second(StationSymbol.Annulus);
        if (!inlet.Has(StationSymbol.Rectangle)) return entry.Diameter;
        double w = inlet.Value((int)StationSymbol.Rectangle), h = inlet.Second(StationSymbol.Rectangle);
        return 2 * w * h / (w + h);
    }
}
