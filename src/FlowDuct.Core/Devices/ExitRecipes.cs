using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>Finds the exit state from what is given.</summary>
internal delegate FluidState ExitSolve(ExitContext context);

/// <summary>One way to fix an exit.</summary>
/// <param name="Required">The figures it takes.</param>
/// <param name="Solve">Finds the state.</param>
/// <param name="Implies">True where the efficiency follows from the figures; false where it is given or taken as ideal.</param>
/// <param name="Sentence">What it does, in words.</param>
internal sealed record ExitRecipe(Figure Required, ExitSolve Solve, bool Implies, string Sentence);

/// <summary>Every way to fix an exit, as rows: they give dispatch, messages and tests.</summary>
internal static class ExitRecipes
{
    // Entropy is not among them: on an isentrope it picks nothing.
    private static readonly Figure[] s_selectors =
        [Figure.P, Figure.T, Figure.H, Figure.Rho, Figure.X, Figure.Superheat, Figure.V, Figure.M, Figure.Section];

    internal static readonly ExitRecipe[] All = [.. OnLossPath(), .. Measured(), .. AtKnownVelocity(), .. WithoutPressure()];

    /// <summary>The row for a set of figures, or null.</summary>
    internal static ExitRecipe? Find(Figure figures)
    {
        foreach (ExitRecipe row in All)
        {
            if (row.Required == figures) return row;
        }

        return null;
    }

    // One figure picks the point on the isentrope, or on the path of a given loss.
    private static IEnumerable<ExitRecipe> OnLossPath()
    {
        Figure[] losses = [Figure.None, Figure.Efficiency, Figure.Loss, Figure.P0];
        foreach (Figure loss in losses)
        {
            foreach (Figure selector in s_selectors)
            {
                yield return new ExitRecipe(
                    selector | loss,
                    context => ExitSolvers.OnPath(context, ExitSolvers.LossPath(context, loss), selector),
                    loss is Figure.P0,
                    loss == Figure.None ? "isentropic to one figure" : "given loss to one figure");
            }
        }
    }

    // Exit pressure and one measured figure: the efficiency is implied.
    private static IEnumerable<ExitRecipe> Measured()
    {
        Figure[] direct = [Figure.T, Figure.H, Figure.S, Figure.Rho, Figure.X, Figure.Superheat];
        foreach (Figure figure in direct)
        {
            StatePairs.Pair pair = StatePairs.Find(Figure.P | figure)!;
            yield return new ExitRecipe(pair.Mask, context => ExitSolvers.FromPair(context, pair), true, "measured exit state");
        }

        yield return new ExitRecipe(Figure.P | Figure.V, ExitSolvers.FromVelocity, true, "exit pressure and measured velocity");
        Figure[] searched = [Figure.M, Figure.Section];
        foreach (Figure figure in searched)
        {
            yield return new ExitRecipe(
                Figure.P | figure, context => ExitSolvers.OnIsobar(context, figure), true, "exit pressure and a figure that holds the velocity");
        }
    }

    // A known exit velocity or enthalpy fixes the other by the energy balance; a second figure finds the pressure.
    private static IEnumerable<ExitRecipe> AtKnownVelocity()
    {
        Figure[] energies = [Figure.V, Figure.H];
        Figure[] partners = [Figure.T, Figure.S, Figure.Rho, Figure.X, Figure.Superheat, Figure.Section];
        foreach (Figure energy in energies)
        {
            foreach (Figure partner in partners)
            {
                yield return new ExitRecipe(
                    energy | partner,
                    context => ExitSolvers.OnPath(context, ExitSolvers.EnergyPath(context, energy), partner),
                    true,
                    "known exit enthalpy and one figure");
            }
        }
    }

    private static IEnumerable<ExitRecipe> WithoutPressure()
    {
        Figure[] partners = [Figure.X, Figure.Superheat, Figure.Rho];
        foreach (Figure figure in partners)
        {
            StatePairs.Pair pair = StatePairs.Find(Figure.T | figure)!;
            yield return new ExitRecipe(pair.Mask, context => ExitSolvers.FromPair(context, pair), true, "measured exit state");
        }
    }
}
