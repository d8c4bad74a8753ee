namespace FlowDuct.Fluids.Water;

/// <summary>Liquid that does not flash: IAPWS R7-97(2012), Eq. (7), below its saturation pressure, which the release calls usable close to it.</summary>
internal sealed class UnflashedWater : HeldPhase
{
    internal UnflashedWater(Onset onset)
        : base(onset)
    {
    }

    /// <summary>Held to the end of its equation.</summary>
    internal static UnflashedWater Instance { get; } = new(Onset.AtTheEnd);

    public override string Formulation => "IAPWS R7-97(2012); below saturation liquid that does not flash, Eq. (7)";

    public override string RangeText => "liquid, 0 to 350 degC";

    protected override Phase Held => Phase.Liquid;

    protected override bool IsEquilibrium(in FluidState at) => at.Phase is Phase.Liquid or Phase.SaturatedLiquid || (at.Phase == Phase.Wet && at.x < OnTheLine);

    protected override RegionState Equation(double p, double T) => Region1.State(p, T);

    protected override Outcome Check(in RegionState at) => at.T <= WaterConstants.T13 && at.T >= WaterConstants.TLeast ? Outcome.Ok : Outcome.PairTooLow;

    protected override double OtherPhase(in SaturatedPair pair, double h) => (h - pair.Liquid.h) / (pair.Vapour.h - pair.Liquid.h);
}
