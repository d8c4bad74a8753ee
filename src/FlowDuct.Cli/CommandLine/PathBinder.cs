using FlowDuct.Devices;
using FlowDuct.Devices.Rating;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Reads which sections of a nozzle are wanted, and solves them.</summary>
internal static class PathBinder
{
    private const int LeastSections = 3;
    private const int MostSections = 10_000;

    /// <summary>The states along the nozzle; null where none are asked for.</summary>
    internal static IReadOnlyList<PathPoint>? Read(Arguments arguments, DeviceAnswer answer)
    {
        string? count = arguments.Value("--path"), wall = arguments.Value("--wall");
        if (count is null && wall is null) return null;
        if (count is not null && wall is not null) throw Usage.Refuse("--wall", "the sections are given by --path too", "keep one of them");
        string place = count is null ? "--wall" : "--path";
        if (answer.Rating is null || answer.Exit.Area is null)
            throw Usage.Refuse(place, "the states along a nozzle need its sections and the back pressure", "give --throat or --exit with A or d, and --back");
        IReadOnlyList<PathSection> sections = count is null ? WallFile.Read(wall!, answer) : NozzlePath.Sections(answer, WholeNumber.Read("--path", count, LeastSections, MostSections, 21));
        return NozzlePath.Solve(answer, sections);
    }
}
