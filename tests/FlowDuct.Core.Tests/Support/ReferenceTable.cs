using System.Text;

namespace FlowDuct.Core.Tests.Support;

/// <summary>Reads a table of check values: comma-separated, heading first, quotes where a cell holds a comma, '#' lines are notes.</summary>
public static class ReferenceTable
{
    /// <summary>The rows of a file below reference/ beside the tests (or of a rooted path), each by column heading.</summary>
    public static IReadOnlyList<IReadOnlyDictionary<string, string>> Read(string path)
    {
        string file = Path.Combine(AppContext.BaseDirectory, "reference", path);
        List<List<string>> lines = [.. File.ReadLines(file).Where(IsData).Select(Cells)];
        if (lines.Count < 2)
            throw new InvalidDataException($"{path}: no rows, so nothing would be checked");
        return [.. lines.Skip(1).Select((cells, i) => Row(path, i + 1, lines[0], cells))];
    }

    private static bool IsData(string line) => line.Length > 0 && line[0] != '#';

    private static Dictionary<string, string> Row(string path, int number, List<string> heading, List<string> cells) =>
        heading.Count == cells.Count
            ? heading.Zip(cells).ToDictionary(pair => pair.First, pair => pair.Second, StringComparer.Ordinal)
            : throw new InvalidDataException($"{path}: row {number} has {cells.Count} cells, the heading {heading.Count}");

    private static List<string> Cells(string line)
    {
        List<string> cells = [];
        StringBuilder cell = new();
        bool quoted = false;
        for (int i = 0; i < line.Length; i++)
        {
            char c = line[i];
            if (c == '"' && quoted && i + 1 < line.Length && line[i + 1] == '"')
                cell.Append(line[i++]);
            else if (c == '"')
                quoted = !quoted;
            else if (c == ',' && !quoted)
                Finish(cells, cell);
            else
                cell.Append(c);
        }

        Finish(cells, cell);
        return cells;
    }

    private static void Finish(List<string> cells, StringBuilder cell)
    {
        cells.Add(cell.ToString());
        cell.Clear();
    }
}
