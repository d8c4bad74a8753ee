namespace FlowDuct.Fluids.Water;

/// <summary>Vapour that does not condense, to the end of its equation: 5 % equilibrium moisture, 10 MPa. IAPWS R7-97(2012), Eq. (18).</summary>
internal sealed class SupersaturatedWater : HeldPhase
{
    private const double MostMoisture = 0.05;
    private const double MostPressure = 10e6;

    private SupersaturatedWater()
    {
    }

    /// <summary>The one instance; it holds no state.</summary>
    internal static SupersaturatedWater Instance { get; } = new();

    public override string Formulation => "IAPWS R7-97(2012); below saturation vapour that does not condense, Eq. (18), to 5 % equilibrium moisture";

    public override string RangeText => "vapour to 5 % equilibrium moisture, up to 100 bar";

    protected override Phase Held => Phase.SuperheatedVapour;

    protected override bool IsEquilibrium(in FluidState at) => at.Phase is Phase.SuperheatedVapour or Phase.SaturatedVapour or Phase.Supercritical || (at.Phase == Phase.Wet && at.x > 1 - OnTheLine);

    protected override RegionState Equation(double p, double T) => MetastableVapour.State(p, T);

    // The moisture that the same enthalpy would have at equilibrium.
    protected override Outcome Check(in RegionState at)
    {
        if (at.p > MostPressure) return Outcome.PressureTooHigh;
        if (!WaterFluid.Instance.TrySaturationTemperature(at.p, out double T)) return Outcome.PairTooLow;
        var pair = SaturatedPair.At(at.p, T);
        double moisture = (pair.Vapour.h - at.h) / (pair.Vapour.h - pair.Liquid.h);
        return moisture <= MostMoisture ? Outcome.Ok : Outcome.PairTooLow;
    }
}
