using System.Numerics;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>The rows of recipes: one row or one clear refusal for every subset of givens.</summary>
public class RecipeTests
{
    private static readonly (StationSymbol Symbol, double Value)[] s_inlet =
    [
        (StationSymbol.Pressure, 4e5), (StationSymbol.Temperature, 400), (StationSymbol.Enthalpy, 4.01e5), (StationSymbol.Entropy, 6.6e3),
        (StationSymbol.InternalEnergy, 2.9e5), (StationSymbol.Density, 3.5), (StationSymbol.Quality, 0.9), (StationSymbol.Superheat, 20),
        (StationSymbol.StagnationPressure, 4.2e5), (StationSymbol.StagnationTemperature, 405), (StationSymbol.StagnationEnthalpy, 4.06e5),
        (StationSymbol.Velocity, 100), (StationSymbol.Mach, 0.25),
    ];

    private static readonly (StationSymbol Symbol, double Value)[] s_exit =
    [
        (StationSymbol.Pressure, 3e5), (StationSymbol.Temperature, 370), (StationSymbol.Enthalpy, 3.71e5), (StationSymbol.Entropy, 6.7e3),
        (StationSymbol.InternalEnergy, 2.7e5), (StationSymbol.Density, 2.8), (StationSymbol.Quality, 0.9), (StationSymbol.Superheat, 20),
        (StationSymbol.StagnationPressure, 4e5), (StationSymbol.StagnationTemperature, 405), (StationSymbol.StagnationEnthalpy, 4.06e5),
        (StationSymbol.Velocity, 240), (StationSymbol.Mach, 0.6), (StationSymbol.PressureDrop, 1e5),
    ];

    [Fact]
    public void No_two_rows_take_the_same_figures()
    {
        Assert.Equal(ExitRecipes.All.Length, ExitRecipes.All.Select(row => row.Required).Distinct().Count());
        foreach (bool velocity in (bool[])[false, true])
        {
            Figure[] open = [.. InletRecipes.All
                .Where(row => row.Velocity != (velocity ? VelocityNeed.Follows : VelocityNeed.Required)).Select(row => row.Required)];
            Assert.Equal(open.Length, open.Distinct().Count());
        }
    }

    [Fact]
    public void Every_row_says_what_it_does()
    {
        Assert.All(InletRecipes.All, row => Assert.NotEqual(string.Empty, row.Sentence));
        Assert.All(ExitRecipes.All, row => Assert.NotEqual(string.Empty, row.Sentence));
    }

    [Fact]
    public void Every_subset_of_inlet_figures_is_solved_or_refused_in_words()
    {
        (int solved, int refused) = (0, 0);
        for (int mask = 0; mask < 1 << s_inlet.Length; mask++)
        {
            if (BitOperations.PopCount((uint)mask) > 4) continue;
            bool ok = Answers(Subset(s_inlet, mask), [(StationSymbol.Pressure, 3e5)]);
            (solved, refused) = ok ? (solved + 1, refused) : (solved, refused + 1);
        }

        Assert.InRange(solved, 40, refused);
    }

    [Theory]
    [InlineData(null)]
    [InlineData(CaseOption.Efficiency)]
    [InlineData(CaseOption.LossCoefficient)]
    public void Every_subset_of_exit_figures_is_solved_or_refused_in_words(object? loss)
    {
        (int solved, int refused) = (0, 0);
        for (int mask = 0; mask < 1 << s_exit.Length; mask++)
        {
            if (BitOperations.PopCount((uint)mask) > 3) continue;
            bool ok = Answers([(StationSymbol.Pressure, 4e5), (StationSymbol.Temperature, 400)], Subset(s_exit, mask), loss as CaseOption?);
            (solved, refused) = ok ? (solved + 1, refused) : (solved, refused + 1);
        }

        Assert.InRange(solved, 5, refused);
    }

    private static bool Answers(
        (StationSymbol, double)[] inlet, (StationSymbol, double)[] exit, CaseOption? loss = null)
    {
        (CaseOption, double)[] options = loss is CaseOption option ? [(option, 0.9)] : [];
        try
        {
            DeviceAnswer answer = DeviceSolver.Solve(Cases.Exact(DeviceKind.Nozzle, GasCatalogue.Air, inlet, exit, options));
            Assert.True(double.IsFinite(answer.Exit.State.p) && double.IsFinite(answer.Exit.State.T));
            Assert.True(answer.Exit.Velocity is null || double.IsFinite(answer.Exit.Velocity.Value));
            return true;
        }
        catch (FlowDuctException refusal)
        {
            Assert.NotEqual(string.Empty, refusal.Refusal.Place);
            Assert.NotEqual(string.Empty, refusal.Refusal.Reason);
            Assert.NotEqual(string.Empty, refusal.Refusal.NextStep);
            Assert.DoesNotContain("NaN", refusal.Message, StringComparison.OrdinalIgnoreCase);
            return false;
        }
    }

    private static (StationSymbol, double)[] Subset((StationSymbol Symbol, double Value)[] all, int mask) =>
        [.. all.Where((_, i) => (mask >> i & 1) != 0)];
}
