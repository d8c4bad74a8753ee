using System.Globalization;

namespace FlowDuct.Sheets.Batch;

/// <summary>How far a run has come: enough to go on from there, and to see that the sheet is still the same.</summary>
/// <param name="Row">Last row whose results are written.</param>
/// <param name="Check">Check sum of the records up to that row.</param>
/// <param name="Bytes">Bytes of results up to there.</param>
/// <param name="Counts">Rows by verdict.</param>
internal sealed record RunMark(long Row, uint Check, long Bytes, long[] Counts)
{
    private const int LeadingCells = 5;

    /// <summary>The line of a progress file, without its end.</summary>
    internal string ToLine(string version, string settings) => string.Join(
        ',',
        [version, settings, Check.ToString("x8", CultureInfo.InvariantCulture), .. new[] { Row, Bytes }.Concat(Counts).Select(count => count.ToString(CultureInfo.InvariantCulture))]);

    /// <summary>Reads such a line; null where it is none.</summary>
    internal static RunMark? OfLine(string line, out string version, out string settings)
    {
        string[] cells = line.Split(',');
        (version, settings) = (cells[0], cells.Length > 1 ? cells[1] : string.Empty);
        int verdicts = Enum.GetValues<RowVerdict>().Length;
        if (cells.Length != LeadingCells + verdicts || !uint.TryParse(cells[2], NumberStyles.HexNumber, CultureInfo.InvariantCulture, out uint check)) return null;
        long[] numbers = new long[cells.Length - 3];
        for (int i = 0; i < numbers.Length; i++)
        {
            if (!long.TryParse(cells[i + 3], NumberStyles.None, CultureInfo.InvariantCulture, out numbers[i])) return null;
        }

        return new RunMark(numbers[0], check, numbers[1], numbers[2..]);
    }
}
