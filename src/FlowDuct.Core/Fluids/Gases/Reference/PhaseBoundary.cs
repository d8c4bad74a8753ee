namespace FlowDuct.Fluids.Gases;

/// <summary>On which side of saturation a pressure and a temperature lie.</summary>
internal enum PhaseSide
{
    /// <summary>Above the greatest temperature with two phases.</summary>
    OnePhase,

    /// <summary>Liquid.</summary>
    Liquid,

    /// <summary>Vapour; the saturation line itself too.</summary>
    Vapour,

    /// <summary>Between the bubble and the dew line of a mixture.</summary>
    Between,
}

/// <summary>Where one phase ends on an equation of state.</summary>
internal abstract class PhaseBoundary(HelmholtzEquation equation)
{
    /// <summary>The equation of state.</summary>
    internal HelmholtzEquation Equation { get; } = equation;

    /// <summary>True where the states between the phases are mixtures at one temperature: a pure fluid.</summary>
    internal abstract bool IsPure { get; }

    /// <summary>Greatest temperature with two phases, K.</summary>
    internal double Tc => Equation.Treducing;

    /// <summary>Greatest pressure with two phases, Pa.</summary>
    internal abstract double pc { get; }

    /// <summary>Least pressure with two phases, Pa, at the least temperature.</summary>
    internal abstract double pLeast { get; }

    /// <summary>The side on which p, Pa, and T, K, lie.</summary>
    internal abstract PhaseSide SideOf(double p, double T);

    /// <summary>True where p, T at the density rho, kg/m3, is a stable state beyond doubt: far enough from the boundary for estimates to tell.</summary>
    internal abstract bool IsClearlyStable(in HelmholtzPoint at);

    /// <summary>Boiling liquid and condensing vapour at p, Pa, below pc.</summary>
    internal abstract bool TryAtPressure(double p, out HelmholtzPair pair);

    /// <summary>Density estimate, kg/m3, of the liquid next to saturation at T, K.</summary>
    internal abstract double LiquidStart(double T);

    /// <summary>A density, kg/m3, that no stable liquid at T, K, has, yet above the states within the loop of the equation.</summary>
    internal abstract double LiquidFloor(double T);
}
