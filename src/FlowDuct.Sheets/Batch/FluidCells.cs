using System.Text;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;

namespace FlowDuct.Sheets.Batch;

/// <summary>Fluids by their cell; a sheet names the same few again and again.</summary>
internal sealed class FluidCells
{
    private const int MostKept = 256;

    private readonly Dictionary<(string Name, FractionBasis? Basis, bool Reference), Fluid> _known = [];
    private byte[] _lastCell = [];
    private FractionBasis? _lastBasis;
    private bool _lastReference;
    private Fluid? _last;

    /// <summary>The fluid of a cell.</summary>
    /// <param name="cell">The cell, without spaces around it.</param>
    /// <param name="basis">What the fractions count; null where the row does not say.</param>
    /// <param name="reference">True for the reference equation of state.</param>
    /// <exception cref="FlowDuctException">No fluid has that name; kind NotUnderstood.</exception>
    internal Fluid Find(ReadOnlySpan<byte> cell, FractionBasis? basis, bool reference = false)
    {
        if (_last is not null && basis == _lastBasis && reference == _lastReference && cell.SequenceEqual(_lastCell)) return _last;
        Fluid fluid = LookUp(Encoding.UTF8.GetString(cell), basis, reference);
        (_lastCell, _lastBasis, _lastReference, _last) = (cell.ToArray(), basis, reference, fluid);
        return fluid;
    }

    private Fluid LookUp(string name, FractionBasis? basis, bool reference)
    {
        if (_known.TryGetValue((name, basis, reference), out Fluid? known)) return known;
        Fluid fluid = (name.Length == 0 ? null : FluidCatalogue.Find(name, basis ?? FractionBasis.Mole)) ?? throw CellRefusals.NoFluid(name);
        if (basis is not null && fluid is not IdealGas { Mixture: not null }) throw CellRefusals.IdleFractions(fluid.Name);
        if (reference) fluid = ReferenceEquations.Find(name) ?? throw CellRefusals.NoReference(fluid.Name);
        if (_known.Count == MostKept) _known.Clear();
        return _known[(name, basis, reference)] = fluid;
    }
}
