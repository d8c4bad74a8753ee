using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Flow;

namespace FlowDuct.Devices.Inverse;

/// <summary>What is asked backwards: the value of one figure of the case that gives a result a wanted value.</summary>
/// <param name="Unknown">The figure to find.</param>
/// <param name="Target">The result.</param>
/// <param name="Value">Its wanted value, SI.</param>
internal sealed record InverseQuestion(CaseSlot Unknown, ResultName Target, double Value)
{
    // A root that leaves more than this of the target is a jump between two regimes.
    private const double Closure = 1e-7;

    // Beside the root by this part the target is read again for the sensitivity.
    private const double Nudge = 1e-5;

    /// <summary>The answer at the only root, or at the one of several that a number, from 1, chooses.</summary>
    internal DeviceAnswer Answer(DeviceCase c, int? number)
    {
        IReadOnlyList<(DeviceAnswer Answer, FoundFigure Found)> roots = Solve(c);
        int chosen = number ?? (roots.Count == 1 ? 1 : 0);
        if (chosen < 1 || chosen > roots.Count) throw Refusals.NotChosen(number, [.. roots.Select(root => root.Found)]);
        (DeviceAnswer answer, FoundFigure found) = roots[chosen - 1];
        answer = answer with { Found = found };
        return answer with { Findings = FindingRules.Apply(answer) };
    }

    /// <summary>The answers at all roots, with the value found and its sensitivity, in rising order of the unknown.</summary>
    internal IReadOnlyList<(DeviceAnswer Answer, FoundFigure Found)> Solve(DeviceCase c)
    {
        if (Unknown.IsGiven(c)) throw Refusals.FindGiven(Unknown.Name);
        double[] trials = SearchRange.Of(Unknown);
        double?[] misses = [.. trials.Select(x => Miss(c, x))];
        List<double> roots = [];
        Interval? flat = null;
        for (int i = 0; i < trials.Length; i++)
        {
            if (misses[i] is not double here) continue;
            if (Math.Abs(here) <= Closure && i > 0 && misses[i - 1] is double before && Math.Abs(before) <= Closure)
            {
                flat = new Interval(flat?.Least ?? trials[i - 1], trials[i]);
                continue;
            }

            if (flat is not null && Math.Abs(here) <= Closure) continue;
            if (here == 0) roots.Add(trials[i]);
            else if (i > 0 && misses[i - 1] is double last && last != 0 && Math.Sign(last) != Math.Sign(here)) Add(roots, c, trials[i - 1], trials[i], last, here);
        }

        // A root at the end of a flat stretch is part of it.
        if (flat is Interval level) roots.RemoveAll(x => x >= level.Least * (1 - 1e-9) && x <= level.Greatest * (1 + 1e-9));
        if (roots.Count == 0) throw flat is Interval any ? Refusals.FindAnything(this, any.Least, any.Greatest) : NoRoot(trials, misses);
        return [.. roots.Select(x => (DeviceSolver.Solve(Unknown.With(c, x)), Sensitivity(c, x) with { AlsoBetween = flat }))];
    }

    private void Add(List<double> roots, DeviceCase c, double a, double b, double atA, double atB)
    {
        bool broken = false;
        double x = RootFinder.Find(Excess, a, b, atA, atB);
        if (!broken && Miss(c, x) is double left && Math.Abs(left) <= Closure) roots.Add(x);

        double Excess(double at)
        {
            double? miss = Miss(c, at);
            broken |= miss is null;
            return miss ?? atA;
        }
    }

    // How far the target is missed, as a part of it; null where the case has no answer there.
    private double? Miss(DeviceCase c, double x)
    {
        try
        {
            DeviceAnswer answer = DeviceSolver.Stations(Unknown.With(c, x));
            double? got = Target.Read(answer with { Performance = Performances.Of(answer) });
            return got is double value && double.IsFinite(value) ? (value - Value) / Scale : null;
        }
        catch (FlowDuctException)
        {
            return null;
        }
    }

    private double Scale => Math.Max(Math.Abs(Value), 1e-12);

    private FoundFigure Sensitivity(DeviceCase c, double x)
    {
        double? up = Miss(c, x * (1 + Nudge)), down = Miss(c, x * (1 - Nudge));
        return new FoundFigure(this, x, up is double a && down is double b ? (a - b) / (2 * Nudge) : null);
    }

    private FlowDuctException NoRoot(double[] trials, double?[] misses)
    {
        List<double> reached = [.. misses.Where(m => m is not null).Select(m => Value + (m!.Value * Scale))];
        return reached.Count == 0
            ? Refusals.FindNowhere(this, trials[0], trials[^1])
            : Refusals.FindOutOfReach(this, reached.Min(), reached.Max());
    }
}

/// <summary>A figure that was found.</summary>
/// <param name="Question">What was asked.</param>
/// <param name="Value">The figure, SI.</param>
/// <param name="Sensitivity">Per cent by which the target moves when the figure moves by one per cent; null at the end of a range.</param>
internal sealed record FoundFigure(InverseQuestion Question, double Value, double? Sensitivity)
{
    /// <summary>Where, beside the value, the target is met by any value at all; null where nowhere.</summary>
    internal Interval? AlsoBetween { get; init; }
}
