namespace FlowDuct.Sheets;

/// <summary>Columns whose cells are one of a few words.</summary>
internal enum ChoiceColumn
{
    /// <summary>convergent or convergent-divergent.</summary>
    Shape,

    /// <summary>subsonic or supersonic.</summary>
    Branch,

    /// <summary>equilibrium, supersaturated or single-phase.</summary>
    Expansion,

    /// <summary>stagnation or dynamic.</summary>
    RecoveryBasis,

    /// <summary>mole or mass.</summary>
    Fractions,

    /// <summary>ideal or reference.</summary>
    EquationOfState,
}

/// <summary>The words of choice columns, in the order of the values they stand for.</summary>
internal static class ChoiceWords
{
    internal static readonly (ChoiceColumn Column, string Name, string[] Words)[] All =
    [
        (ChoiceColumn.Shape, "shape", ["convergent", "convergent-divergent"]),
        (ChoiceColumn.Branch, "branch", ["subsonic", "supersonic"]),
        (ChoiceColumn.Expansion, "expansion", ["equilibrium", "supersaturated", "single-phase"]),
        (ChoiceColumn.RecoveryBasis, "recovery-basis", ["stagnation", "dynamic"]),
        (ChoiceColumn.Fractions, "fractions", ["mole", "mass"]),
        (ChoiceColumn.EquationOfState, "equation-of-state", ["ideal", "reference"]),
    ];

    /// <summary>The words of a column.</summary>
    internal static string[] Of(ChoiceColumn column) => All[(int)column].Words;
}
