using System.Runtime.CompilerServices;

namespace FlowDuct.Devices;

/// <summary>Given figures in fixed slots: a bit says whether a slot is filled, so a number is never asked what it cannot say.</summary>
internal struct GivenSlots
{
    private uint _mask;
    private Slots _values;
    private Slots _halfPlaces;

    /// <summary>The filled slots, a bit each.</summary>
    internal readonly uint Mask => _mask;

    internal readonly bool Has(int slot) => (_mask >> slot & 1) != 0;

    /// <summary>The SI value of a filled slot.</summary>
    internal readonly double Value(int slot) =>
        Has(slot) ? _values[slot] : throw new InvalidOperationException("A slot was read that was never given.");

    /// <summary>Half of the last printed place, SI; 0 where the figure is exact.</summary>
    internal readonly double HalfPlace(int slot) => _halfPlaces[slot];

    internal void Set(int slot, double si, double halfPlace = 0)
    {
        _mask |= 1u << slot;
        _values[slot] = si;
        _halfPlaces[slot] = halfPlace;
    }

    internal void Clear(int slot) => _mask &= ~(1u << slot);

    [InlineArray(32)]
    private struct Slots
    {
        private double _first;
    }
}
