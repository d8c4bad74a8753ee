using System.Text;
using FlowDuct.Errors;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>A column of figures, compiled: cell in, SI value out.</summary>
internal sealed class FigureCell
{
    private readonly UnitScale _scale;
    private readonly UnitScale _gaugeScale;
    private readonly bool _quick;
    private readonly byte _decimalMark;

    internal FigureCell(SheetColumn column, int index, byte decimalMark)
    {
        (Column, Index, _decimalMark, Row) = (column, index, decimalMark, column.Row!);
        IsAmbient = column.List == StationLists.Ambient;
        Slot = column.List == StationLists.None ? (int)Row.OptionSlot!.Value : (int)Row.StationSlot!.Value;
        Place = column.Heading.Trim();
        if (column.Unit is not UnitReading unit) return;
        _scale = new UnitScale(unit);
        _gaugeScale = new UnitScale(PressureBasis.IsOpen(unit) ? PressureBasis.AsGauge(unit) : unit);
        _quick = Row.Dimension != Dimension.Count;
    }

    internal SheetColumn Column { get; }

    internal QuantityRow Row { get; }

    /// <summary>Which cell of the record.</summary>
    internal int Index { get; }

    internal int Slot { get; }

    /// <summary>The heading, for refusals.</summary>
    internal string Place { get; }

    private bool IsAmbient { get; }

    /// <summary>Reads a cell that is not empty.</summary>
    /// <param name="cell">The cell, without spaces around it.</param>
    /// <param name="basis">The declared basis of the row; null where none is.</param>
    /// <param name="ambientPressure">Ambient pressure, Pa.</param>
    /// <exception cref="FlowDuctException">The cell is refused; kind NotUnderstood.</exception>
    internal FigureValue Read(ReadOnlySpan<byte> cell, UnitBasis? basis, double ambientPressure)
    {
        bool gauge = basis == UnitBasis.Gauge && Column.NeedsBasis;
        if (!_quick || IsCustomBesideGauge(basis) || !DecimalCell.TryRead(cell, _decimalMark, out double number, out double half)) return Slowly(cell, basis, ambientPressure);
        UnitScale scale = gauge ? _gaugeScale : _scale;
        double si = scale.ToSi(number, ambientPressure);
        if (!Row.Limits.Contains(si)) return Slowly(cell, basis, ambientPressure);
        return new FigureValue(si, ValueParser.IsAnEnd(Row, si) ? 0 : scale.IntervalToSi(half), Column.Unit!.Value.Dimension, scale.NeedsAmbient);
    }

    /// <summary>True for a flow that may count a volume at a reference state, or is beside one: anything but a plain number in a unit of mass or actual volume.</summary>
    internal bool IsAmount(ReadOnlySpan<byte> cell, bool besideReferenceState) =>
        besideReferenceState || Column.Unit is not { Dimension: Dimension.MassFlow or Dimension.VolumeFlow } || !DecimalCell.TryRead(cell, _decimalMark, out _, out _);

    /// <summary>A cell as it would be typed on a command line: with its unit, and a decimal point.</summary>
    internal string Typed(ReadOnlySpan<byte> cell)
    {
        string text = WithPoint(Encoding.UTF8.GetString(cell));
        int length = NumberParser.Measure(text, out _);
        string behind = text[length..].Trim();
        bool bare = behind is "" or "dry" or "wet";
        return bare && Column.Unit is UnitReading unit ? $"{text[..length]} {unit.Spelling} {behind}".TrimEnd() : text;
    }

    /// <summary>Reads the two sides of a shape, such as 600x400 or 900x500 mm.</summary>
    /// <exception cref="FlowDuctException">The cell is refused; kind NotUnderstood.</exception>
    internal StationItem ReadPair(ReadOnlySpan<byte> cell)
    {
        string text = Encoding.UTF8.GetString(cell);
        if (char.IsAsciiDigit(text[^1]) && Column.Unit is UnitReading unit) text += " " + unit.Spelling;
        return StationListParser.Parse(Place, Column.List, $"{Row.Key}={text}", 0)[0];
    }

    private bool IsCustomBesideGauge(UnitBasis? basis) =>
        basis == UnitBasis.Gauge && Column.Unit is UnitReading unit && PressureBasis.IsOpen(unit) && PressureBasis.IsAbsoluteByCustom(unit);

    private FigureValue Slowly(ReadOnlySpan<byte> cell, UnitBasis? basis, double ambientPressure)
    {
        string text = WithPoint(Encoding.UTF8.GetString(cell));
        bool bare = NumberParser.Measure(text, out _) is int length && length == text.Length && length > 0;
        UnitReading? unit = bare ? Column.Unit : null;
        if (bare && IsCustomBesideGauge(basis)) throw CellRefusals.AbsoluteBesideGauge(Place, unit!.Value.Spelling);
        if (unit is UnitReading own && PressureBasis.IsOpen(own) && basis == UnitBasis.Gauge) unit = PressureBasis.AsGauge(own);
        GivenValue given = unit is UnitReading known ? ValueParser.ParseCell(Place, Row, text, known, ambientPressure) : ValueParser.Parse(Place, Row, text, ambientPressure);
        if (!bare) given = WithBasis(given, basis, ambientPressure);
        return new FigureValue(given.Si, given.HalfWidth, given.Unit.Dimension, given.WasGauge);
    }

    // A unit in a cell says its basis, as one in a heading does.
    private GivenValue WithBasis(in GivenValue given, UnitBasis? basis, double ambientPressure)
    {
        if (IsAmbient && given.WasGauge) throw CellRefusals.NoBasis(Place, given.Text);
        if (IsAmbient || !PressureBasis.IsOpen(given.Unit)) return given;
        if (PressureBasis.IsAbsoluteByCustom(given.Unit)) return basis == UnitBasis.Gauge ? throw CellRefusals.AbsoluteBesideGauge(Place, given.Text) : given;
        if (basis is null) throw CellRefusals.NoBasis(Place, given.Text);
        return basis == UnitBasis.Gauge ? ValueParser.Parse(Place, Row, given.Text + "(g)", ambientPressure) : given;
    }

    // The number of a cell ends where its unit begins; a unit such as kJ/(kg.K) has a point of its own.
    private string WithPoint(string text)
    {
        if (_decimalMark == '.') return text;
        int end = 0;
        while (end < text.Length && (char.IsAsciiDigit(text[end]) || text[end] is '+' or '-' or ',' or '.' or 'e' or 'E')) end++;
        string number = text[..end];
        if (number.Contains('.', StringComparison.Ordinal)) throw CellRefusals.DecimalPoint(Place, text);
        return number.Replace(',', '.') + text[end..];
    }
}

/// <summary>A figure out of a cell, SI.</summary>
/// <param name="Si">The value.</param>
/// <param name="HalfWidth">Half of its last printed place.</param>
/// <param name="Dimension">Which of the dimensions of its quantity it was given in.</param>
/// <param name="WasGauge">True where the ambient pressure went into it.</param>
internal readonly record struct FigureValue(double Si, double HalfWidth, Dimension Dimension, bool WasGauge);
