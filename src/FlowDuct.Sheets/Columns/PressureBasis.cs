using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>
/// In a sheet the basis of a pressure is visible: [barg], [bar(a)], or declared in a column of its own. A heading of [bar] alone is read by
/// one person as absolute and by the next as gauge.
/// </summary>
internal static class PressureBasis
{
    /// <summary>True for a pressure unit that says no basis.</summary>
    internal static bool IsOpen(in UnitReading unit) => unit.Dimension == Dimension.Pressure && !unit.BasisIsWritten;

    /// <summary>Pa and MPa are absolute wherever nothing else is said: common practice of property tables.</summary>
    internal static bool IsAbsoluteByCustom(in UnitReading unit) => unit.Spelling is "Pa" or "MPa";

    /// <summary>The same unit read as gauge.</summary>
    internal static UnitReading AsGauge(in UnitReading unit) => unit with { Basis = UnitBasis.Gauge, BasisIsWritten = true };
}
