namespace FlowDuct.Fluids.Gases;

/// <summary>An ideal gas with the heat capacity of a NASA nine-coefficient fit: p v = R T, h and cp of temperature alone.</summary>
/// <remarks>
/// NASA/TP-2002-211556 (2002). The fit gives cp/R; the gas constant here is the exact one of the SI of 2019, while the fits were
/// made with 8.314510 J/(mol.K): 5.7e-6 less in every molar property. h is zero at 0 K, s refers to 1 bar.
/// </remarks>
public sealed class IdealGas : Fluid
{
    /// <summary>The molar gas constant, J/(mol.K), exact in the SI since 2019.</summary>
    internal const double MolarGasConstant = 8.31446261815324;

    /// <summary>The pressure of s0, Pa: 1 bar, NASA/TP-2002-211556 (2002).</summary>
    internal const double ReferencePressure = 1e5;

    private readonly Species species;
    private readonly CaloricCurve curve;
    private readonly GasMixture? mixture;
    private readonly Lazy<GasTransport?> transport;
    private readonly Lazy<SecondVirial?> virial;

    internal IdealGas(Species species)
    {
        this.species = species;
        R = MolarGasConstant / species.MolarMass * 1000;
        curve = new CaloricCurve(species, MolarGasConstant);
        transport = new Lazy<GasTransport?>(() => GasTransport.Of(Components));
        virial = new Lazy<SecondVirial?>(() => SecondVirial.Of(Components));
    }

    internal IdealGas(GasMixture mixture)
        : this(MixedRecord.Of(mixture.Name, mixture.Components)) => this.mixture = mixture;

    /// <inheritdoc/>
    public override string Name => species.Name;

    /// <inheritdoc/>
    public override string Formulation => mixture?.Formulation ?? $"NASA/TP-2002-211556 (2002), record {species.ReportRecord}, ideal gas";

    /// <inheritdoc/>
    public override string RangeText => IdealGasLimits.RangeText(curve);

    /// <inheritdoc/>
    public override bool HasSaturation => false;

    /// <summary>Specific gas constant, J/(kg.K).</summary>
    internal double R { get; }

    /// <summary>Molar mass, g/mol.</summary>
    internal double MolarMass => species.MolarMass;

    /// <summary>The mixture that this is; null of a pure gas.</summary>
    internal GasMixture? Mixture => mixture;

    /// <summary>The gases in it with their mole fractions; a pure gas is its own only component.</summary>
    internal IReadOnlyList<GasComponent> Components => mixture?.Components ?? [new GasComponent(species, 1)];

    /// <summary>Mole fraction of a gas by its formula; 0 where it is not in.</summary>
    internal double FractionOf(string formula)
    {
        foreach (GasComponent gas in Components)
        {
            if (gas.Species.Formula == formula)
                return gas.x;
        }

        return 0;
    }

    /// <summary>What tells how far the real gas is from this one; null where one of its gases has no critical constants.</summary>
    internal SecondVirial? Virial => virial.Value;

    /// <inheritdoc/>
    internal override double LeastPressure => IdealGasLimits.LeastPressure;

    /// <inheritdoc/>
    internal override double GreatestPressure => IdealGasLimits.GreatestPressure;

    /// <inheritdoc/>
    internal override Outcome FromPT(double p, double T, out FluidState state)
    {
        state = default;
        Outcome outcome = IdealGasLimits.OfPressure(p);
        if (outcome == Outcome.Ok)
            outcome = IdealGasLimits.OfTemperature(T, curve);
        if (outcome == Outcome.Ok)
            state = State(p, T, curve.At(T));
        return outcome;
    }

    /// <inheritdoc/>
    internal override Outcome FromPH(double p, double h, in FluidState near, out FluidState state)
    {
        state = default;
        Outcome outcome = IdealGasLimits.OfPressure(p);
        if (outcome != Outcome.Ok)
            return outcome;
        outcome = FromEnthalpy(h, out double T, out Reduced at);
        if (outcome == Outcome.Ok)
            state = State(p, T, at);
        return outcome;
    }

