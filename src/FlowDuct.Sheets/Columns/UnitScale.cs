using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>A unit compiled for a column: the same operations in the same order as <see cref="UnitConverter"/>, without its look-ups.</summary>
internal readonly struct UnitScale
{
    private readonly double _offset;
    private readonly double _divisor;
    private readonly double _factor;
    private readonly UnitBasis _basis;

    internal UnitScale(in UnitReading unit)
    {
        _offset = unit.Dimension == Dimension.Temperature ? unit.Unit.Offset : 0;
        _divisor = unit.Unit.Divisor;
        _factor = unit.Unit.Factor;
        _basis = unit.Basis;
    }

    /// <summary>True where the SI value depends on the ambient pressure.</summary>
    internal bool NeedsAmbient => _basis is UnitBasis.Gauge or UnitBasis.Vacuum;

    /// <summary>SI value of a number.</summary>
    internal double ToSi(double value, double ambientPressure)
    {
        double si = IntervalToSi(value + _offset);
        return _basis switch
        {
            UnitBasis.Gauge => ambientPressure + si,
            UnitBasis.Vacuum => ambientPressure - si,
            _ => si,
        };
    }

    /// <summary>SI size of an interval.</summary>
    internal double IntervalToSi(double value) => _divisor > 1 ? value / _divisor : value * _factor;

    /// <summary>The number of an SI value.</summary>
    internal double FromSi(double si, double ambientPressure)
    {
        double based = _basis switch
        {
            UnitBasis.Gauge => si - ambientPressure,
            UnitBasis.Vacuum => ambientPressure - si,
            _ => si,
        };
        return (_divisor > 1 ? based * _divisor : based / _factor) - _offset;
    }
}
