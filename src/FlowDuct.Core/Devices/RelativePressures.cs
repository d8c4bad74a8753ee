using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Pressures that are given relative to those of the inlet, made absolute.</summary>
internal static class RelativePressures
{
    /// <summary>Each pressure, Pa, that a list gives as a drop, a rise or a ratio.</summary>
    /// <exception cref="FlowDuctException">A pressure that is not above zero; kind NoAnswer.</exception>
    internal static List<double> Read(string place, in GivenSlots slots, double p1, double p01)
    {
        List<double> found = [];
        if (slots.Has((int)StationSymbol.PressureDrop)) found.Add(AboveZero(place, p1 - slots.Value((int)StationSymbol.PressureDrop)));
        if (slots.Has((int)StationSymbol.PressureRise)) found.Add(AboveZero(place, p1 + slots.Value((int)StationSymbol.PressureRise)));
        if (slots.Has((int)StationSymbol.PressureOverInletStagnation)) found.Add(AboveZero(place, slots.Value((int)StationSymbol.PressureOverInletStagnation) * p01));
        if (slots.Has((int)StationSymbol.PressureOverInlet)) found.Add(AboveZero(place, slots.Value((int)StationSymbol.PressureOverInlet) * p1));
        return found;
    }

    internal static double AboveZero(string place, double p) => p > 0 ? p : throw Refusals.NoPressureLeft(place, p);
}
