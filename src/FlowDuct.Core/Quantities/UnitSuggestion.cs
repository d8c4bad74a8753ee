namespace FlowDuct.Quantities;

/// <summary>Says what is wrong with a unit that was not found; the reader decides, nothing is assumed.</summary>
internal static class UnitSuggestion
{
    /// <summary>One sentence, without its stop, on a spelling that <see cref="UnitTable.TryFind"/> refused.</summary>
    /// <param name="spelling">The spelling as typed.</param>
    /// <param name="dimension">The quantity that it should measure.</param>
    public static string For(string spelling, Dimension dimension)
    {
        string shown = Echo.Ascii(spelling);
        return AmbiguousReference(spelling, dimension)
            ?? BasisProblem(spelling, dimension, shown)
            ?? KnownSlip(spelling, dimension, shown)
            ?? NearMiss(spelling, dimension, shown)
            ?? OtherDimension(spelling, shown, dimension)
            ?? $"{shown} is not a unit of {DimensionWords.Of(dimension)}; write one of {UnitsOf(dimension)}";
    }

    /// <summary>The same for a quantity that may be given in several dimensions: the first guess that any of them offers.</summary>
    /// <param name="spelling">The spelling as typed.</param>
    /// <param name="row">The quantity.</param>
    public static string For(string spelling, QuantityRow row)
    {
        string shown = Echo.Ascii(spelling);
        foreach (Dimension dimension in (Dimension[])[row.Dimension, .. row.AlsoGivenAs])
        {
            string? guess = AmbiguousReference(spelling, dimension) ?? BasisProblem(spelling, dimension, shown)
                ?? KnownSlip(spelling, dimension, shown);
            if (guess is not null)
                return guess;
        }

        return For(spelling, row.Dimension);
    }

    /// <summary>The units of a dimension, comma-separated.</summary>
    public static string UnitsOf(Dimension dimension)
    {
        List<string> names = [];
        foreach (Unit unit in UnitTable.All)
        {
            if (unit.Dimension == UnitTable.RowsOf(dimension) && UnitTable.TryFind(WithBasis(unit, dimension), dimension, out _))
                names.Add(WithBasis(unit, dimension));
        }

        return string.Join(", ", names);
    }

    private static string WithBasis(Unit unit, Dimension dimension) =>
        dimension == Dimension.Pressure && unit.Basis == UnitBasis.Head ? unit.Spelling + "(g)" : unit.Spelling;

    /// <summary>Standard flows of which several conventions are in use: none is assumed.</summary>
    private static string? AmbiguousReference(string spelling, Dimension dimension)
    {
        bool isFlow = dimension is Dimension.MassFlow or Dimension.VolumeFlow
            or Dimension.NormalVolumeFlow or Dimension.StandardVolumeFlow or Dimension.ReferenceVolumeFlow;
        return isFlow && IsAmbiguous(spelling)
            ? $"{spelling} names no reference state (conventions differ by up to 8.7 %); "
                + "write scfm, NL/min or the like with --reference-state, or Nm3/h (0 degC) or Sm3/h (15 degC)"
            : null;
    }

    /// <summary>True for a flow unit that needs a reference state, such as scfm.</summary>
    internal static bool IsAmbiguous(string spelling) =>
        spelling.ToUpperInvariant() is "SCFM" or "SCFH" or "SCFS" or "MSCFD" or "MMSCFD" or "NL/MIN" or "NL/H" or "NL/S" or "SL/MIN"
            or "SLPM" or "NLPM" or "SLM" or "SCCM" or "NCFM" or "NM3" or "SM3";

    private static string? BasisProblem(string spelling, Dimension dimension, string shown)
    {
        ReadOnlySpan<char> bare = UnitTable.SplitSuffix(spelling, dimension, out UnitBasis suffix);
        Unit? unit = UnitTable.RowsOf(dimension) == Dimension.Pressure ? UnitTable.FindRow(bare, Dimension.Pressure) : null;
        if (unit is null)
            return null;
        if (dimension == Dimension.PressureDifference)
            return $"{shown} says a basis, but a pressure difference has none; write {PlainOf(unit)}";
        if (suffix != UnitBasis.None)
            return $"{shown} says its basis twice; write {unit.Spelling}";
        string name = unit.Spelling;
        return $"{shown} on a pressure needs its basis; write {name}(a) for absolute, {name}(g) for gauge or {name}(vac) for vacuum";
    }

    private static string PlainOf(Unit unit) => unit.Basis is UnitBasis.Absolute or UnitBasis.Gauge ? unit.Spelling[..^1] : unit.Spelling;

    private static string? KnownSlip(string spelling, Dimension dimension, string shown)
    {
        string? meant = Slips.Meant(spelling, dimension);
        return meant is not null && UnitTable.TryFind(meant, dimension, out _)
            ? $"{shown} is not a unit here; did you mean {meant}?"
            : null;
    }

    private static string? NearMiss(string spelling, Dimension dimension, string shown)
    {
        List<string> near = Slips.Nearest(spelling, dimension);
        return near.Count == 0 ? null : $"{shown} is not a unit here; did you mean {string.Join(" or ", near)}?";
    }

    private static string? OtherDimension(string spelling, string shown, Dimension dimension)
    {
        foreach (Unit unit in UnitTable.All)
        {
            if (UnitTable.TryFind(spelling, unit.Dimension, out _))
            {
                return $"{shown} is a unit of {DimensionWords.Of(unit.Dimension)}; "
                    + $"for {DimensionWords.Of(dimension)} write one of {UnitsOf(dimension)}";
            }
        }

        return null;
    }
}
