using System.Diagnostics.CodeAnalysis;

namespace FlowDuct.Fluids;

/// <summary>An equation of state, the only thing that a device knows about its fluid.</summary>
/// <remarks>
/// Members are pure and thread-safe; they allocate nothing. Each returns an outcome and, where it is Ok, the state. Every
/// inverse closes on the forward equation of state to 1e-11 relative or better in the pair that was given.
/// </remarks>
public abstract class Fluid
{
    /// <summary>The name used on the command line, for example "water".</summary>
    public abstract string Name { get; }

    /// <summary>The formulation, with number and year of its publication.</summary>
    public abstract string Formulation { get; }

    /// <summary>The valid range in one printable line.</summary>
    public abstract string RangeText { get; }

    /// <summary>True where the fluid has a liquid and a saturation line.</summary>
    public abstract bool HasSaturation { get; }

    /// <summary>The publication alone, short, for the standing of a finding.</summary>
    internal virtual string Source => Formulation;

    /// <summary>Critical temperature, K, and pressure, Pa; false where the model has no critical point.</summary>
    internal virtual bool TryCriticalPoint(out double T, out double p)
    {
        (T, p) = (0, 0);
        return false;
    }

    /// <summary>Least pressure of the formulation, Pa (a positive floor for brackets).</summary>
    internal abstract double LeastPressure { get; }

    /// <summary>Greatest pressure of the formulation, Pa.</summary>
    internal abstract double GreatestPressure { get; }

    /// <summary>State from pressure, Pa, and temperature, K. On the saturation line: vapour.</summary>
    internal abstract Outcome FromPT(double p, double T, out FluidState state);

    /// <summary>State from pressure, Pa, and specific enthalpy, J/kg; <paramref name="near"/> is a start (default: none).</summary>
    internal abstract Outcome FromPH(double p, double h, in FluidState near, out FluidState state);

    /// <summary>State from pressure, Pa, and specific entropy, J/(kg.K); <paramref name="near"/> is a start (default: none).</summary>
    internal abstract Outcome FromPS(double p, double s, in FluidState near, out FluidState state);

    /// <summary>State from specific enthalpy, J/kg, and specific entropy, J/(kg.K); <paramref name="near"/> is a start (default: none).</summary>
    internal abstract Outcome FromHS(double h, double s, in FluidState near, out FluidState state);

    /// <summary>State from pressure, Pa, and quality.</summary>
    internal abstract Outcome FromPX(double p, double x, out FluidState state);

    /// <summary>State from temperature, K, and quality.</summary>
    internal abstract Outcome FromTX(double T, double x, out FluidState state);

    /// <summary>State from pressure, Pa, and density, kg/m3.</summary>
    internal abstract Outcome FromPRho(double p, double rho, out FluidState state);

    /// <summary>Saturation temperature, K, at a pressure, Pa; false where there is none.</summary>
    internal abstract bool TrySaturationTemperature(double p, out double T);

    /// <summary>Saturation pressure, Pa, at a temperature, K; false where there is none.</summary>
    internal abstract bool TrySaturationPressure(double T, out double p);

    /// <summary>
    /// The pressure, Pa, at which an isentrope meets the saturation line as the pressure falls, and the single-phase side of that
    /// point (x = 0 or x = 1, with the single-phase speed of sound); false where the isentrope never meets it inside the range.
    /// </summary>
    internal abstract bool TrySaturationOnIsentrope(double s, out FluidState singlePhaseSide);

    /// <summary>
    /// On the saturation line the speed of sound, m/s, of the equilibrium mixture just inside the wet region, where the state itself has
    /// that of its one phase; false elsewhere.
    /// </summary>
    internal virtual bool TryWetSideSpeedOfSound(in FluidState at, out double w)
    {
        w = 0;
        return false;
    }

    /// <summary>
    /// The same fluid with the phase of a state held up to its onset: vapour that does not condense, liquid that does not flash. False where it has one phase
    /// only, or the state is wet already.
    /// </summary>
    internal virtual bool TryHeld(in FluidState at, in Onset onset, [NotNullWhen(true)] out Fluid? held)
    {
        held = null;
        return false;
    }

    /// <summary>The fluid in equilibrium, as behind a shock; itself where no phase is held.</summary>
    internal virtual Fluid Relaxed => this;

    /// <summary>Viscosity and thermal conductivity of a state of one phase; false where no formulation holds.</summary>
    internal virtual bool TryTransport(in FluidState at, out Transport transport)
    {
        transport = default;
        return false;
    }

    /// <summary>Surface tension, N/m, at a saturation temperature, K; false where there is none.</summary>
    internal virtual bool TrySurfaceTension(double T, out double sigma)
    {
        sigma = 0;
        return false;
    }

    /// <summary>Names the limit behind an outcome of the pair (first, second); called only to speak of a failure.</summary>
    internal abstract RangeViolation Explain(Outcome outcome, StatePair pair, double first, double second);
}
