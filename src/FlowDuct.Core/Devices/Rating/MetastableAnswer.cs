using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>A held phase in the exit plane, and what it turns into when it reverts.</summary>
/// <param name="Undercooling">Saturation temperature at the exit pressure minus exit temperature, K; negative is superheat of a liquid.</param>
/// <param name="SupersaturationRatio">Exit pressure over saturation pressure at the exit temperature.</param>
/// <param name="EquilibriumFlow">Flow of the same nozzle at equilibrium, kg/s.</param>
/// <param name="RevertedMoisture">Moisture after the return to equilibrium at constant p, V and h.</param>
/// <param name="FluxChange">Mass flux behind the reversion over that before it.</param>
internal readonly record struct MetastableAnswer(
    double Undercooling, double? SupersaturationRatio, double? EquilibriumFlow, double? RevertedMoisture, double? FluxChange)
{
    /// <summary>Null where the exit plane is an equilibrium state after all.</summary>
    internal static MetastableAnswer? Of(DeviceAnswer a)
    {
        FluidState exit = a.Exit.State;
        if ((exit.Notices & Notices.Metastable) == 0 || !a.Fluid.TrySaturationTemperature(exit.p, out double T)) return null;
        double? ratio = a.Fluid.TrySaturationPressure(exit.T, out double p) ? exit.p / p : null;
        bool reverts = a.Fluid.FromPH(exit.p, exit.h, default, out FluidState after) == Outcome.Ok;
        return new MetastableAnswer(
            T - exit.T, ratio, FlowAtEquilibrium(a), reverts && after.HasQuality ? 1 - after.x : null, reverts ? exit.v / after.v : null);
    }

    private static double? FlowAtEquilibrium(DeviceAnswer a) => a.Performance.DischargeCoefficient is null
        ? null
        : RatedNozzle.Solve(a.Case with { Expansion = ExpansionModel.Equilibrium }).Performance.MassFlow;
}
