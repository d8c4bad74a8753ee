using System.Text;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;

namespace FlowDuct.Sheets.Batch;

/// <summary>Fluids by their cell; a sheet names the same few again and again.</summary>
internal sealed class FluidCells
{
    private const int MostKept = 256;

    private readonly Dictionary<(string Name, FractionBasis? Basis), Fluid> _known = [];
    private byte[] _lastCell = [];
    private FractionBasis? _lastBasis;
    private Fluid? _last;

    /// <summary>The fluid of a cell.</summary>
    /// <param name="cell">The cell, without spaces around it.</param>
    /// <param name="basis">What the fractions count; null where the row does not say.</param>
    /// <exception cref="FlowDuctException">No fluid has that name; kind NotUnderstood.</exception>
    internal Fluid Find(ReadOnlySpan<byte> cell, FractionBasis? basis)
    {
        if (_last is not null && basis == _lastBasis && cell.SequenceEqual(_lastCell)) return _last;
        Fluid fluid = LookUp(Encoding.UTF8.GetString(cell), basis);
        (_lastCell, _lastBasis, _last) = (cell.ToArray(), basis, fluid);
        return fluid;
    }

    private Fluid LookUp(string name, FractionBasis? basis)
    {
        if (_known.TryGetValue((name, basis), out Fluid? known)) return known;
        Fluid fluid = (name.Length == 0 ? null : FluidCatalogue.Find(name, basis ?? FractionBasis.Mole)) ?? throw CellRefusals.NoFluid(name);
        if (basis is not null && fluid is not IdealGas { Mixture: not null }) throw CellRefusals.IdleFractions(fluid.Name);
        if (_known.Count == MostKept) _known.Clear();
        return _known[(name, basis)] = fluid;
    }
}
