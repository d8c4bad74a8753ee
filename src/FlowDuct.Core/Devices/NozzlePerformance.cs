using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>Figures of a nozzle.</summary>
internal static class NozzlePerformance
{
    internal static Performance Add(DeviceAnswer a, Performance performance)
    {
        double total = Auditor.TotalEnthalpyAtExit(a), p2 = a.Exit.State.p, p01 = a.Inlet.Stagnation!.Value.p;
        if (!TryIdealDrop(a, total, out double drop)) return performance;
        double Vs = Flow.Energy.Velocity(drop, 0);
        double? efficiency = drop > DeviceSolver.EnergyFloor(total) && a.Exit.Velocity is double V ? V * V / 2 / drop : null;
        bool isLossless = performance.EntropyRise == 0 && a.Case.Heat == 0;
        performance = performance with
        {
            ExitVelocityIdeal = Vs,
            IsentropicEfficiency = efficiency,
            VelocityCoefficient = efficiency is double eta ? Math.Sqrt(eta) : null,
            LossCoefficient = a.Exit.Stagnation is FluidState rest && rest.p > p2 ? (isLossless ? 0 : (p01 - rest.p) / (rest.p - p2)) : null,
        };
        return a.SaturatedReading ? WithRanges(a, performance, total, drop) : performance;
    }

    // A given efficiency fixes the drop by its definition; otherwise the isentropic exit is asked for.
    private static bool TryIdealDrop(DeviceAnswer a, double total, out double drop)
    {
        bool given = a.Rating is null && !a.EfficiencyImplied && a.Case.Heat == 0 && a.Exit.Velocity is not null;
        drop = given && a.Case.GivenEfficiency is double eta ? (total - a.Exit.State.h) / eta : 0;
        if (drop > 0) return true;
        bool solved = a.ExpandingFluid.FromPS(a.Exit.State.p, a.Inlet.State.s, default, out FluidState ideal) == Outcome.Ok;
        drop = total - ideal.h;
        return solved;
    }

    // The driest state that energy allows is the slowest, the wettest that entropy allows the fastest.
    private static Performance WithRanges(DeviceAnswer a, Performance performance, double total, double drop)
    {
        (FluidState wettest, FluidState driest) = SaturatedExit.Bounds(a);
        double s = Math.Max(a.Inlet.State.s + Auditor.LeastRise(a.Case), wettest.s);
        if (s > driest.s || a.Fluid.FromPS(a.Exit.State.p, s, default, out FluidState fast) != Outcome.Ok) return performance;
        double most = Flow.Energy.Velocity(total, fast.h), least = Flow.Energy.Velocity(total, driest.h);
        return performance with
        {
            ExitVelocityRange = new Interval(least, most),
            EfficiencyRange = drop > 0 ? new Interval(least * least / 2 / drop, most * most / 2 / drop) : null,
        };
    }
}
