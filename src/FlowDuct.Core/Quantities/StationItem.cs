namespace FlowDuct.Quantities;

/// <summary>One item of a station list.</summary>
/// <param name="Row">The quantity.</param>
/// <param name="Value">Its value.</param>
internal readonly record struct StationItem(QuantityRow Row, GivenValue Value)
{
    /// <summary>The slot in a <c>StationGivens</c>.</summary>
    public StationSymbol Slot => Row.StationSlot!.Value;
}
