using FlowDuct.Devices.Diffusers;
using FlowDuct.Devices.Rating;
using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Venturis;

/// <summary>A nozzle followed by a diffuser as one device: a metering throat with recovery.</summary>
/// <remarks>
/// The convergence is a convergent nozzle whose back pressure is that of the throat; the divergence is a diffuser whose inlet is the throat. The
/// unknown throat pressure is given as a reading, or found for a flow or for the pressure behind the device. Behind a choked throat a lower back
/// pressure changes the divergence alone: mass and energy fix its exit.
/// </remarks>
internal static class VenturiSolver
{
    internal static DeviceAnswer Stations(DeviceCase c)
    {
        Refuse(c);
        if (c.Throat.Has(StationSymbol.Pressure) || RelativeThroat(c)) return Joined(c, Convergence(c, ThroatAsBack(c)), null);
        DeviceAnswer choked = Convergence(c, AtPressure(c, c.Fluid.LeastPressure));
        double critical = choked.Exit.State.p, inlet = choked.Inlet.State.p;
        if (c.Has(CaseOption.Flow)) return Joined(c, ByFlow(c, choked, critical, inlet), null);
        double back = BackPressure(c, choked);
        DeviceAnswer least = Joined(c, choked, null);
        if (back <= least.Exit.State.p) return Joined(c, choked, back);

        // Without a flow the whole device has the pressure of its inlet: the end of the bracket needs no solving.
        if (back >= inlet) throw Refusals.NoFlowThrough(back, inlet);
        double p = RootFinder.Find(Excess, critical, inlet, least.Exit.State.p - back, inlet - back);
        return Joined(c, Convergence(c, AtPressure(c, p)), null);

        double Excess(double throat) => Joined(c, Convergence(c, AtPressure(c, throat)), null).Exit.State.p - back;
    }

    /// <summary>Pressure behind the device over inlet stagnation pressure at which its throat just chokes; null where it does not in range.</summary>
    internal static double? ChokingRatio(DeviceCase c)
    {
        try
        {
            DeviceAnswer choked = Convergence(c, AtPressure(c, c.Fluid.LeastPressure));
            return choked.Performance.Choked == true ? Joined(c, choked, null).Exit.State.p / choked.Inlet.Stagnation!.Value.p : null;
        }
        catch (FlowDuctException)
        {
            return null;
        }
    }

    private static void Refuse(DeviceCase c)
    {
        if (!StationFigures.HaveSection(c.Inlet) || !StationFigures.HaveSection(c.Throat) || !StationFigures.HaveSection(c.Exit)) throw Refusals.VenturiSections();
        if (c.Has(CaseOption.Heat) || c.Has(CaseOption.HeatLoss)) throw Refusals.HeatWithChoking();
        Figure extra = (StationFigures.Read(c.Throat, Station.Throat).Given | StationFigures.Read(c.Exit, Station.Exit).Given) & ~(Figure.Section | Figure.P);
        if (extra != Figure.None) throw Refusals.VenturiFollows(extra);
        int given = (c.Has(CaseOption.Flow) ? 1 : 0) + (c.Throat.Has(StationSymbol.Pressure) || RelativeThroat(c) ? 1 : 0) + (HasBack(c) ? 1 : 0);
        if (given != 1) throw Refusals.VenturiReadings(given);
    }

    private static bool HasBack(DeviceCase c) => !c.Back.IsEmpty || c.Exit.Has(StationSymbol.Pressure) || HasRelative(c.Exit);

    private static bool RelativeThroat(DeviceCase c) => HasRelative(c.Throat);

    private static bool HasRelative(in GivenSlots slots) => slots.Has(StationSymbol.PressureDrop) || slots.Has(StationSymbol.PressureRise)
        || slots.Has(StationSymbol.PressureOverInlet) || slots.Has(StationSymbol.PressureOverInletStagnation);

    // The convergence alone: whatever belongs to the divergence is left out.
    private static DeviceCase Nozzle(DeviceCase c)
    {
        DeviceCase nozzle = c with { Device = DeviceKind.Nozzle, Shape = NozzleShape.Convergent, LossWord = null };
        foreach (CaseOption option in s_ofDivergence) nozzle.Options.Clear((int)option);
        nozzle.Throat = SectionOf(c.Throat);
        nozzle.Exit = default;
        nozzle.Back = default;
        return nozzle;
    }

    private static readonly CaseOption[] s_ofDivergence =
    [
        CaseOption.Flow, CaseOption.Recovery, CaseOption.LossCoefficient, CaseOption.Length, CaseOption.IncludedAngle, CaseOption.InletBlockage, CaseOption.Roughness,
    ];

    private static DeviceCase ThroatAsBack(DeviceCase c)
    {
        DeviceCase nozzle = Nozzle(c);
        foreach (StationSymbol symbol in (StationSymbol[])[StationSymbol.Pressure, StationSymbol.PressureDrop, StationSymbol.PressureRise, StationSymbol.PressureOverInlet, StationSymbol.PressureOverInletStagnation])
        {
            if (c.Throat.Has(symbol)) nozzle.Back.Set((int)symbol, c.Throat.Value((int)symbol), c.Throat.HalfPlace((int)symbol));
        }

        return nozzle;
    }

