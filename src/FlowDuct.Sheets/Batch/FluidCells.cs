using System.Text;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;

namespace FlowDuct.Sheets.Batch;

/// <summary>Fluids by their cell; a sheet names the same few again and again.</summary>
/// <param name="mixtures">Mixtures of the user's own, by name.</param>
internal sealed class FluidCells(IReadOnlyDictionary<string, Fluid> mixtures)
{
    private const int MostKept = 256;

    private readonly Dictionary<(string Name, FractionBasis? Basis, EquationOfState? Equation), Fluid> _known = [];
    private byte[] _lastCell = [];
    private FractionBasis? _lastBasis;
    private EquationOfState? _lastEquation;
    private Fluid? _last;

    /// <summary>The fluid of a cell.</summary>
    /// <param name="cell">The cell, without spaces around it.</param>
    /// <param name="basis">What the fractions count; null where the row does not say.</param>
    /// <param name="equation">Which equation of state; null where the row does not say.</param>
    /// <exception cref="FlowDuctException">No fluid has that name; kind NotUnderstood.</exception>
    internal Fluid Find(ReadOnlySpan<byte> cell, FractionBasis? basis, EquationOfState? equation)
    {
        if (_last is not null && basis == _lastBasis && equation == _lastEquation && cell.SequenceEqual(_lastCell)) return _last;
        Fluid fluid = LookUp(Encoding.UTF8.GetString(cell), basis, equation);
        (_lastCell, _lastBasis, _lastEquation, _last) = (cell.ToArray(), basis, equation, fluid);
        return fluid;
    }

    private Fluid LookUp(string name, FractionBasis? basis, EquationOfState? equation)
    {
        if (_known.TryGetValue((name, basis, equation), out Fluid? known)) return known;
        Fluid fluid = mixtures.GetValueOrDefault(name) ?? (name.Length == 0 ? null : FluidCatalogue.Find(name, basis ?? FractionBasis.Mole)) ?? throw CellRefusals.NoFluid(name);
        if (basis is not null && (mixtures.ContainsKey(name) || fluid is not IdealGas { Mixture.IsHumidAir: false })) throw CellRefusals.IdleFractions(fluid.Name);
        if (_known.Count == MostKept) _known.Clear();
        return _known[(name, basis, equation)] = ByEquation(name, fluid, equation);
    }

    private static Fluid ByEquation(string name, Fluid fluid, EquationOfState? equation)
    {
        if (equation is null) return fluid;
        if (fluid is not IdealGas) throw CellRefusals.OneEquation(fluid);
        return equation == EquationOfState.Ideal ? fluid : ReferenceEquations.Find(name) ?? throw CellRefusals.NoReferenceEquation(name);
    }
}
