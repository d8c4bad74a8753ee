using FlowDuct.Cli.Rendering;
using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Reads which sections of a nozzle are wanted, and solves them.</summary>
internal static class PathBinder
{
    private const int LeastSections = 3;
    private const int MostSections = 10_000;

    /// <summary>The states along the nozzle; null where none are asked for.</summary>
    internal static PathTable? Read(Arguments arguments, DeviceAnswer answer, RenderOptions options)
    {
        string? count = arguments.Value("--path"), wall = arguments.Value("--wall");
        if (count is null && wall is null) return arguments.Has("--show") ? throw Usage.Refuse("--show", "it chooses columns of the states along a nozzle, and none are asked for", "add --path, for example --path 21") : null;
        if (count is not null && wall is not null) throw Usage.Refuse("--wall", "the sections are given by --path too", "keep one of them");
        string place = count is null ? "--wall" : "--path";
        if (answer.Rating is null || answer.Exit.Area is null)
            throw Usage.Refuse(place, "the states along a nozzle need its sections and the back pressure", "give --throat or --exit with A or d, and --back");
        IReadOnlyList<PathSection> sections = count is null ? WallFile.Read(wall!, answer) : NozzlePath.Sections(answer, WholeNumber.Read("--path", count, LeastSections, MostSections, 21));
        return new PathTable(NozzlePath.Solve(answer, sections), [.. PathColumn.Usual(answer, options), .. Shown(arguments, answer, options)]);
    }

    private static IEnumerable<PathColumn> Shown(Arguments arguments, DeviceAnswer answer, RenderOptions options)
    {
        if (arguments.Value("--show") is not string list) yield break;
        foreach (string name in list.Split(',', StringSplitOptions.TrimEntries))
        {
            if (PathColumn.Usual(answer, options).Any(column => column.Name == name)) throw Usage.Refuse("--show", $"{name} stands in the table already", "leave it out");
            yield return PathColumn.Of(name, answer, options) ?? throw Usage.Refuse(
                "--show", $"{Echo.Ascii(name)} is no quantity of a section", $"write for example rho, w, h, p0, {string.Join(", ", PathColumn.Ratios)}");
        }
    }
}
