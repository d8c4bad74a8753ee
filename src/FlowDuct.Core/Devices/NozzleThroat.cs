using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Where a nozzle chokes, and what that says of its shape and regime.</summary>
internal static class NozzleThroat
{
    internal static DeviceAnswer Place(DeviceAnswer a)
    {
        FluidState inlet = a.Inlet.State;
        if (a.Inlet.Velocity >= inlet.w) return a with { Performance = a.Performance with { Regime = "fully-expanded", Choked = false } };
        FluidState rest = a.Inlet.Stagnation!.Value;
        if (!Choking.TryFind(a.Fluid, rest, out FluidState critical, out bool atKink)) return a;

        double p2 = a.Exit.State.p, band = DeviceSolver.LimitTolerance * rest.p;
        bool below = p2 < critical.p - band;
        bool heated = a.Case.Heat != 0;
        if (heated && (below || a.Exit.Mach >= 1)) throw Refusals.HeatWithChoking();
        bool bore = StationFigures.HaveSection(a.Case.Exit);
        NozzleShape shape = Shape(a.Case.Shape, bore, below);
        if (shape == NozzleShape.Convergent && below) throw Refusals.ConvergentBelowCritical(p2, critical.p);
        string? regime = Regime(a, below, p2 <= critical.p + band);
        List<string> assumptions = [.. a.Assumptions];
        if (a.Case.Shape == NozzleShape.Auto) assumptions.Add(ShapeWords(shape, bore));
        if (atKink) assumptions.Add("the flux is greatest where the flow meets saturation, not where M = 1");
        Performance performance = a.Performance with
        {
            Regime = regime,
            Choked = p2 <= critical.p + band,
            CriticalPressureRatio = critical.p / rest.p,
            DischargeCoefficient = a.Case.Has(CaseOption.DischargeCoefficient) ? a.Case.Value(CaseOption.DischargeCoefficient) : null,
        };
        bool hasThroat = shape == NozzleShape.ConvergentDivergent && below;
        StationAnswer? throat = hasThroat
            ? new StationAnswer { State = critical, Velocity = Energy.Velocity(rest.h, critical.h), Stagnation = rest }.Carrying(a.Performance.MassFlow / a.Case.ValueOr(CaseOption.DischargeCoefficient, 1))
            : null;
        return a with { Throat = throat, Performance = performance, Assumptions = assumptions };
    }

    private static NozzleShape Shape(NozzleShape given, bool bore, bool below)
    {
        if (given != NozzleShape.Auto) return given;
        return bore || !below ? NozzleShape.Convergent : NozzleShape.ConvergentDivergent;
    }

    private static string ShapeWords(NozzleShape shape, bool bore) => shape switch
    {
        NozzleShape.ConvergentDivergent => "shape: convergent-divergent, since the exit pressure is below the critical pressure",
        _ when bore => "shape: convergent, since one section is given",
        _ => "shape: convergent, since the exit pressure is not below the critical pressure",
    };

    private static string? Regime(DeviceAnswer a, bool below, bool atOrBelow)
    {
        if (a.Exit.Velocity == 0) return "no-flow";
        if (!below) return atOrBelow ? "choked" : "subsonic";
        return a.Exit.Mach is not double M ? null : M < 1 ? "choked-subsonic-exit" : "fully-expanded";
    }
}