    /// <inheritdoc/>
    internal override Outcome FromPS(double p, double s, in FluidState near, out FluidState state)
    {
        state = default;
        Outcome outcome = IdealGasLimits.OfPressure(p);
        if (outcome != Outcome.Ok)
            return outcome;
        double lnp = Math.Log(p / ReferencePressure);
        double s0 = (s / R) + lnp;
        outcome = IdealGasLimits.OfPair(ref s0, curve.Lowest.s0, curve.Highest.s0);
        if (outcome != Outcome.Ok)
            return outcome;
        if (!curve.TryTemperatureFromEntropy(s0, out double T, out Reduced at))
            return Outcome.NotConverged;
        state = State(p, T, at, lnp);
        return Outcome.Ok;
    }

    /// <inheritdoc/>
    internal override Outcome FromHS(double h, double s, in FluidState near, out FluidState state)
    {
        state = default;
        Outcome outcome = FromEnthalpy(h, out double T, out Reduced at);
        if (outcome != Outcome.Ok)
            return outcome;
        double lnp = at.s0 - (s / R);
        double p = ReferencePressure * Math.Exp(lnp);
        outcome = IdealGasLimits.OfEntropyByPressure(ref p);
        if (outcome == Outcome.Ok)
            state = State(p, T, at, lnp);
        return outcome;
    }

    /// <inheritdoc/>
    internal override Outcome FromPX(double p, double x, out FluidState state) => NoSaturation(out state);

    /// <inheritdoc/>
    internal override Outcome FromTX(double T, double x, out FluidState state) => NoSaturation(out state);

    /// <inheritdoc/>
    internal override Outcome FromPRho(double p, double rho, out FluidState state)
    {
        state = default;
        Outcome outcome = IdealGasLimits.OfPressure(p);
        if (outcome != Outcome.Ok)
            return outcome;
        double T = rho > 0 ? p / (rho * R) : double.PositiveInfinity;
        outcome = IdealGasLimits.OfPair(ref T, curve.Tlow, curve.Thigh);
        if (outcome == Outcome.Ok)
            state = State(p, T, curve.At(T));
        return outcome;
    }

    /// <summary>Viscosity and conductivity at low pressure, where the gas has a correlation and T lies inside it.</summary>
    internal override bool TryTransport(in FluidState at, out Transport transport)
    {
        transport = default;
        return this.transport.Value is GasTransport known && known.TryAt(at.T, out transport);
    }

    /// <inheritdoc/>
    internal override bool TrySaturationTemperature(double p, out double T)
    {
        T = 0;
        return false;
    }

    /// <inheritdoc/>
    internal override bool TrySaturationPressure(double T, out double p)
    {
        p = 0;
        return false;
    }

    /// <inheritdoc/>
    internal override bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide)
    {
        singlePhaseSide = default;
        return false;
    }

    /// <inheritdoc/>
    internal override RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second) =>
        new IdealGasRefusal(species, curve, R).Of(outcome, pair, first, second);

    private Outcome FromEnthalpy(double h, out double T, out Reduced at)
    {
        (T, at) = (0, default);
        double reduced = h / R;
        Outcome outcome = IdealGasLimits.OfPair(ref reduced, curve.Lowest.h, curve.Highest.h);
        if (outcome != Outcome.Ok)
            return outcome;
        return curve.TryTemperatureFromEnthalpy(reduced, out T, out at) ? Outcome.Ok : Outcome.NotConverged;
    }

    private static Outcome NoSaturation(out FluidState state)
    {
        state = default;
        return Outcome.NoSaturation;
    }

    private FluidState State(double p, double T, in Reduced at) => State(p, T, at, Math.Log(p / ReferencePressure));

    private FluidState State(double p, double T, in Reduced at, double lnp)
    {
        double RT = R * T;
        double cp = R * at.cp;
        return new FluidState(
            p, T, v: RT / p, h: R * at.h, s: R * (at.s0 - lnp), cp, cv: cp - R, w: Math.Sqrt(at.cp / (at.cp - 1) * RT), x: 0,
            Phase.Gas, T < curve.FitFrom ? Notices.Extrapolated : Notices.None);
    }
}
