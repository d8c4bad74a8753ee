using System.Runtime.CompilerServices;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Given figures in fixed slots: a bit says whether a slot is filled, so a number is never asked what it cannot say.</summary>
internal struct GivenSlots
{
    /// <summary>How many slots there are.</summary>
    internal const int Count = 40;

    private ulong _mask;
    private Slots _values;
    private Slots _halfPlaces;
    private Pairs _seconds;

    /// <summary>True where nothing is given.</summary>
    internal readonly bool IsEmpty => _mask == 0;

    internal readonly bool Has(int slot) => (_mask >> slot & 1) != 0;

    internal readonly bool Has(StationSymbol symbol) => Has((int)symbol);

    /// <summary>The SI value of a filled slot.</summary>
    internal readonly double Value(int slot) =>
        Has(slot) ? _values[slot] : throw new InvalidOperationException("A slot was read that was never given.");

    /// <summary>Half of the last printed place, SI; 0 where the figure is exact.</summary>
    internal readonly double HalfPlace(int slot) => _halfPlaces[slot];

    internal void Set(int slot, double si, double halfPlace = 0)
    {
        _mask |= 1ul << slot;
        _values[slot] = si;
        _halfPlaces[slot] = halfPlace;
    }

    /// <summary>The second of the two sides of a shape, m.</summary>
    internal readonly double Second(StationSymbol shape) =>
        Has(shape) ? _seconds[shape == StationSymbol.Rectangle ? 0 : 1] : throw new InvalidOperationException("A shape was read that was never given.");

    /// <summary>Forgets every figure; the numbers stay behind unread.</summary>
    internal void Empty() => _mask = 0;

    /// <summary>Sets a figure of a station list as it was read.</summary>
    internal void Set(in StationItem item)
    {
        Set((int)item.Slot, item.Value.Si, item.HalfPlace);
        if (item.Second is GivenValue second) _seconds[item.Slot == StationSymbol.Rectangle ? 0 : 1] = second.Si;
    }

    internal void Clear(int slot) => _mask &= ~(1ul << slot);

    [InlineArray(Count)]
    private struct Slots
    {
        private double _first;
    }

    [InlineArray(2)]
    private struct Pairs
    {
        private double _first;
    }
}
