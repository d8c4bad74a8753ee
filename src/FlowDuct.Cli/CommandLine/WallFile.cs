using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Reads the wall of a nozzle: a CSV with a position and a diameter to the row, units in the headings.</summary>
internal static class WallFile
{
    internal static IReadOnlyList<PathSection> Read(string file, DeviceAnswer answer)
    {
        string[] lines = Lines(file);
        string[] heads = lines[0].Split(',', StringSplitOptions.TrimEntries);
        UnitReading position = Unit(file, heads, "position"), diameter = Unit(file, heads, "diameter");
        List<(double Position, double Diameter)> rows = [];
        for (int i = 1; i < lines.Length; i++)
        {
            string[] cells = lines[i].Split(',', StringSplitOptions.TrimEntries);
            if (cells.Length != 2) throw Refuse(file, i, $"cells: {cells.Length} instead of 2", "write position, diameter");
            rows.Add((Number(file, i, cells[0], position), Number(file, i, cells[1], diameter)));
            if (rows[^1].Diameter <= 0) throw Refuse(file, i, "the diameter is not above zero", "write the bore of the nozzle there");
            if (i > 1 && rows[^1].Position <= rows[^2].Position) throw Refuse(file, i, "the position does not rise", "list the sections from inlet to exit");
        }

        return WallSections.Of(Echo.Ascii(file), rows, answer);
    }

    private static string[] Lines(string file)
    {
        try
        {
            string[] lines = [.. File.ReadLines(file).Select(line => line.Trim().TrimStart('\uFEFF')).Where(line => line.Length > 0)];
            return lines.Length >= 4 ? lines : throw Usage.Refuse("--wall", $"{Echo.Ascii(file)} has fewer than three sections", "give a heading and at least three rows");
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            throw Usage.Refuse("--wall", $"{Echo.Ascii(file)} could not be read: {Reason(failure)}", "check the name");
        }
    }

    private static string Reason(Exception failure) => failure is FileNotFoundException ? "there is no such file" : OutputFile.Reason(failure);

    private static UnitReading Unit(string file, string[] heads, string name)
    {
        int index = name == "position" ? 0 : 1;
        string head = index < heads.Length && heads.Length == 2 ? heads[index] : string.Empty;
        bool shaped = head.StartsWith(name + " [", StringComparison.Ordinal) && head.EndsWith(']');
        if (shaped && UnitTable.TryFind(head[(name.Length + 2)..^1], Dimension.Length, out UnitReading unit)) return unit;
        throw Usage.Refuse("--wall", $"{Echo.Ascii(file)}: the heading is not position [unit], diameter [unit]", "write for example position [mm],diameter [mm]");
    }

    private static double Number(string file, int row, string text, in UnitReading unit)
    {
        if (!NumberParser.TryParse(text, out PrintedNumber number, out string problem)) throw Refuse(file, row, problem, "write a number");
        return UnitConverter.ToSi(number.Value, unit, 0);
    }

    private static Errors.FlowDuctException Refuse(string file, int row, string reason, string next) =>
        Usage.Refuse("--wall", $"{Echo.Ascii(file)} row {row}: {reason}", next);
}
