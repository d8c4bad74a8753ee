using System.Diagnostics.CodeAnalysis;

namespace FlowDuct.Fluids.Water;

/// <summary>Water and steam by IAPWS-IF97, IAPWS R7-97(2012), regions 1 to 5; wet states are homogeneous mixtures at equilibrium.</summary>
/// <remarks>
/// Valid from 273.15 K to 1073.15 K up to 100 MPa, to 2273.15 K up to 50 MPa. Inverses close on the forward equations; see
/// <see cref="Inverse{TKind}"/> for edges between regions. Below the triple-point pressure region 2 holds, with a notice about ice.
/// </remarks>
public sealed class WaterFluid : Fluid
{
    private WaterFluid()
    {
    }

    /// <summary>The one instance; it holds no state.</summary>
    public static WaterFluid Instance { get; } = new();

    /// <inheritdoc/>
    public override string Name => "water";

    /// <inheritdoc/>
    public override string Formulation => "IAPWS R7-97(2012), industrial formulation IAPWS-IF97";

    /// <inheritdoc/>
    public override string RangeText => "0 to 800 degC up to 1000 bar; 800 to 2000 degC up to 500 bar";

    /// <inheritdoc/>
    public override bool HasSaturation => true;

    internal override string Source => "IAPWS R7-97(2012)";

    internal override bool TryCriticalPoint(out double T, out double p)
    {
        (T, p) = (WaterConstants.Tc, WaterConstants.pc);
        return true;
    }

    internal override double LeastPressure => WaterConstants.pLeast;

    internal override double GreatestPressure => WaterConstants.pMost;

    internal override Outcome FromPT(double p, double T, out FluidState state)
    {
        state = default;
        Outcome outcome = CheckPT(p, T);
        if (outcome != Outcome.Ok) return outcome;
        RegionState at = RegionAt(p, T, out Phase phase);
        state = at.ToState(phase, NoticesOf.State(p, T));
        return Outcome.Ok;
    }

    internal override Outcome FromPH(double p, double h, in FluidState near, out FluidState state) => Inverse<ByEnthalpy>.Solve(p, h, out state);

    internal override Outcome FromPS(double p, double s, in FluidState near, out FluidState state) => Inverse<ByEntropy>.Solve(p, s, out state);

    internal override Outcome FromHS(double h, double s, in FluidState near, out FluidState state) =>
        EnthalpyEntropy.Solve(h, s, near, out state);

    internal override Outcome FromPX(double p, double x, out FluidState state)
    {
        state = default;
        if (!TrySaturationTemperature(p, out double T)) return Outcome.NoSaturation;
        return FromSaturation(p, T, x, out state);
    }

    internal override Outcome FromTX(double T, double x, out FluidState state)
    {
        state = default;
        if (!TrySaturationPressure(T, out double p)) return Outcome.NoSaturation;
        return FromSaturation(p, T, x, out state);
    }

    internal override Outcome FromPRho(double p, double rho, out FluidState state) => PressureDensity.Solve(p, rho, out state);

    internal override bool TrySaturationTemperature(double p, out double T)
    {
        bool exists = p >= SaturationLine.pAtLeastT && p <= WaterConstants.pc;
        T = exists ? Math.Clamp(SaturationLine.Temperature(p), WaterConstants.TLeast, WaterConstants.Tc) : 0;
        return exists;
    }

    internal override bool TrySaturationPressure(double T, out double p)
    {
        bool exists = T >= WaterConstants.TLeast && T <= WaterConstants.Tc;
        p = exists ? SaturationLine.Pressure(T) : 0;
        return exists;
    }

