using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>Figures of a diffuser.</summary>
internal static class DiffuserPerformance
{
    internal static Performance Add(DeviceAnswer a, Performance performance)
    {
        FluidState first = a.Inlet.State, rest = a.Inlet.Stagnation!.Value;
        double V1 = a.Inlet.Velocity!.Value, head = rest.p - first.p, rise = a.Exit.State.p - first.p;
        double recovery = rise / head;
        double? ideal = IdealRecovery(a);
        performance = performance with
        {
            Regime = V1 < first.w ? "subsonic" : "supersonic",
            Recovery = recovery,
            RecoveryDynamic = rise / (first.rho * V1 * V1 / 2),
            IdealRecovery = ideal,
            Effectiveness = ideal is double limit && limit != 0 ? recovery / limit : null,
        };
        if (a.Exit.Stagnation is not FluidState last) return performance;
        bool known = a.Fluid.FromPS(last.p, first.s, default, out FluidState compressed) == Outcome.Ok;
        return performance with
        {
            LossCoefficient = performance.EntropyRise == 0 && a.Case.Heat == 0 ? 0 : (rest.p - last.p) / head,
            IsentropicEfficiency = known ? (compressed.h - first.h) / (rest.h - first.h) : null,
        };
    }

    // The isentropic recovery at the actual area ratio, which continuity gives without any flow.
    private static double? IdealRecovery(DeviceAnswer a)
    {
        FluidState first = a.Inlet.State, rest = a.Inlet.Stagnation!.Value;
        if (a.Exit.Velocity == 0) return 1;
        if (a.Inlet.Velocity >= first.w || a.Exit.Flux is not double G || a.Case.Heat != 0) return null;
        if (!Choking.TryFind(a.Fluid, rest.h, rest.s, rest.p, out FluidState throat, out _)) return null;
        if (G > Flow.Energy.Velocity(rest.h, throat.h) / throat.v) return null;
        double p = Choking.SubsonicPressure(a.Fluid, rest.h, rest.s, G, throat.p, rest.p);
        return (p - first.p) / (rest.p - first.p);
    }
}
