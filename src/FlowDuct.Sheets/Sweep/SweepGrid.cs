using FlowDuct.Errors;

namespace FlowDuct.Sheets.Sweep;

/// <summary>Every combination of the values of several variations; the last varies fastest.</summary>
internal sealed class SweepGrid
{
    /// <summary>Points at most: a slip in a step should not fill a disk.</summary>
    internal const long Most = 10_000_000;

    private readonly IReadOnlyList<Variation> _variations;

    /// <summary>A grid of one or more variations.</summary>
    /// <exception cref="FlowDuctException">One of them occurs twice, or there are too many points; kind NotUnderstood.</exception>
    internal SweepGrid(IReadOnlyList<Variation> variations)
    {
        _variations = variations;
        Count = 1;
        for (int i = 0; i < variations.Count; i++)
        {
            string name = variations[i].Name;
            if (variations.Take(i).Any(earlier => earlier.Name == name)) throw Refuse($"{name} is varied twice", "keep one of them");
            Count *= variations[i].Values.Count;
            if (Count > Most) throw Refuse($"these are more than {Most} points", "take fewer points or a longer step");
        }
    }

    /// <summary>The variations, in the order given.</summary>
    internal IReadOnlyList<Variation> Variations => _variations;

    /// <summary>How many points there are.</summary>
    internal long Count { get; }

    /// <summary>Which value of each variation a point takes.</summary>
    /// <param name="point">The point, counted from 0.</param>
    /// <param name="indices">As many as there are variations.</param>
    internal void At(long point, Span<int> indices)
    {
        for (int i = _variations.Count - 1; i >= 0; i--)
        {
            point = Math.DivRem(point, _variations[i].Values.Count, out long index);
            indices[i] = (int)index;
        }
    }

    private static FlowDuctException Refuse(string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, "--vary", reason, next));
}
