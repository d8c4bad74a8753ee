using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>What fixes the line on which an exit state lies.</summary>
internal enum PathKind
{
    /// <summary>Constant entropy.</summary>
    Isentrope,

    /// <summary>Constant static enthalpy (the exit velocity is known).</summary>
    Isenthalp,

    /// <summary>Constant nozzle efficiency against the isentropic expansion to the same pressure.</summary>
    NozzleEfficiency,

    /// <summary>Constant nozzle loss coefficient (p0,1 - p0,2)/(p0,2 - p2).</summary>
    NozzleLoss,
}

/// <summary>A line of possible exit states, one for each exit pressure, at constant total enthalpy.</summary>
/// <param name="Fluid">The equation of state.</param>
/// <param name="Kind">What is constant along the line.</param>
/// <param name="Level">The constant: entropy, enthalpy, efficiency or loss coefficient.</param>
/// <param name="h0">Total specific enthalpy at the exit, J/kg.</param>
/// <param name="s1">Entropy of the inlet, J/(kg.K).</param>
/// <param name="p01">Stagnation pressure of the inlet, Pa.</param>
internal sealed record ExpansionPath(Fluid Fluid, PathKind Kind, double Level, double h0, double s1, double p01)
{
    /// <summary>The state on the line at a pressure, Pa.</summary>
    internal Outcome At(double p, out FluidState state) => Kind switch
    {
        PathKind.Isentrope => Fluid.FromPS(p, Level, default, out state),
        PathKind.Isenthalp => Fluid.FromPH(p, Level, default, out state),
        PathKind.NozzleEfficiency => AtEfficiency(p, out state),
        _ => AtLoss(p, out state),
    };

    private Outcome AtEfficiency(double p, out FluidState state)
    {
        Outcome outcome = Fluid.FromPS(p, s1, default, out FluidState ideal);
        state = ideal;
        if (outcome != Outcome.Ok || Level == 1) return outcome;
        return Fluid.FromPH(p, h0 - (Level * (h0 - ideal.h)), ideal, out state);
    }

    private Outcome AtLoss(double p, out FluidState state)
    {
        double p02 = (p01 + (Level * p)) / (1 + Level);
        Outcome outcome = Fluid.FromPH(p02, h0, default, out state);
        return outcome == Outcome.Ok ? Fluid.FromPS(p, state.s, state, out state) : outcome;
    }
}
