namespace FlowDuct.Fluids.Water;

/// <summary>Vapour that does not condense, to the end of its equation: 5 % equilibrium moisture, 10 MPa. IAPWS R7-97(2012), Eq. (18).</summary>
internal sealed class SupersaturatedWater : HeldPhase
{
    /// <summary>Equilibrium moisture at which the equation ends.</summary>
    internal const double MostMoisture = 0.05;

    private const double MostPressure = 10e6;

    internal SupersaturatedWater(Onset onset)
        : base(onset with { Fraction = Math.Min(onset.Fraction, MostMoisture) })
    {
    }

    /// <summary>Held to the end of its equation.</summary>
    internal static SupersaturatedWater Instance { get; } = new(Onset.AtTheEnd);

    public override string Formulation => "IAPWS R7-97(2012); below saturation vapour that does not condense, Eq. (18), to 5 % equilibrium moisture";

    public override string RangeText => "vapour up to 100 bar";

    protected override Phase Held => Phase.SuperheatedVapour;

    protected override bool IsEquilibrium(in FluidState at) => at.Phase is Phase.SuperheatedVapour or Phase.SaturatedVapour or Phase.Supercritical || (at.Phase == Phase.Wet && at.x > 1 - OnTheLine);

    protected override RegionState Equation(double p, double T) => MetastableVapour.State(p, T);

    protected override Outcome Check(in RegionState at) => at.p <= MostPressure ? Outcome.Ok : Outcome.PressureTooHigh;

    protected override double OtherPhase(in SaturatedPair pair, double h) => (pair.Vapour.h - h) / (pair.Vapour.h - pair.Liquid.h);
}
