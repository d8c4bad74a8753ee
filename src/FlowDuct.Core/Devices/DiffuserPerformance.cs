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
            Regime = a.Diffuser?.Shock is Diffusers.InletShock { InThroat: false } ? "supersonic-shock-at-inlet" : V1 < first.w ? "subsonic" : "supersonic",
            Shock = a.Diffuser?.Shock?.Shock is Rating.ShockAnswer shock ? shock with { AreaRatio = 1 } : null,
            ShockStagnationPressureRatio = a.Diffuser?.Shock is null ? null : Diffusers.DiffuserSolver.Entry(a).Stagnation?.p / rest.p,
            Recovery = recovery,
            RecoveryDynamic = rise / (first.rho * V1 * V1 / 2),
            IdealRecovery = ideal,
            Effectiveness = ideal is double limit && limit != 0 ? recovery / limit : null,
        };
        performance = performance with { Diffuser = Diffusers.DiffuserFigures.Of(a with { Performance = performance }, recovery) };
        if (a.Exit.Stagnation is not FluidState last) return performance;
        bool known = a.Fluid.FromPS(last.p, first.s, default, out FluidState compressed) == Outcome.Ok;
        return performance with
        {
            LossCoefficient = performance.EntropyRise == 0 && a.Case.Heat == 0 ? 0 : (rest.p - last.p) / head,
            IsentropicEfficiency = known ? (compressed.h - first.h) / (rest.h - first.h) : null,
            PolytropicEfficiency = a.Case.Heat == 0 ? Polytropic(first, last) : null,
        };
    }

    // From the static inlet to the stagnation state behind: dh = v dp/eta, so ds = (1 - eta) dh/T, with T between the ends by its logarithmic mean.
    private static double? Polytropic(in FluidState first, in FluidState last)
    {
        double rise = last.h - first.h, made = last.s - first.s;
        if (!(rise > 0)) return null;
        double ratio = last.T / first.T, T = Math.Abs(ratio - 1) < 1e-6 ? (last.T + first.T) / 2 : (last.T - first.T) / Math.Log(ratio);
        return 1 - (T * made / rise);
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
