using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>What an inlet recipe asks of the velocity.</summary>
internal enum VelocityNeed
{
    /// <summary>May be given; without it the inlet is at rest.</summary>
    Optional,

    /// <summary>Must be given.</summary>
    Required,

    /// <summary>Must not be given: it follows.</summary>
    Follows,
}

/// <summary>One way to fix an inlet.</summary>
/// <param name="Required">The figures it takes, besides the velocity.</param>
/// <param name="Velocity">What it asks of the velocity.</param>
/// <param name="Solve">Finds state and velocity.</param>
/// <param name="Sentence">What it does, in words.</param>
internal sealed record InletRecipe(Figure Required, VelocityNeed Velocity, InletSolve Solve, string Sentence);

/// <summary>Finds state and velocity of an inlet from its figures.</summary>
internal delegate Outcome InletSolve(Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V);

/// <summary>Every way to fix an inlet, as rows: they give dispatch, messages and tests.</summary>
internal static class InletRecipes
{
    internal static readonly InletRecipe[] All = [.. StaticPairs(), .. PitotPairs(), .. Mixed(), .. Plenums()];

    /// <summary>The row for a set of figures, or null.</summary>
    internal static InletRecipe? Find(Figure figures, bool velocityKnown)
    {
        VelocityNeed unmet = velocityKnown ? VelocityNeed.Follows : VelocityNeed.Required;
        foreach (InletRecipe row in All)
        {
            if (row.Required == figures && row.Velocity != unmet) return row;
        }

        return null;
    }

    private static IEnumerable<InletRecipe> StaticPairs() => StatePairs.All.Select(pair => new InletRecipe(
        pair.Mask,
        VelocityNeed.Optional,
        (Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V) =>
            InletSolvers.Static(fluid, given, pair, datum, out state, out V),
        "static state from two static properties"));

    private static IEnumerable<InletRecipe> PitotPairs()
    {
        foreach (StatePairs.Pair pair in StatePairs.All.Where(pair => pair.First == Figure.P))
        {
            yield return new InletRecipe(
                pair.Mask | Figure.P0,
                VelocityNeed.Follows,
                (Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V) =>
                    InletSolvers.PitotPair(fluid, given, pair, out state, out V),
                "velocity from static and stagnation pressure");
        }

        yield return new InletRecipe(
            Figure.P | Figure.P0 | Figure.T0, VelocityNeed.Follows, InletSolvers.PitotFromStagnation, "velocity from both pressures and T0");
        yield return new InletRecipe(
            Figure.P | Figure.P0 | Figure.H0, VelocityNeed.Follows, InletSolvers.PitotFromStagnation, "velocity from both pressures and h0");
    }

    private static IEnumerable<InletRecipe> Mixed()
    {
        yield return new InletRecipe(
            Figure.P | Figure.T0, VelocityNeed.Required, InletSolvers.StaticTapWithStagnationProbe, "static pressure with T0 and a velocity");
        yield return new InletRecipe(
            Figure.P | Figure.H0, VelocityNeed.Required, InletSolvers.StaticTapWithStagnationProbe, "static pressure with h0 and a velocity");
        Figure[] statics = [Figure.T, Figure.H, Figure.S, Figure.Rho, Figure.X, Figure.Superheat];
        foreach (Figure figure in statics)
        {
            StatePairs.Pair pair = StatePairs.Find(Figure.P | figure)!;
            yield return new InletRecipe(
                figure | Figure.P0,
                VelocityNeed.Required,
                (Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V) =>
                    InletSolvers.StaticWithStagnationPressure(fluid, given, pair, datum, out state, out V),
                "stagnation pressure with a static property and a velocity");
        }
    }

    private static IEnumerable<InletRecipe> Plenums()
    {
        Figure[] partners = [Figure.T0, Figure.H0];
        foreach (Figure partner in partners)
            yield return new InletRecipe(partner | Figure.P0, VelocityNeed.Optional, InletSolvers.FromStagnation, "stagnation state");
        Figure[] atRest = [Figure.H, Figure.S, Figure.X, Figure.Superheat];
        foreach (Figure partner in atRest)
        {
            StatePairs.Pair pair = StatePairs.Find(Figure.P | partner)!;
            yield return new InletRecipe(
                partner | Figure.P0,
                VelocityNeed.Follows,
                (Fluid fluid, StationFigures given, VelocityDatum datum, out FluidState state, out double V) =>
                    InletSolvers.Plenum(fluid, given, pair, out state, out V),
                "plenum at rest");
        }
    }
}
