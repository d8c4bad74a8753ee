using FlowDuct.Errors;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>The functions behind <see cref="ExitRecipes"/>.</summary>
internal static class ExitSolvers
{
    /// <summary>The line on which the exit lies for a given loss; without one, the isentrope of the inlet.</summary>
    internal static ExpansionPath LossPath(ExitContext c, Figure loss)
    {
        if (loss == Figure.None) return Isentrope(c, c.s1);
        if (loss == Figure.P0) return Isentrope(c, EntropyAt(c, c.Given[Figure.P0]));
        double level = c.Given[loss];
        if (c.Device == DeviceKind.Nozzle)
            return new ExpansionPath(c.Fluid, loss == Figure.Loss ? PathKind.NozzleLoss : PathKind.NozzleEfficiency, level, c.h0, c.s1, c.p01);
        double p02 = loss == Figure.Loss ? c.p01 - (level * (c.p01 - c.Inlet.State.p)) : DiffuserStagnationPressure(c, level);
        return Isentrope(c, EntropyAt(c, p02));
    }

    /// <summary>The line of constant exit enthalpy: measured, or from the energy balance with the exit velocity.</summary>
    internal static ExpansionPath EnergyPath(ExitContext c, Figure energy)
    {
        double h = energy == Figure.H ? c.Given[Figure.H] : c.h0 - (c.Given[Figure.V] * c.Given[Figure.V] / 2);
        return new ExpansionPath(c.Fluid, PathKind.Isenthalp, h, c.h0, c.s1, c.p01);
    }

    internal static FluidState FromPair(ExitContext c, StatePairs.Pair pair) => StatePairs.Solve(c.Fluid, pair, c.Given, Station.Exit);

    internal static FluidState FromVelocity(ExitContext c)
    {
        double V = c.Given[Figure.V], p = c.Given[Figure.P], h = c.h0 - (V * V / 2);
        return Check(c, c.Fluid.FromPH(p, h, default, out FluidState state), StatePair.PH, p, h, state);
    }

    /// <summary>The point on a path that one figure selects.</summary>
    internal static FluidState OnPath(ExitContext c, ExpansionPath path, Figure selector)
    {
        if (selector == Figure.P) return AtPressure(c, path, c.Given[Figure.P]);
        FluidState? direct = Directly(c, path, selector);
        if (direct is FluidState known) return known;
        var search = new PathSearch(path, selector, c.Target(selector), TopPressure(c, path));
        List<FluidState> roots = search.Roots();
        return Choose(c, search, roots);
    }

    /// <summary>The point at the exit pressure whose Mach number or flux is given.</summary>
    internal static FluidState OnIsobar(ExitContext c, Figure selector)
    {
        double p = c.Given[Figure.P], target = c.Target(selector);
        double Excess(double h)
        {
            if (c.Fluid.FromPH(p, h, default, out FluidState at) != Outcome.Ok) return double.NaN;
            double V = Energy.Velocity(c.h0, h);
            return (selector == Figure.M ? V / at.w : V / at.v) - target;
        }

        double low = LowEnthalpy(Excess, c.h0), above = Excess(low);
        if (!(above >= 0)) throw Refusals.NoExit(Figures.Names(Figure.P | selector), "the figure is out of reach at this pressure");
        double h = RootFinder.Find(Excess, low, c.h0, above, -target);
        return Check(c, c.Fluid.FromPH(p, h, default, out FluidState state), StatePair.PH, p, h, state);
    }

    // An enthalpy low enough that the figure is reached; where the formulation ends first, the search turns back towards its edge.
    private static double LowEnthalpy(Func<double, double> excess, double h0)
    {
        double good = h0, step = Math.Max(1e3, Math.Abs(h0) * 1e-3);
        for (int i = 0; i < 100; i++)
        {
            double low = good - step, value = excess(low);
            if (value >= 0) return low;
            if (double.IsNaN(value)) step /= 2;
            else (good, step) = (low, step * 1.5);
        }

        return good;
    }

    private static ExpansionPath Isentrope(ExitContext c, double s) => new(c.Fluid, PathKind.Isentrope, s, c.h0, c.s1, c.p01);

    // Diffuser efficiency (h(p0,2, s1) - h1)/(h0,1 - h1) fixes the stagnation pressure behind it.
    private static double DiffuserStagnationPressure(ExitContext c, double efficiency)
    {
        FluidState inlet = c.Inlet.State;
        double h = inlet.h + (efficiency * (c.h0 - inlet.h));
        return Check(c, c.Fluid.FromHS(h, inlet.s, inlet, out FluidState at), StatePair.HS, h, inlet.s, at).p;
    }

