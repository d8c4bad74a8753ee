using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>The choked throat of a divergent nozzle and the three back pressures that part its regimes.</summary>
internal readonly record struct DivergentLimits
{
    // Starts of a search only: pressure falls by this to each side of the root, and with the flux about as in an expanding gas.
    private const double Step = 0.6;
    private const double StartExponent = 1.3;

    internal FluidState Throat { get; init; }

    internal double ThroatVelocity { get; init; }

    internal bool AtKink { get; init; }

    /// <summary>Isentropic flux of the choked throat, kg/(m2.s).</summary>
    internal double Flux { get; init; }

    /// <summary>The supersonic exit plane.</summary>
    internal FluidState Exit { get; init; }

    internal double ExitVelocity { get; init; }

    /// <summary>Efficiency of the divergence alone, from the throat to the supersonic exit plane.</summary>
    internal double DivergenceEfficiency { get; init; }

    /// <summary>The normal shock in the exit plane.</summary>
    internal ShockAnswer Behind { get; init; }

    internal BackPressureLimits Pressures { get; init; }

    /// <summary>Why the supersonic limits are missing, where they are.</summary>
    internal RatingOutcome Hidden { get; init; }

    /// <summary>Finds throat and limits.</summary>
    internal static RatingOutcome Find(in RatingInlet inlet, in NozzleGeometry geometry, out DivergentLimits limits)
    {
        limits = default;
        if (!Choking.TryFind(inlet.Fluid, inlet.h0, inlet.s, inlet.p0, out FluidState throat, out bool atKink)) return RatingOutcome.NoThroat;
        double V = Energy.Velocity(inlet.h0, throat.h);
        if (atKink && SlowBehindReversion(inlet.Fluid, throat, V)) return RatingOutcome.InsideReversion;
        limits = new DivergentLimits { Throat = throat, ThroatVelocity = V, AtKink = atKink, Flux = V / throat.v, DivergenceEfficiency = 1 };
        double target = limits.Flux * geometry.ThroatArea * (geometry.DischargeCoefficient ?? 1) / geometry.ExitArea;
        var path = new LossPath(inlet.Fluid, inlet.h0, inlet.h0, inlet.s, geometry.Efficiency);
        RatingOutcome outcome = Subsonic(inlet, path, throat, target, ref limits);
        if (outcome != RatingOutcome.Ok) return outcome;
        outcome = Supersonic(inlet, path, throat, target, ref limits);
        limits = limits with { Hidden = outcome };
        return RatingOutcome.Ok;
    }

    // From the throat towards rest the flux of the path falls to nothing.
    private static RatingOutcome Subsonic(in RatingInlet inlet, LossPath path, in FluidState throat, double target, ref DivergentLimits limits)
    {
        if (!(FluxAt(path, throat.p) > target)) return RatingOutcome.TooGreatALoss;
        double start = Math.Max(inlet.p0 - (target * target * throat.v / 2), (throat.p + inlet.p0) / 2);
        if (!FluxRoot.TryFind(path, target, throat.p, inlet.p0, start, out FluidState slow, out _)) return RatingOutcome.NotConverged;
        limits = limits with { Pressures = new BackPressureLimits(slow.p, null, null) };
        return RatingOutcome.Ok;
    }

    private static RatingOutcome Supersonic(in RatingInlet inlet, LossPath path, in FluidState throat, double target, ref DivergentLimits limits)
    {
        double low = throat.p;
        do
        {
            low *= Step;
            if (path.At(low, default, out _, out _) == Outcome.Ok) continue;
            low = LastInRange(path, low / Step, low);
            if (FluxAt(path, low) > target) return RatingOutcome.OutsideRange;
        }
        while (FluxAt(path, low) > target);
        double start = Math.Max(low, throat.p * Math.Pow(target / limits.Flux, StartExponent));
        if (!FluxRoot.TryFind(path, target, throat.p, low, start, out FluidState exit, out double V)) return Unsolved(inlet.Fluid);
        limits = limits with { Exit = exit, ExitVelocity = V, DivergenceEfficiency = OfDivergence(path, throat, exit) };
        if (!(limits.DivergenceEfficiency > 0)) return RatingOutcome.TooGreatALoss;
        limits = limits with { Pressures = limits.Pressures with { FullExpansion = exit.p } };
        if (!NormalShock.TryFind(exit.Phase == Phase.Wet ? inlet.Fluid.Relaxed : inlet.Fluid, exit, V, out FluidState behind, out double V2)) return RatingOutcome.OutsideRange;
        limits = limits with
        {
            Behind = new ShockAnswer(exit, V, behind, V2, limits.Flux / target),
            Pressures = limits.Pressures with { ShockAtExit = behind.p },
        };
        return RatingOutcome.Ok;
    }

    // Where a held phase gives way the flux falls by a step, and an exit may lie inside it.
    private static RatingOutcome Unsolved(Fluid fluid) => ReferenceEquals(fluid, fluid.Relaxed) ? RatingOutcome.NotConverged : RatingOutcome.InsideReversion;

    // A held phase that gives way in the throat and leaves a stream slower than sound would need a second throat.
    private static bool SlowBehindReversion(Fluid fluid, in FluidState throat, double V) => !ReferenceEquals(fluid, fluid.Relaxed)
        && fluid.Relaxed.FromPH(throat.p, throat.h, default, out FluidState relaxed) == Outcome.Ok && V <= relaxed.w;

    // Apart from its caller: what it captures is allocated only where the range ends.
    private static double LastInRange(LossPath path, double inside, double outside) =>
        RangeEdge.Find(p => path.At(p, default, out _, out _) == Outcome.Ok, inside, outside);

    private static double OfDivergence(LossPath path, in FluidState throat, in FluidState exit)
    {
        if (path.Efficiency == 1 || path.Fluid.FromPS(exit.p, path.s, exit, out FluidState ideal) != Outcome.Ok) return 1;
        return (throat.h - exit.h) / (throat.h - ideal.h);
    }

    private static double FluxAt(LossPath path, double p) => path.At(p, default, out FluidState at, out double V) == Outcome.Ok ? V / at.v : 0;
}
