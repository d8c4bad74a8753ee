using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>Reads sections, shape and back pressure of a nozzle: what is rated, and how its shape was decided.</summary>
internal sealed record NozzleGeometryReader(StationFigures Throat, StationFigures Exit, double Back, NozzleShape Shape, string ShapeWords)
{
    /// <summary>True where a nozzle is asked for by sections and back pressure rather than by its exit figures.</summary>
    internal static bool Asks(DeviceCase c) => c.Device == DeviceKind.Nozzle && (!c.Back.IsEmpty || StationFigures.HaveSection(c.Throat));

    internal static NozzleGeometryReader Read(DeviceCase c, double p1, double p01)
    {
        StationFigures throat = StationFigures.Read(c.Throat, Station.Throat, c.Inlet), exit = StationFigures.Read(c.Exit, Station.Exit, c.Inlet);
        RefuseMeasured(throat, exit);
        double back = BackPressure(c, exit, p1, p01);
        bool both = throat.Has(Figure.Section) && exit.Has(Figure.Section);
        bool equal = both && Area(throat) == Area(exit);
        if (both && Area(exit) < Area(throat)) throw Refusals.ExitNarrowerThanThroat(Area(throat), Area(exit));
        (NozzleShape shape, string words) = Decide(c.Shape, throat, exit, both && !equal);
        return new NozzleGeometryReader(throat, exit, back, shape, words);
    }

    /// <summary>The narrowest section: the throat, or the exit of a nozzle given by it.</summary>
    internal StationFigures Narrow => Throat.Has(Figure.Section) ? Throat : Exit;

    /// <summary>Reynolds number of a mass flow, kg/s, of all openings on the bore of one, with the viscosity, Pa.s.</summary>
    internal double Reynolds(double massFlow, double mu) => 4 * massFlow / Narrow.Openings / (Math.PI * Bore(Narrow) * mu);

    /// <summary>The bore of a section, m; of one that is not round, that of the same area.</summary>
    internal static double Bore(StationFigures at) => Math.Sqrt(4 * at[Figure.Section] / Math.PI);

    /// <summary>The area of all openings of a section together, m2.</summary>
    internal static double Area(StationFigures at) => at[Figure.Section] * at.Openings;

    private static (NozzleShape Shape, string Words) Decide(NozzleShape given, StationFigures throat, StationFigures exit, bool divergent)
    {
        if (given == NozzleShape.Convergent && divergent) throw Refusals.ShapeAgainstSections();
        if (given != NozzleShape.Auto) return (given, string.Empty);
        if (divergent) return (NozzleShape.ConvergentDivergent, "shape: convergent-divergent, since throat and exit sections differ");
        bool any = throat.Has(Figure.Section) || exit.Has(Figure.Section);
        return (NozzleShape.Convergent, any ? "shape: convergent, since one section is given" : "shape: convergent, since no section is given");
    }

    private static void RefuseMeasured(StationFigures throat, StationFigures exit)
    {
        Figure extra = (throat.Given | exit.Given) & ~(Figure.Section | Figure.P);
        if (extra != Figure.None) throw Refusals.ExitFollows(extra);
        if (throat.Has(Figure.P)) throw Refusals.ThroatFollows();
    }

    // What is given of the space beyond; without it a pressure of the exit stands for it.
    private static double BackPressure(DeviceCase c, StationFigures exit, double p1, double p01)
    {
        List<double> back = Pressures("--back", c.Back, StationFigures.Read(c.Back, Station.Exit)), plane = Pressures("--exit", c.Exit, exit);
        if (back.Count > 1 || plane.Count > 1) throw Refusals.BackTwice(back.Count > 1 ? "--back" : "--exit");
        if (back.Count == 1 && plane.Count == 1) throw Refusals.ExitAndBack();
        return back.Count + plane.Count == 1 ? back.Concat(plane).Single() : throw Refusals.BackMissing();

        List<double> Pressures(string place, GivenSlots slots, StationFigures read) =>
            [.. read.Has(Figure.P) ? [read[Figure.P]] : Array.Empty<double>(), .. RelativePressures.Read(place, slots, p1, p01)];
    }
}
