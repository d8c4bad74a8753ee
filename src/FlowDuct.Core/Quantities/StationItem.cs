namespace FlowDuct.Quantities;

/// <summary>One item of a station list.</summary>
/// <param name="Row">The quantity.</param>
/// <param name="Value">Its value; the first of a pair.</param>
/// <param name="Second">The second of a pair such as 600x400 mm; null of a single value.</param>
internal readonly record struct StationItem(QuantityRow Row, GivenValue Value, GivenValue? Second = null)
{
    /// <summary>The slot in a <c>StationGivens</c>.</summary>
    public StationSymbol Slot => Row.StationSlot!.Value;

    /// <summary>
    /// Half of the last printed place, SI. Of a pair the rounding of both, laid on the first: the area w h moves by h (dw + dh w/h), that of a ring
    /// by pi/2 do (ddo + ddi di/do).
    /// </summary>
    public double HalfPlace => Second is not GivenValue second ? Value.HalfWidth
        : Value.HalfWidth + (second.HalfWidth * (Slot == StationSymbol.Rectangle ? Value.Si / second.Si : second.Si / Value.Si));
}
