namespace FlowDuct.Quantities;

/// <summary>One row of the unit table: SI value = (number + offset) * factor.</summary>
internal sealed class Unit
{
    /// <summary>Creates a row.</summary>
    public Unit(string spelling, Dimension dimension, double factor, string source, double offset = 0, UnitBasis basis = UnitBasis.None)
    {
        Spelling = spelling;
        Dimension = dimension;
        Factor = factor;
        Source = source;
        Offset = offset;
        Basis = basis;
    }

    /// <summary>As typed and printed; ASCII, case-sensitive, unique in its dimension.</summary>
    public string Spelling { get; }

    /// <summary>The quantity it measures; pressure and temperature units also measure their differences.</summary>
    public Dimension Dimension { get; }

    /// <summary>SI units in one of this unit.</summary>
    public double Factor { get; }

    /// <summary>Added to the number before the factor, in this unit's own degrees; temperatures only.</summary>
    public double Offset { get; }

    /// <summary>The basis that the spelling itself says.</summary>
    public UnitBasis Basis { get; }

    /// <summary>Where the factor comes from.</summary>
    public string Source { get; }

    /// <summary>
    /// The whole number of this unit in one SI unit, 0 where it is not whole. Dividing by it is correctly rounded, so that
    /// 18 mm is 0.018 m to the last bit; a product with 0.001 need not be.
    /// </summary>
    /// <remarks>Computed on demand: with plain stores only, the table is laid out by the compiler and costs nothing at start.</remarks>
    public double Divisor
    {
        get
        {
            double inverse = 1 / Factor;
            return inverse > 1 && inverse == Math.Floor(inverse) ? inverse : 0;
        }
    }
}
