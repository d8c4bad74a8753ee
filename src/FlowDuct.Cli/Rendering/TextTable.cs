namespace FlowDuct.Cli.Rendering;

/// <summary>A small table: names at the left, numbers to the right, two head lines (symbol, unit), no rules.</summary>
internal sealed class TextTable(string name)
{
    private const int Gap = 2;
    private readonly List<string[]> _rows = [];
    private readonly List<string> _heads = [];
    private readonly List<string> _units = [];

    internal void Column(string head, string unit)
    {
        _heads.Add(head);
        _units.Add(unit);
    }

    internal void Row(string rowName, params string[] cells) => _rows.Add([rowName, .. cells]);

    internal void Write(TextWriter to)
    {
        string[] heads = [name, .. _heads];
        string[] units = [string.Empty, .. _units];
        string[][] lines = [heads, units, .. _rows];
        int[] widths = [.. heads.Select((_, i) => lines.Max(line => line[i].Length))];
        foreach (string[] line in lines)
        {
            string text = line[0].PadRight(widths[0]);
            for (int i = 1; i < line.Length; i++) text += line[i].PadLeft(widths[i] + Gap);
            to.WriteLine(text.TrimEnd());
        }
    }
}