    internal override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        return SaturationByEntropy.TryTemperature(s, out double T) && FromTX(T, s >= WaterConstants.sc ? 1 : 0, out singlePhaseSide) == Outcome.Ok;
    }

    internal override bool TryWetSideSpeedOfSound(in FluidState at, out double w)
    {
        w = 0;
        if (at.Phase is not (Phase.SaturatedLiquid or Phase.SaturatedVapour)) return false;
        var pair = SaturatedPair.At(at.p, at.T);

        // At the critical point there is no wet side.
        if (!(pair.Vapour.v > pair.Liquid.v)) return false;
        w = pair.SpeedOfSound(at.x, at.v);
        return true;
    }

    internal override bool TryHeld(in FluidState at, in Onset onset, [NotNullWhen(true)] out Fluid? held)
    {
        held = at.Phase switch
        {
            Phase.Liquid or Phase.SaturatedLiquid => onset == Onset.AtTheEnd ? UnflashedWater.Instance : new UnflashedWater(onset),
            Phase.SuperheatedVapour or Phase.SaturatedVapour or Phase.Supercritical => onset == Onset.AtTheEnd ? SupersaturatedWater.Instance : new SupersaturatedWater(onset),
            _ => null,
        };
        return held is not null;
    }

    internal override bool TryTransport(in FluidState at, out Transport transport)
    {
        transport = default;
        if (!at.HasIsobaricHeatCapacity || !(at.T <= Viscosity.MostT) || CheckPT(at.p, at.T) != Outcome.Ok) return false;
        RegionState one = at.Phase switch
        {
            Phase.SaturatedLiquid => SaturatedPair.LiquidAt(at.p, at.T),
            Phase.SaturatedVapour => SaturatedPair.VapourAt(at.p, at.T),
            _ => RegionAt(at.p, at.T, out _),
        };
        double mu = Viscosity.Of(one.T, 1 / one.v);
        transport = new Transport(mu, ThermalConductivity.Of(one, mu));
        return true;
    }

    internal override bool TrySurfaceTension(double T, out double sigma)
    {
        sigma = SurfaceTension.Of(T);
        return T >= WaterConstants.TLeast && T <= WaterConstants.Tc;
    }

    internal override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        WaterRange.Explain(outcome, pair, first, second);

    /// <summary>The basic equation that holds at p, Pa, and T, K, both inside the range, and the phase there.</summary>
    internal static RegionState RegionAt(double p, double T, out Phase phase)
    {
        phase = p > WaterConstants.pc && T > WaterConstants.Tc ? Phase.Supercritical : Phase.SuperheatedVapour;
        if (T > WaterConstants.T25) return Region5.State(p, T);
        bool dense = T > WaterConstants.T13 && T <= WaterConstants.TB23Most && p > Boundaries.pB23(T);
        if (T > WaterConstants.T13 && !dense) return Region2.State(p, T);
        bool liquid = T <= WaterConstants.Tc && p > SaturationLine.Pressure(T);
        if (liquid) phase = Phase.Liquid;
        if (dense) return Region3At(p, T);
        return liquid ? Region1.State(p, T) : Region2.State(p, T);
    }

    private static RegionState Region3At(double p, double T)
    {
        RegionState at = Region3.State(Region3Density.Of(p, T), T);
        return new RegionState(p, T, at.v, at.h, at.s, at.cp, at.cv, at.w, at.vT, at.vp);
    }

    internal static Outcome CheckPT(double p, double T)
    {
        if (!(p >= WaterConstants.pLeast)) return Outcome.PressureTooLow;
        if (!(T >= WaterConstants.TLeast)) return Outcome.TemperatureTooLow;
        if (!(T <= WaterConstants.TMost)) return Outcome.TemperatureTooHigh;
        return p <= (T > WaterConstants.T25 ? WaterConstants.pMost5 : WaterConstants.pMost) ? Outcome.Ok : Outcome.PressureTooHigh;
    }

    private static Outcome FromSaturation(double p, double T, double x, out FluidState state)
    {
        state = default;
        if (!(x >= 0 && x <= 1)) return Outcome.QualityOutsideRange;
        Notices notices = NoticesOf.State(p, T);
        state = x switch
        {
            0 => SaturatedPair.LiquidAt(p, T).ToSaturated(0, Phase.SaturatedLiquid, notices),
            1 => SaturatedPair.VapourAt(p, T).ToSaturated(1, Phase.SaturatedVapour, notices),
            _ => SaturatedPair.At(p, T).Mix(x),
        };
        return Outcome.Ok;
    }
}
