using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>Reads sections, shape and back pressure of a nozzle: what is rated, and how its shape was decided.</summary>
internal sealed record NozzleGeometryReader(StationFigures Throat, StationFigures Exit, double Back, NozzleShape Shape, string ShapeWords)
{
    /// <summary>True where a nozzle is asked for by sections and back pressure rather than by its exit figures.</summary>
    internal static bool Asks(DeviceCase c) => c.Device == DeviceKind.Nozzle && (c.Back.Mask != 0 || HasSection(c.Throat));

    internal static bool HasSection(in GivenSlots slots) => slots.Has((int)StationSymbol.Area) || slots.Has((int)StationSymbol.Diameter);

    internal static NozzleGeometryReader Read(DeviceCase c, double p1, double p01)
    {
        StationFigures throat = StationFigures.Read(c.Throat, Station.Throat), exit = StationFigures.Read(c.Exit, Station.Exit);
        RefuseMeasured(throat, exit);
        double back = BackPressure(c, exit, p1, p01);
        bool both = throat.Has(Figure.Section) && exit.Has(Figure.Section);
        bool equal = both && Area(throat) == Area(exit);
        if (both && Area(exit) < Area(throat)) throw Refusals.ExitNarrowerThanThroat(Area(throat), Area(exit));
        (NozzleShape shape, string words) = Decide(c.Shape, throat, exit, both && !equal);
        return new NozzleGeometryReader(throat, exit, back, shape, words);
    }

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
        StationFigures back = StationFigures.Read(c.Back, Station.Exit);
        List<double> found = [];
        if (back.Has(Figure.P)) found.Add(back[Figure.P]);
        Add(c.Back, StationSymbol.PressureDrop, dp => p1 - dp);
        Add(c.Back, StationSymbol.PressureRise, rise => p1 + rise);
        Add(c.Back, StationSymbol.PressureOverInletStagnation, ratio => ratio * p01);
        Add(c.Back, StationSymbol.PressureOverInlet, ratio => ratio * p1);
        if (found.Count > 1) throw Refusals.BackTwice();
        if (found.Count == 1 && exit.Has(Figure.P)) throw Refusals.ExitAndBack();
        if (found.Count == 0 && exit.Has(Figure.P)) found.Add(exit[Figure.P]);
        Add(c.Exit, StationSymbol.PressureDrop, dp => p1 - dp);
        Add(c.Exit, StationSymbol.PressureRise, rise => p1 + rise);
        Add(c.Exit, StationSymbol.PressureOverInletStagnation, ratio => ratio * p01);
        Add(c.Exit, StationSymbol.PressureOverInlet, ratio => ratio * p1);
        if (found.Count > 1) throw Refusals.BackTwice();
        if (found.Count == 0) throw Refusals.BackMissing();
        return found[0] > 0 ? found[0] : throw Refusals.NoPressureLeft(found[0]);

        void Add(in GivenSlots slots, StationSymbol symbol, Func<double, double> toPressure)
        {
            if (slots.Has((int)symbol)) found.Add(toPressure(slots.Value((int)symbol)));
        }
    }
}
