namespace FlowDuct.Quantities;

/// <summary>A unit as it is read on one quantity: the row of the table, the dimension asked for, and the resolved basis.</summary>
/// <param name="Unit">The row of the unit table.</param>
/// <param name="Dimension">The dimension it is read as; for a difference no offset and no basis applies.</param>
/// <param name="Basis">Absolute, gauge or vacuum on a pressure; none on everything else.</param>
/// <param name="Spelling">The spelling with its suffix, as typed.</param>
/// <param name="BasisIsWritten">False where a bare pressure unit was read as absolute.</param>
internal readonly record struct UnitReading(Unit Unit, Dimension Dimension, UnitBasis Basis, string Spelling, bool BasisIsWritten)
{
    /// <summary>True where the SI value depends on the ambient pressure.</summary>
    public bool NeedsAmbient => Basis is UnitBasis.Gauge or UnitBasis.Vacuum;
}
