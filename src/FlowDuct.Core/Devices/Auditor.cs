using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Judges mass, energy and entropy. Figures are judged within their own printed rounding.</summary>
internal static class Auditor
{
    // Closure of the property inverses: a difference below this is no entropy at all.
    internal const double EntropyFloor = 1e-6;

    // Of a flow: flux and section agree to the closure of the property inverses.
    private const double FlowClosure = 1e-9;

    internal static Audit Judge(DeviceAnswer a)
    {
        var audit = new Audit { Mass = Verdict.Holds };
        audit = JudgeMass(a, audit);
        audit = JudgeEnergy(a, audit);
        audit = a.SaturatedReading ? JudgeReading(a, audit) : JudgeEntropy(a, audit);
        return audit.Entropy == Verdict.Broken ? WithLimits(a, audit) : audit;
    }

    /// <summary>The least entropy rise that the second law allows: none, or the fall that heat loss at the boundary explains.</summary>
    internal static double LeastRise(DeviceCase c) =>
        c.Heat < 0 ? c.Heat / c.ValueOr(CaseOption.BoundaryTemperature, c.AmbientTemperature) : 0;

    private static Audit JudgeMass(DeviceAnswer a, Audit audit)
    {
        if (a.Rating is not null) return JudgeRatedMass(a, audit);
        if (a.Performance.MassFlow is not double flow) return audit;
        audit = JudgeSection(a, audit, flow, Station.Inlet);
        return audit.Mass == Verdict.Broken ? audit : JudgeSection(a, audit, flow, Station.Exit);
    }

    // A given flow beside sections: against the flow that they pass, or, where it implies the coefficient, against the isentropic flow.
    private static Audit JudgeRatedMass(DeviceAnswer a, Audit audit)
    {
        if (a.Case.GivenMassFlow(a.Inlet.State.rho) is not double flow || Surplus(a) is not double surplus) return audit;
        double gap = Implied(a) ? surplus : Math.Abs(surplus);
        if (gap <= FlowClosure) return audit;
        double rounding = Rounding.Effect(a.Case, Surplus, surplus);
        return audit with
        {
            Mass = gap <= rounding ? Verdict.WithinRounding : Rating.FrozenFlow.Allows(a, flow) ? Verdict.Holds : Verdict.Broken,
            MassFlowFound = flow / (1 + surplus),
            MassFlowRounding = rounding * flow,
        };
    }

    private static bool Implied(DeviceAnswer a) => !a.Case.Has(CaseOption.DischargeCoefficient);

    private static double? Surplus(DeviceAnswer a)
    {
        if (a.Rating is not Rating.NozzleRating rating || a.Performance.DischargeCoefficient is null) return null;
        double? flow = a.Case.GivenMassFlow(a.Inlet.State.rho);
        return (flow / (Implied(a) ? rating.IsentropicFlow : rating.MassFlow)) - 1;
    }

    private static Audit JudgeSection(DeviceAnswer a, Audit audit, double flow, Station station)
    {
        bool inlet = station == Station.Inlet;
        GivenSlots slots = inlet ? a.Case.Inlet : a.Case.Exit;
        if (!StationFigures.HaveSection(slots)) return audit;
        if (Carried(inlet ? a.Inlet : a.Exit) is not double carried) return audit;
        double gap = Math.Abs(carried - flow);
        if (gap <= FlowClosure * flow) return audit;
        double rounding = Rounding.Effect(a.Case, Gap, carried - flow);
        return audit with
        {
            Mass = gap <= rounding ? Verdict.WithinRounding : Verdict.Broken,
            MassFlowFound = carried,
            MassFlowRounding = rounding,
        };

        double? Gap(DeviceAnswer b) => Carried(inlet ? b.Inlet : b.Exit) - b.Performance.MassFlow;
    }

    private static double? Carried(StationAnswer at) => at.Flux * at.Area * at.Openings;

    private static Audit JudgeEnergy(DeviceAnswer a, Audit audit)
    {
        if (a.SaturatedReading) return audit with { Energy = Verdict.NotJudged };
        if (a.Exit.Velocity is not null) return audit with { Energy = Verdict.Holds };
        double shortfall = Shortfall(a);
        double rounding = Rounding.Effect(a.Case, b => Shortfall(b), shortfall);
        Verdict verdict = shortfall <= rounding ? Verdict.WithinRounding : Verdict.Broken;
        return audit with { Energy = verdict, EnergyShortfall = shortfall };
    }

    private static double Shortfall(DeviceAnswer a) => a.Exit.State.h - TotalEnthalpyAtExit(a);

    internal static double TotalEnthalpyAtExit(DeviceAnswer a)
    {
        double g = a.Case.ValueOr(CaseOption.Gravity, Flow.Energy.StandardGravity);
        return a.Inlet.StagnationEnthalpy!.Value + a.Case.Heat + (g * (a.Inlet.Elevation - a.Exit.Elevation));
    }

    private static Audit JudgeEntropy(DeviceAnswer a, Audit audit)
    {
        double margin = Margin(a);
        if (margin >= -EntropyFloor) return audit with { Entropy = Verdict.Holds, EntropyMargin = margin };
        double rounding = Rounding.Effect(a.Case, b => b.Exit.HasState ? Margin(b) : null, margin);
        return audit with
        {
            Entropy = margin + rounding >= -EntropyFloor ? Verdict.WithinRounding : Verdict.Broken,
            EntropyMargin = margin,
            EntropyRounding = rounding,
        };
    }

    private static double Margin(DeviceAnswer a) => a.Exit.State.s - a.Inlet.State.s - LeastRise(a.Case);

    // Impossible only if every state that the reading allows is.
    private static Audit JudgeReading(DeviceAnswer a, Audit audit)
    {
        (FluidState wettest, FluidState driest) = SaturatedExit.Bounds(a);
        double margin = driest.s - a.Inlet.State.s - LeastRise(a.Case);
        double total = TotalEnthalpyAtExit(a);
        audit = audit with { Energy = wettest.h <= total ? Verdict.Holds : Verdict.Broken };
        if (margin >= -EntropyFloor) return audit with { Entropy = Verdict.Holds };
        double rounding = Rounding.Effect(a.Case, ReadingMargin, margin);
        return audit with
        {
            Entropy = margin + rounding >= -EntropyFloor ? Verdict.WithinRounding : Verdict.Broken,
            EntropyMargin = margin,
            EntropyRounding = rounding,
        };
    }

    private static double? ReadingMargin(DeviceAnswer a) =>
        a.SaturatedReading ? SaturatedExit.Bounds(a).Driest.s - a.Inlet.State.s - LeastRise(a.Case) : null;

    private static Audit WithLimits(DeviceAnswer a, Audit audit)
    {
        double total = TotalEnthalpyAtExit(a), s = a.Inlet.State.s + LeastRise(a.Case);
        if (a.Fluid.FromPS(a.Exit.State.p, s, default, out FluidState ideal) == Outcome.Ok)
            audit = audit with { HighestExitVelocity = Flow.Energy.Velocity(total, ideal.h) };
        if (a.Exit.Velocity is double V && a.Fluid.FromHS(total - (V * V / 2), s, default, out FluidState slow) == Outcome.Ok)
            audit = audit with { HighestExitPressure = slow.p };
        return audit;
    }
}
