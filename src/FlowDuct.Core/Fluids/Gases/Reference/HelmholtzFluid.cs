using System.Globalization;

namespace FlowDuct.Fluids.Gases;

/// <summary>A fluid by its published reference equation of state: real gas, liquid and, of a pure fluid, wet states at equilibrium.</summary>
/// <remarks>
/// Saturation of nitrogen and carbon dioxide is solved on the equation itself. Air is a mixture that the equation takes as one pure fluid: states
/// between its bubble and its dew line are refused. Enthalpy and entropy have the datum of the papers.
/// </remarks>
public sealed class HelmholtzFluid : Fluid
{
    // Up to this part of the reducing density the transport of a gas at low pressure is taken: within about 5 % there.
    private const double MostDilute = 0.1;

    private readonly PhaseBoundary boundary;
    private readonly Lazy<GasTransport?> transport;

    internal HelmholtzFluid(string name, string formula, string authors, string paper, PhaseBoundary boundary)
    {
        (Name, this.boundary, Source) = (name, boundary, paper);
        EquationParameters range = boundary.Equation.Parameters;
        Formulation = string.Create(
            CultureInfo.InvariantCulture,
            $"{authors}, {paper}, reference equation of state, {range.Tleast} K to {range.Tmost} K, up to {range.pMost / 1e6} MPa");
        transport = new Lazy<GasTransport?>(() => GasTransport.OfGas(formula));
    }

    /// <inheritdoc/>
    public override string Name { get; }

    /// <inheritdoc/>
    public override string Formulation { get; }

    /// <inheritdoc/>
    public override string RangeText => string.Create(
        CultureInfo.InvariantCulture,
        $"{Equation.Parameters.Tleast} K (or the melting line) to {Equation.Parameters.Tmost} K, {HelmholtzRange.LeastPressure} Pa to {Equation.Parameters.pMost / 1e6} MPa{(boundary.IsPure ? string.Empty : "; not between its bubble and dew lines")}");

    /// <inheritdoc/>
    public override bool HasSaturation => boundary.IsPure;

    /// <inheritdoc/>
    internal override string Source { get; }

    /// <inheritdoc/>
    internal override bool TryCriticalPoint(out double T, out double p)
    {
        (T, p) = (boundary.Tc, boundary.pc);
        return true;
    }

    /// <summary>The equation of state.</summary>
    internal HelmholtzEquation Equation => boundary.Equation;

    /// <summary>Where one phase ends.</summary>
    internal PhaseBoundary Boundary => boundary;

    /// <inheritdoc/>
    internal override double LeastPressure => HelmholtzRange.LeastPressure;

    /// <inheritdoc/>
    internal override double GreatestPressure => Equation.Parameters.pMost;

    /// <inheritdoc/>
    internal override Outcome FromPT(double p, double T, out FluidState state)
    {
        state = default;
        Outcome outcome = HelmholtzRange.Check(Equation, p, T);
        if (outcome != Outcome.Ok) return outcome;
        PhaseSide side = boundary.SideOf(p, T);
        if (side == PhaseSide.Between) return Outcome.BetweenPhases;
        state = HelmholtzState.Of(boundary, p, Equation.At(HelmholtzDensity.Of(boundary, p, T, side), T), side);
        return Outcome.Ok;
    }

    /// <inheritdoc/>
    internal override Outcome FromPH(double p, double h, in FluidState near, out FluidState state) =>
        HelmholtzInverse<HelmholtzEnthalpy>.Solve(boundary, p, h, near, out state);

    /// <inheritdoc/>
    internal override Outcome FromPS(double p, double s, in FluidState near, out FluidState state) =>
        HelmholtzInverse<HelmholtzEntropy>.Solve(boundary, p, s, near, out state);

    /// <inheritdoc/>
    internal override Outcome FromHS(double h, double s, in FluidState near, out FluidState state) =>
        HelmholtzEnthalpyEntropy.Solve(boundary, h, s, near, out state);

    /// <inheritdoc/>
    internal override Outcome FromPX(double p, double x, out FluidState state)
    {
        state = default;
        return HasSaturation && p >= boundary.pLeast && p <= boundary.pc && boundary.TryAtPressure(p, out HelmholtzPair pair)
            ? FromSaturation(pair, x, out state)
            : Outcome.NoSaturation;
    }

    /// <inheritdoc/>
    internal override Outcome FromTX(double T, double x, out FluidState state)
    {
        state = default;
        return TryPair(T, out HelmholtzPair pair) ? FromSaturation(pair, x, out state) : Outcome.NoSaturation;
    }

    /// <inheritdoc/>
    internal override Outcome FromPRho(double p, double rho, out FluidState state) => HelmholtzPressureDensity.Solve(boundary, p, rho, out state);

    /// <inheritdoc/>
    internal override bool TrySaturationTemperature(double p, out double T)
    {
        HelmholtzPair pair = default;
        bool exists = HasSaturation && p >= boundary.pLeast && p <= boundary.pc && boundary.TryAtPressure(p, out pair);
        T = pair.T;
        return exists;
    }

    /// <inheritdoc/>
    internal override bool TrySaturationPressure(double T, out double p)
    {
        bool exists = TryPair(T, out HelmholtzPair pair);
        p = pair.p;
        return exists;
    }

    /// <inheritdoc/>
    internal override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        return boundary is SaturatedBoundary saturated && HelmholtzIsentrope.TryMeet(saturated, s, out singlePhaseSide);
    }

    /// <inheritdoc/>
    internal override bool TryWetSideSpeedOfSound(in FluidState at, out double w)
    {
        w = 0;
        if (at.Phase is not (Phase.SaturatedLiquid or Phase.SaturatedVapour) || !TryPair(at.T, out HelmholtzPair pair) || pair.IsCritical) return false;
        w = pair.SpeedOfSound(at.x, at.v);
        return true;
    }

    /// <summary>Viscosity and conductivity of the gas at low pressure, where it is thin enough for them and T lies inside their fit.</summary>
    internal override bool TryTransport(in FluidState at, out Transport transport)
    {
        transport = default;
        bool thin = at.Phase is not (Phase.None or Phase.Wet) && at.rho <= MostDilute * Equation.rhoReducing;
        return thin && this.transport.Value is GasTransport known && known.TryAt(at.T, out transport);
    }

    /// <inheritdoc/>
    internal override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        new HelmholtzRefusal(this).Of(outcome, pair, first, second);

    private bool TryPair(double T, out HelmholtzPair pair)
    {
        pair = default;
        return T >= Equation.Parameters.Tleast && T <= boundary.Tc && boundary is SaturatedBoundary saturated && saturated.TryAtTemperature(T, out pair);
    }

    private Outcome FromSaturation(in HelmholtzPair pair, double x, out FluidState state)
    {
        state = default;
        if (!(x >= 0 && x <= 1)) return Outcome.QualityOutsideRange;
        state = HelmholtzState.Saturated(boundary, pair, pair.IsCritical ? 1 : x);
        return Outcome.Ok;
    }
}