    private static DeviceCase AtPressure(DeviceCase c, double p)
    {
        DeviceCase nozzle = Nozzle(c);
        nozzle.Back.Set((int)StationSymbol.Pressure, p);
        return nozzle;
    }

    private static DeviceAnswer Convergence(DeviceCase c, DeviceCase nozzle) => RatedNozzle.Solve(nozzle) with { Case = c };

    private static DeviceAnswer ByFlow(DeviceCase c, DeviceAnswer choked, double critical, double inlet)
    {
        double flow = c.GivenMassFlow(choked.Inlet.State.rho)!.Value, most = choked.Performance.MassFlow!.Value;
        if (flow > most) throw Refusals.MoreThanChoked(flow, most);
        double p = RootFinder.Find(throat => Convergence(c, AtPressure(c, throat)).Performance.MassFlow!.Value - flow, critical, inlet, most - flow, -flow);
        return Convergence(c, AtPressure(c, p));
    }

    private static double BackPressure(DeviceCase c, DeviceAnswer nozzle)
    {
        double p1 = nozzle.Inlet.State.p, p01 = nozzle.Inlet.Stagnation!.Value.p;
        GivenSlots slots = c.Back.IsEmpty ? c.Exit : c.Back;
        if (slots.Has(StationSymbol.Pressure)) return slots.Value((int)StationSymbol.Pressure);
        return RelativePressures.Read(c.Back.IsEmpty ? "--exit" : "--back", slots, p1, p01).Single();
    }

    // The divergence from the throat on; behind a choked throat the back pressure fixes its exit.
    private static DeviceAnswer Joined(DeviceCase c, DeviceAnswer nozzle, double? back)
    {
        DeviceCase divergence = c with { Device = DeviceKind.Diffuser, Branch = Branch.Subsonic };
        foreach (CaseOption option in (CaseOption[])[CaseOption.Flow, CaseOption.DischargeCoefficient, CaseOption.Efficiency, CaseOption.VelocityCoefficient]) divergence.Options.Clear((int)option);
        StationAnswer throat = nozzle.Exit;
        divergence.Inlet = SectionOf(c.Throat);
        divergence.Exit = SectionOf(c.Exit);
        divergence.Throat = default;
        divergence.Back = default;
        if (c.Exit.Has(StationSymbol.DiameterRatio)) divergence.Exit = Bore(c);
        var inlet = new Inlet(throat, new StationFigures(), nozzle.Performance.MassFlow, false);
        DeviceAnswer diffuser = back is double p ? AtBack(divergence, inlet, p) : DiffuserSolver.Stations(divergence, inlet);
        diffuser = diffuser with { Performance = Performances.Of(diffuser) };
        return nozzle with
        {
            Case = c,
            Throat = throat,
            Exit = diffuser.Exit,
            Rating = null,
            BackPressure = null,
            Diffuser = diffuser.Diffuser,
            Divergence = diffuser,
            TakenIdeal = diffuser.TakenIdeal,
            EfficiencyImplied = false,
            BackFixesExit = back is not null,
            Assumptions = [.. nozzle.Assumptions.Where(line => !line.StartsWith("shape:", StringComparison.Ordinal)), .. diffuser.Assumptions],
            Ledger = nozzle.Ledger! with { ExitEnthalpy = diffuser.Exit.State.h, ExitKinetic = diffuser.Exit.Velocity!.Value * diffuser.Exit.Velocity.Value / 2 },
        };
    }

    private static DeviceAnswer AtBack(DeviceCase divergence, Inlet inlet, double back)
    {
        double A = StationFigures.Read(divergence.Exit, Station.Exit)[Figure.Section], n = StationFigures.Read(divergence.Exit, Station.Exit).Openings;
        double h0 = inlet.Station.StagnationEnthalpy!.Value, G = inlet.MassFlow!.Value / (A * n);
        if (!SubsonicExit.TryFind(divergence.Fluid, h0, back, G, out FluidState state, out double V) || V >= state.w) throw Refusals.VenturiSupersonic(back);
        StationFigures given = StationFigures.Read(divergence.Exit, Station.Exit);
        given.Add(Figure.P, back, Station.Exit);
        return DiffuserSolver.WithForm(divergence, DeviceSolver.Expand(divergence with { LossWord = null }, inlet, inlet, given));
    }

    private static GivenSlots Bore(DeviceCase c)
    {
        GivenSlots slots = default;
        slots.Set((int)StationSymbol.Diameter, c.Exit.Value((int)StationSymbol.DiameterRatio) * c.Inlet.Value((int)StationSymbol.Diameter));
        return slots;
    }

    private static GivenSlots SectionOf(GivenSlots slots)
    {
        foreach (StationSymbol symbol in Enum.GetValues<StationSymbol>())
        {
            if (symbol is not (StationSymbol.Area or StationSymbol.Diameter or StationSymbol.Rectangle or StationSymbol.Annulus or StationSymbol.DiameterRatio or StationSymbol.Openings))
                slots.Clear((int)symbol);
        }

        return slots;
    }
}
