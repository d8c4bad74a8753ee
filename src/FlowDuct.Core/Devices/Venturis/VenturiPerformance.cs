using FlowDuct.Fluids;

namespace FlowDuct.Devices.Venturis;

/// <summary>Figures of a venturi: those of its divergence on the throat, and what remains of the pressure behind it.</summary>
internal static class VenturiPerformance
{
    internal static Performance Add(DeviceAnswer a, Performance performance)
    {
        Performance of = a.Divergence!.Performance;
        FluidState inlet = a.Inlet.State, throat = a.Throat!.State, exit = a.Exit.State;
        double drop = inlet.p - throat.p, loss = inlet.p - exit.p;
        bool choked = performance.Choked == true;
        return performance with
        {
            Regime = !choked ? performance.Regime : a.BackFixesExit ? "shock-in-divergence" : "choked-subsonic-exit",
            Recovery = of.Recovery,
            RecoveryDynamic = of.RecoveryDynamic,
            IdealRecovery = of.IdealRecovery,
            Effectiveness = of.Effectiveness,
            LossCoefficient = of.LossCoefficient,
            Diffuser = of.Diffuser,
            Limits = default,
            Venturi = new VenturiFigures(drop, loss, drop > 0 ? loss / drop : null, VenturiSolver.ChokingRatio(a.Case)),
        };
    }
}

/// <summary>What a metering throat with recovery costs.</summary>
/// <param name="ThroatDrop">Static pressure of the inlet minus that of the throat, Pa.</param>
/// <param name="PermanentLoss">Static pressure of the inlet minus that of the exit, Pa.</param>
/// <param name="LossOverDrop">The second over the first.</param>
/// <param name="ChokingRatio">Exit pressure over inlet stagnation pressure at which the throat just chokes.</param>
internal sealed record VenturiFigures(double ThroatDrop, double PermanentLoss, double? LossOverDrop, double? ChokingRatio);
