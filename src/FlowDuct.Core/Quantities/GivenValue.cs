namespace FlowDuct.Quantities;

/// <summary>A quantity as it was given: SI value, printed rounding, and what was typed.</summary>
/// <param name="Si">The value in coherent SI (absolute for pressures).</param>
/// <param name="HalfWidth">Half of the last printed place, SI.</param>
/// <param name="Text">The value with its unit as typed, trimmed.</param>
/// <param name="Unit">The unit as read; its dimension tells which of several accepted ones was used.</param>
internal readonly record struct GivenValue(double Si, double HalfWidth, string Text, UnitReading Unit)
{
    /// <summary>True where the ambient pressure went into the value.</summary>
    public bool WasGauge => Unit.NeedsAmbient;

    /// <summary>True where a bare pressure unit was read as absolute.</summary>
    public bool BasisWasAssumed => Unit.Basis == UnitBasis.Absolute && !Unit.BasisIsWritten;
}
