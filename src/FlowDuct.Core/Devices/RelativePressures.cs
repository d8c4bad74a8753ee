using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Pressures that are given relative to those of the inlet, made absolute.</summary>
internal static class RelativePressures
{
    /// <summary>Each pressure, Pa, that a list gives as a drop, a rise or a ratio.</summary>
    /// <exception cref="FlowDuctException">A pressure that is not above zero; kind NoAnswer.</exception>
    internal static List<double> Read(string place, GivenSlots slots, double p1, double p01)
    {
        List<double> found = [];
        Add(StationSymbol.PressureDrop, dp => p1 - dp);
        Add(StationSymbol.PressureRise, rise => p1 + rise);
        Add(StationSymbol.PressureOverInletStagnation, ratio => ratio * p01);
        Add(StationSymbol.PressureOverInlet, ratio => ratio * p1);
        return found;

        void Add(StationSymbol symbol, Func<double, double> toPressure)
        {
            if (slots.Has((int)symbol)) found.Add(AboveZero(place, toPressure(slots.Value((int)symbol))));
        }
    }

    internal static double AboveZero(string place, double p) => p > 0 ? p : throw Refusals.NoPressureLeft(place, p);
}
