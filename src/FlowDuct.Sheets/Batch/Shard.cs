using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>One of n shares of the rows: row i, i + n, i + 2n, so that shares are equally long whatever the sheet, and together complete.</summary>
/// <param name="Index">Counted from 1.</param>
/// <param name="Count">How many shares there are.</param>
internal readonly record struct Shard(long Index, long Count)
{
    private const int MostDigits = 9;

    /// <summary>All rows.</summary>
    internal static Shard Whole => new(1, 1);

    /// <summary>True for a row of this share.</summary>
    internal bool Takes(long row) => (row - Index) % Count == 0;

    /// <summary>Reads "2/8".</summary>
    /// <exception cref="FlowDuctException">It is no share; kind NotUnderstood.</exception>
    internal static Shard Parse(string text)
    {
        string[] sides = text.Split('/');
        bool read = sides.Length == 2 & TryWhole(sides[0], out long index) & TryWhole(sides[^1], out long count);
        return read && index >= 1 && index <= count
            ? new Shard(index, count)
            : throw new FlowDuctException(new Refusal(RefusalKind.NotUnderstood, "--shard", $"{Echo.Ascii(text)} is no share i/n with i from 1 to n", "write for example --shard 2/8"));
    }

    private static bool TryWhole(string text, out long value)
    {
        value = 0;
        bool digits = text.Length is > 0 and <= MostDigits && text.All(char.IsAsciiDigit);
        return digits && long.TryParse(text, System.Globalization.CultureInfo.InvariantCulture, out value);
    }
}
