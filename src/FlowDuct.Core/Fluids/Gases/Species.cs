using System.Collections.Immutable;

namespace FlowDuct.Fluids.Gases;

/// <summary>One gas of NASA/TP-2002-211556 (2002), in the units of the report.</summary>
internal sealed record Species
{
    /// <summary>The name used on the command line.</summary>
    internal required string Name { get; init; }

    /// <summary>Formula or short name, the word that mixtures are written with; case tells CO from Co.</summary>
    internal required string Formula { get; init; }

    /// <summary>The name of the record in the report.</summary>
    internal required string ReportRecord { get; init; }

    /// <summary>Molar mass, g/mol.</summary>
    internal required double MolarMass { get; init; }

    /// <summary>Enthalpy of formation at 298.15 K, J/mol: what the fit returns for h there.</summary>
    internal required double HeatOfFormation298 { get; init; }

    /// <summary>h(298.15 K) - h(0 K), J/mol.</summary>
    internal required double EnthalpyAbove0KAt298 { get; init; }

    /// <summary>
    /// Temperature, K, down to which the heat capacity may be held at its value at the lower end of the fit; equal to that end
    /// for a gas whose heat capacity still changes there.
    /// </summary>
    internal required double ContinuedDownTo { get; init; }

    /// <summary>The intervals of the fit, joined end to end, coldest first.</summary>
    internal required ImmutableArray<Nasa9Interval> Intervals { get; init; }
}
