using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Solves a nozzle or a diffuser without geometry: inlet, exit, performance, audit, findings.</summary>
internal static class DeviceSolver
{
    // A pressure within this part of p0 of a limit is at the limit.
    internal const double LimitTolerance = 1e-6;

    /// <summary>The whole answer, or a refusal.</summary>
    internal static DeviceAnswer Solve(DeviceCase c, Extent extent = Extent.Full)
    {
        DeviceAnswer answer = Stations(c, extent);
        answer = answer with { Audit = Auditor.Judge(answer) };
        answer = answer with { Performance = Performances.Of(answer) };
        return answer with { Findings = FindingRules.Apply(answer) };
    }

    /// <summary>The stations alone; the audit moves the figures by their rounding and asks again.</summary>
    internal static DeviceAnswer Stations(DeviceCase c, Extent extent = Extent.Full)
    {
        if (c.Has(CaseOption.Heat) && c.Has(CaseOption.HeatLoss)) throw Refusals.HeatTwice();
        c = HumidAirCase.Resolve(c);
        if (c.Device == DeviceKind.Venturi) return Venturis.VenturiSolver.Stations(c);
        if (Rating.NozzleGeometryReader.Asks(c)) return Rating.RatedNozzle.Solve(c);
        if (c.DischargeCorrelation is not null) throw Refusals.CorrelationWithoutBack();
        if (c.Expansion != ExpansionModel.Equilibrium) throw Refusals.ExpansionWithoutSections();
        if (c.Has(CaseOption.Onset)) throw Refusals.OnsetWithoutHeldPhase();
        Inlet inlet = Inlet.Solve(c);
        if (inlet.Station.Stagnation is null) throw Refusals.NoSuchInlet(inlet.Given.Given);
        return c.Device == DeviceKind.Diffuser ? Diffusers.DiffuserSolver.Stations(c, inlet) : Expand(c, inlet, inlet, ExitFigures.Read(c, inlet), extent);
    }

    /// <summary>The exit from its figures.</summary>
    /// <param name="c">The case.</param>
    /// <param name="inlet">The inlet.</param>
    /// <param name="passed">The station from which the exit is reached: the inlet, or what lies behind a shock in it.</param>
    /// <param name="given">The figures of the exit and its loss.</param>
    /// <param name="extent">How much of the answer is wanted.</param>
    internal static DeviceAnswer Expand(DeviceCase c, Inlet inlet, Inlet passed, StationFigures given, Extent extent = Extent.Full)
    {
        double gravity = c.ValueOr(CaseOption.Gravity, Energy.StandardGravity);
        double h0 = inlet.Station.StagnationEnthalpy!.Value + c.Heat + (gravity * (inlet.Given.Elevation - given.Elevation));
        if (ReadsSaturation(c, given))
            return Assemble(c, inlet, given, SaturatedExit.Station(c.Fluid, given), null, saturated: true);

        (ExitRecipe recipe, bool sectionUsed) = Recipe(c, inlet, given);
        double flux = sectionUsed ? inlet.MassFlow!.Value / (given[Figure.Section] * given.Openings) : 0;
        var context = new ExitContext(c.Device, c.Fluid, given, passed, h0, flux, c.Branch);
        FluidState state = recipe.Solve(context);
        StationAnswer exit = state.h - h0 > EnergyFloor(h0)
            ? new StationAnswer { State = state }
            : ExitAt(c, state, Energy.Velocity(h0, state.h), extent);
        return Assemble(c, inlet, given, exit, recipe, saturated: false);
    }

    /// <summary>True where the figures of the exit imply its loss, rather than take it as given or as none.</summary>
    internal static bool Implies(DeviceCase c, Inlet inlet, StationFigures given) => ReadsSaturation(c, given) || Recipe(c, inlet, given).Recipe.Implies;

    private static StationAnswer ExitAt(DeviceCase c, in FluidState state, double V, Extent extent) =>
        extent == Extent.WithoutExitHead && c.Device == DeviceKind.Nozzle
            ? new StationAnswer { State = state, Velocity = V }
            : StationAnswer.From(c.Fluid, state, V);

    // Below this two enthalpies are the same number: the closure of the property inverses.
    internal static double EnergyFloor(double h0) => 1e-10 * Math.Max(Math.Abs(h0), 1e3);

    private static bool ReadsSaturation(DeviceCase c, StationFigures given) =>
        given.Has(Figure.P) && given.Has(Figure.T)
        && Inlet.IsSaturatedReading(c.Fluid, given[Figure.P], given[Figure.T], given.TemperatureHalfPlace, out _);

    // A section beside a known flow is a figure of the exit only where the others leave room for it.
    private static (ExitRecipe Recipe, bool SectionUsed) Recipe(DeviceCase c, Inlet inlet, StationFigures given)
    {
        Figure others = given.Given & ~Figure.Section;
        bool sectionKnown = given.Has(Figure.Section) && inlet.MassFlow is not null;
        if (sectionKnown && ExitRecipes.Find(others | Figure.Section) is ExitRecipe withSection) return (withSection, true);
        if (ExitRecipes.Find(others) is ExitRecipe row) return (row, false);
        if ((others & ~(Figure.Efficiency | Figure.Loss)) == Figure.None) throw Refusals.ExitMissing(c.Device);
        bool tooMany = ExitRecipes.All.Any(r => (r.Required & ~others) == 0 && r.Required != others);
        throw tooMany && System.Numerics.BitOperations.PopCount((uint)others) > 2 ? Refusals.ExitRedundant(others) : Refusals.ExitNotSolved(others);
    }

    private static DeviceAnswer Assemble(
        DeviceCase c, Inlet inlet, StationFigures given, StationAnswer exit, ExitRecipe? recipe, bool saturated)
    {
        exit = exit with
        {
            Elevation = given.Elevation,
            Openings = given.Openings,
            Area = given.Has(Figure.Section) ? given[Figure.Section] : null,
        };
        double? flow = inlet.MassFlow ?? (exit.Area is double A && exit.Flux is double G && G > 0 ? G * A * exit.Openings : null);
        Figure loss = given.Given & (Figure.Efficiency | Figure.Loss);
        var answer = new DeviceAnswer
        {
            Case = c,
            Inlet = inlet.Station.Carrying(flow),
            Exit = exit.Carrying(flow),
            Performance = new Performance { MassFlow = flow },
            Audit = new Audit(),
            InletTakenAtRest = inlet.TakenAtRest,
            SaturatedReading = saturated,
            EfficiencyImplied = saturated || recipe!.Implies,
            TakenIdeal = !saturated && !recipe!.Implies && loss == Figure.None,
        };
        answer = answer with { Ledger = LedgerOf(answer) };
        return c.Device == DeviceKind.Nozzle ? NozzleThroat.Place(answer) : answer;
    }

    private static Ledger? LedgerOf(DeviceAnswer a)
    {
        if (a.Exit.Velocity is not double V2 || !a.Exit.HasState) return null;
        double V1 = a.Inlet.Velocity!.Value, g = a.Case.ValueOr(CaseOption.Gravity, Energy.StandardGravity);
        return new Ledger(
            a.Inlet.State.h, a.Inlet.KineticEnergyCoefficient * V1 * V1 / 2, g * a.Inlet.Elevation, a.Case.Heat, a.Exit.State.h, V2 * V2 / 2, g * a.Exit.Elevation);
    }
}
