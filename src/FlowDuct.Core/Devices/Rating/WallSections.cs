using FlowDuct.Errors;

namespace FlowDuct.Devices.Rating;

/// <summary>The sections of a measured wall, of which the narrowest is the throat.</summary>
internal static class WallSections
{
    // Of a bore: above the rounding of a drawing, below a wrong nozzle.
    private const double SameBore = 0.005;

    /// <summary>Sections from positions and diameters, m, from inlet to exit.</summary>
    /// <param name="file">Shown where the wall is refused.</param>
    /// <param name="wall">Position and diameter of each section.</param>
    /// <param name="a">The nozzle that was rated.</param>
    /// <exception cref="FlowDuctException">Throat or exit of the wall are not those of the case; kind NotUnderstood.</exception>
    internal static IReadOnlyList<PathSection> Of(string file, IReadOnlyList<(double Position, double Diameter)> wall, DeviceAnswer a)
    {
        StationAnswer narrow = a.Throat ?? a.Exit;
        double throat = Bore(narrow), narrowest = wall.Min(row => row.Diameter);
        Compare(file, "throat", narrowest, throat);
        Compare(file, "exit", wall[^1].Diameter, Bore(a.Exit));
        int at = wall.ToList().FindIndex(row => row.Diameter == narrowest);
        return [.. wall.Select((row, i) => new PathSection(row.Position, Area(Math.Max(row.Diameter, throat)) * narrow.Openings, i > at))];
    }

    private static void Compare(string file, string bore, double ofWall, double ofCase)
    {
        if (Math.Abs(ofWall - ofCase) > SameBore * ofCase) throw Refusals.WallIsAnother(file, bore, ofWall, ofCase);
    }

    private static double Bore(StationAnswer at) => Math.Sqrt(4 * at.Area!.Value / Math.PI);

    private static double Area(double diameter) => Math.PI * diameter * diameter / 4;
}
