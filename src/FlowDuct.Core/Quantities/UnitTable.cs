namespace FlowDuct.Quantities;

/// <summary>The closed, case-sensitive list of units. A linear scan: it costs less than building a dictionary at start.</summary>
internal static partial class UnitTable
{
    /// <summary>Every row, in the order of the dimensions; the first of a dimension is the usual one.</summary>
    public static ReadOnlySpan<Unit> All => Rows;

    /// <summary>The dimension whose rows serve <paramref name="dimension"/>: differences share the units of their quantity.</summary>
    public static Dimension RowsOf(Dimension dimension) => dimension switch
    {
        Dimension.PressureDifference => Dimension.Pressure,
        Dimension.TemperatureDifference => Dimension.Temperature,
        _ => dimension,
    };

    /// <summary>Finds a unit by its exact spelling.</summary>
    /// <param name="spelling">The spelling, with (a), (g) or (vac) where a pressure says its basis.</param>
    /// <param name="dimension">The quantity that it must measure.</param>
    /// <param name="reading">The unit as it reads on that quantity.</param>
    /// <returns>False where there is none; <see cref="UnitSuggestion"/> then says why.</returns>
    public static bool TryFind(string spelling, Dimension dimension, out UnitReading reading)
    {
        reading = default;
        ReadOnlySpan<char> bare = SplitSuffix(spelling, dimension, out UnitBasis suffix);
        Unit? unit = FindRow(bare, RowsOf(dimension));
        if (unit is null || !TryResolveBasis(unit.Basis, suffix, dimension, out UnitBasis basis))
            return false;
        bool written = suffix != UnitBasis.None || unit.Basis is UnitBasis.Absolute or UnitBasis.Gauge;
        reading = new UnitReading(unit, dimension, basis, spelling, written);
        return true;
    }

    /// <summary>What would do instead of a spelling that was not found, in one sentence.</summary>
    /// <param name="spelling">The spelling as typed.</param>
    /// <param name="dimension">The quantity that it should measure.</param>
    public static string Suggest(string spelling, Dimension dimension) => UnitSuggestion.For(spelling, dimension);

    /// <summary>The row of a spelling in a dimension that has rows of its own, or null.</summary>
    internal static Unit? FindRow(ReadOnlySpan<char> spelling, Dimension dimension)
    {
        foreach (Unit unit in Rows)
        {
            if (unit.Dimension == dimension && spelling.SequenceEqual(unit.Spelling))
                return unit;
        }

        return null;
    }

    /// <summary>Cuts the basis suffix off the spelling of a pressure unit.</summary>
    internal static ReadOnlySpan<char> SplitSuffix(ReadOnlySpan<char> spelling, Dimension dimension, out UnitBasis basis)
    {
        basis = UnitBasis.None;
        if (RowsOf(dimension) != Dimension.Pressure)
            return spelling;
        if (spelling.EndsWith("(a)", StringComparison.Ordinal))
            basis = UnitBasis.Absolute;
        else if (spelling.EndsWith("(g)", StringComparison.Ordinal))
            basis = UnitBasis.Gauge;
        else if (spelling.EndsWith("(vac)", StringComparison.Ordinal))
            basis = UnitBasis.Vacuum;
        return basis == UnitBasis.None ? spelling : spelling[..spelling.LastIndexOf('(')];
    }

    /// <summary>A basis may be said once, must be said with a head unit on a pressure, and never on a difference.</summary>
    private static bool TryResolveBasis(UnitBasis own, UnitBasis suffix, Dimension dimension, out UnitBasis basis)
    {
        bool ownIsBasis = own is UnitBasis.Absolute or UnitBasis.Gauge;
        basis = UnitBasis.None;
        if (dimension != Dimension.Pressure)
            return suffix == UnitBasis.None && !ownIsBasis;
        if ((ownIsBasis && suffix != UnitBasis.None) || (own == UnitBasis.Head && suffix == UnitBasis.None))
            return false;
        basis = (ownIsBasis, suffix) switch
        {
            (true, _) => own,
            (false, UnitBasis.None) => UnitBasis.Absolute,
            _ => suffix,
        };
        return true;
    }
}