    private static double EntropyAt(ExitContext c, double p02) =>
        Check(c, c.Fluid.FromPH(p02, c.h0, default, out FluidState at), StatePair.PH, p02, c.h0, at).s;

    private static FluidState AtPressure(ExitContext c, ExpansionPath path, double p)
    {
        Outcome outcome = path.At(p, out FluidState state);
        if (outcome != Outcome.Ok) throw Refusals.OutsideRange("--exit", c.Fluid, outcome, StatePair.PS, p, c.s1);
        if (state.h > c.h0 * (1 + 1e-12) && state.h - c.h0 > 1e-6) throw Refusals.ExitAboveStagnation(p, TopPressure(c, path));
        return state;
    }

    // Where the exit enthalpy is known, two of the paths need no search.
    private static FluidState? Directly(ExitContext c, ExpansionPath path, Figure selector)
    {
        if (selector is not (Figure.V or Figure.H))
        {
            if (selector != Figure.S || path.Kind != PathKind.Isenthalp) return null;
            double s = c.Given[Figure.S];
            return Check(c, c.Fluid.FromHS(path.Level, s, default, out FluidState at), StatePair.HS, path.Level, s, at);
        }

        double h = EnergyPath(c, selector).Level;
        if (path.Kind == PathKind.Isentrope) return AtEnthalpy(c, path.Level, h);
        if (path.Kind != PathKind.NozzleEfficiency) return null;
        double p = AtEnthalpy(c, path.s1, c.h0 - ((c.h0 - h) / path.Level)).p;
        return Check(c, c.Fluid.FromPH(p, h, default, out FluidState exit), StatePair.PH, p, h, exit);
    }

    private static FluidState AtEnthalpy(ExitContext c, double s, double h)
    {
        if (c.Fluid.FromHS(h, s, default, out FluidState at) == Outcome.Ok) return at;
        double most = c.Fluid.FromPS(c.Fluid.LeastPressure, s, default, out FluidState floor) == Outcome.Ok ? Energy.Velocity(c.h0, floor.h) : 0;
        double wanted = Energy.Velocity(c.h0, h);
        if (most > 0 && wanted > most) throw Refusals.TooFast(wanted, most);
        throw Refusals.OutsideRange("--exit", c.Fluid, Outcome.PairTooLow, StatePair.HS, h, s);
    }

    // No exit with a real velocity lies above the pressure at which the path brings the flow to rest.
    private static double TopPressure(ExitContext c, ExpansionPath path)
    {
        if (path.Kind == PathKind.Isenthalp) return c.Fluid.GreatestPressure;
        double s = path.Kind == PathKind.Isentrope ? path.Level : path.s1;
        return c.Fluid.FromHS(c.h0, s, default, out FluidState rest) == Outcome.Ok ? rest.p : c.p01;
    }

    private static FluidState Choose(ExitContext c, PathSearch search, List<FluidState> roots)
    {
        if (roots.Count == 0) throw Refusals.NoExit(search.Wanted(DisplayText.Metric), search.RangeText(DisplayText.Metric));
        if (roots.Count == 1) return roots[0];
        bool slowInlet = c.Inlet.V < c.Inlet.State.w;
        Branch branch = c.Branch == Branch.Ask && c.Device == DeviceKind.Diffuser && slowInlet ? Branch.Subsonic : c.Branch;
        List<FluidState> chosen = roots.FindAll(at => Energy.Velocity(c.h0, at.h) < at.w == (branch == Branch.Subsonic));
        if (branch != Branch.Ask && chosen.Count == 1) return chosen[0];
        throw Refusals.SeveralExits(roots.Select(at => Describe(c, at)));
    }

    private static string Describe(ExitContext c, FluidState at)
    {
        double V = Energy.Velocity(c.h0, at.h);
        DisplayText text = DisplayText.Metric;
        return $"p={text.Text(at.p, Dimension.Pressure)} V={text.Text(V, Dimension.Velocity)} M={text.Text(V / at.w, Dimension.Ratio, 4)}";
    }

    private static FluidState Check(ExitContext c, Outcome outcome, StatePair pair, double first, double second, in FluidState state) =>
        outcome == Outcome.Ok ? state : throw Refusals.OutsideRange("--exit", c.Fluid, outcome, pair, first, second);
}
