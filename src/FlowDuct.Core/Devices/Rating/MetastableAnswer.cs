using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>A held phase at its furthest from equilibrium, in the exit plane or where it gives way before, and what it turns into.</summary>
/// <param name="Undercooling">Saturation temperature at the pressure there minus temperature, K; negative is superheat of a liquid.</param>
/// <param name="SupersaturationRatio">Pressure there over saturation pressure at the temperature there.</param>
/// <param name="EquilibriumFlow">Flow of the same nozzle at equilibrium, kg/s.</param>
/// <param name="RevertedMoisture">Moisture after the return to equilibrium at constant p, V and h.</param>
/// <param name="FluxChange">Mass flux behind the return over that before it.</param>
/// <param name="OnsetPressure">Pressure at which the phase gives way, Pa; null where it holds to the exit plane.</param>
/// <param name="OnsetAreaRatio">Section there over the throat; null where it holds, or where no section is known.</param>
/// <param name="IsLiquid">True of a liquid that does not flash.</param>
/// <param name="FlowIsLeast">True where the phase gives way in the throat, before it passes the most it could.</param>
internal readonly record struct MetastableAnswer(
    double Undercooling,
    double? SupersaturationRatio,
    double? EquilibriumFlow,
    double? RevertedMoisture,
    double? FluxChange,
    double? OnsetPressure,
    double? OnsetAreaRatio,
    bool IsLiquid,
    bool FlowIsLeast)
{
    /// <summary>Null where no phase is held beyond saturation.</summary>
    internal static MetastableAnswer? Of(DeviceAnswer a)
    {
        if (a.Rating is not NozzleRating rating || ReferenceEquals(a.ExpandingFluid, a.Fluid)) return null;
        bool within = Onset(a, rating, out FluidState held, out double flux);
        if (!within) (held, flux) = (rating.Exit, rating.ExitVelocity / rating.Exit.v);
        if ((held.Notices & Notices.Metastable) == 0 || !a.Fluid.TrySaturationTemperature(held.p, out double T)) return null;
        double? ratio = a.Fluid.TrySaturationPressure(held.T, out double p) ? held.p / p : null;
        bool reverts = a.Fluid.FromPH(held.p, held.h, default, out FluidState after) == Outcome.Ok, inThroat = rating is { AtKink: true, Choked: true };
        return new MetastableAnswer(
            T - held.T,
            ratio,
            FlowAtEquilibrium(a),
            reverts && after.HasQuality ? 1 - after.x : null,
            reverts ? held.v / after.v : null,
            within || inThroat ? held.p : null,
            within || inThroat ? AreaRatio(a, rating, flux) : null,
            held.Phase == Phase.Liquid,
            inThroat);
    }

    // The last state of one phase before a wet exit, or before a shock in wet steam.
    private static bool Onset(DeviceAnswer a, in NozzleRating rating, out FluidState state, out double flux)
    {
        FluidState end = rating.Shock?.Upstream ?? rating.Exit, rest = a.Inlet.Stagnation!.Value;
        (state, flux) = (default, 0);
        if (end.Phase != Phase.Wet || end.p >= rest.p) return false;
        var path = new LossPath(a.ExpandingFluid, rest.h, rest.h, rest.s, a.Case.GivenEfficiency ?? 1);
        double p = RangeEdge.Find(at => path.At(at, default, out FluidState on, out _) == Outcome.Ok && on.Phase != Phase.Wet, rest.p, end.p);
        if (path.At(p, default, out state, out double V) != Outcome.Ok) return false;
        flux = V / state.v;
        return true;
    }

    private static double? AreaRatio(DeviceAnswer a, in NozzleRating rating, double flux) =>
        (a.Throat ?? a.Exit).Area is double A && flux > 0 ? rating.MassFlow / (flux * A * (a.Throat ?? a.Exit).Openings * (a.Performance.DischargeCoefficient ?? 1)) : null;

    private static double? FlowAtEquilibrium(DeviceAnswer a)
    {
        if (a.Performance.DischargeCoefficient is null) return null;
        DeviceCase equilibrium = a.Case with { Expansion = ExpansionModel.Equilibrium };
        equilibrium.Options.Clear((int)Quantities.CaseOption.Onset);
        return RatedNozzle.Solve(equilibrium).Performance.MassFlow;
    }
}
