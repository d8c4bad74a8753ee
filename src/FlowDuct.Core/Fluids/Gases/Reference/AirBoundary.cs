namespace FlowDuct.Fluids.Gases;

/// <summary>The bubble and the dew line of air, which are equations of their own: E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331-385.</summary>
/// <remarks>
/// The lines meet at the maxcondentherm (Tj, pj). Between 132.1 K and there the bubble line stands up to 0.18 % above pj; pressures from pj on are
/// taken as of one phase, which the equation of state is there: it has no loop above 132 K.
/// </remarks>
internal sealed class AirBoundary : PhaseBoundary
{
    // Pressure at the maxcondentherm, Pa, the reducing pressure of both lines.
    private const double pj = 3.78502e6;

    private const double Doubt = 1e-3;
    private const double LeastFactor = 0.2;

    // Of Tj: where both lines end, rounding must not put a state between them.
    private const double CornerRounding = 1e-9;

    internal AirBoundary(HelmholtzEquation equation)
        : base(equation) => pLeast = DewPressure(equation.Parameters.Tleast);

    internal override bool IsPure => false;

    internal override double pc => pj;

    internal override double pLeast { get; }

    internal override PhaseSide SideOf(double p, double T)
    {
        if (T >= Tc) return PhaseSide.OnePhase;
        if (p <= DewPressure(T)) return PhaseSide.Vapour;
        return p >= Math.Min(BubblePressure(T), pj) ? PhaseSide.Liquid : PhaseSide.Between;
    }

    internal override bool IsClearlyStable(in HelmholtzPoint at)
    {
        if (!(at.prho > 0)) return false;
        if (at.T >= Tc * (1 - CornerRounding)) return true;
        return at.rho < Equation.rhoReducing
            ? at.p < DewPressure(at.T) * (1 - Doubt) && at.p > LeastFactor * at.rho * Equation.R * at.T
            : at.p > BubblePressure(at.T) * (1 + Doubt) && at.rho > 0.98 * LiquidStart(at.T);
    }

    // Rackett's form (common practice) through the density at 1 atm; a start only.
    internal override double LiquidStart(double T) => Equation.rhoReducing * Math.Exp(1.37 * Math.Pow(Math.Max(1 - (T / Tc), 0), 2.0 / 7));

    internal override double LiquidFloor(double T) => T < 0.99 * Tc ? 0.9 * LiquidStart(T) : 0.5 * Equation.rhoReducing;

    internal override bool TryAtPressure(double p, out HelmholtzPair pair)
    {
        double Tbubble = OnLine(p, bubble: true), Tdew = OnLine(p, bubble: false);
        HelmholtzPoint liquid = Equation.At(HelmholtzDensity.Of(this, p, Tbubble, PhaseSide.Liquid), Tbubble);
        HelmholtzPoint vapour = Equation.At(HelmholtzDensity.Of(this, p, Tdew, PhaseSide.Vapour), Tdew);
        pair = new HelmholtzPair(p, Tdew, liquid, vapour);
        return liquid.prho > 0 && vapour.prho > 0;
    }

    /// <summary>Pressure, Pa, at which liquid air begins to boil at T, K.</summary>
    internal double BubblePressure(double T) => pj * Math.Exp(Tc / T * Equation.Bubble!.At(Math.Max(1 - (T / Tc), 0)));

    /// <summary>Pressure, Pa, at which gaseous air begins to condense at T, K.</summary>
    internal double DewPressure(double T) => pj * Math.Exp(Tc / T * Equation.Dew!.At(Math.Max(1 - (T / Tc), 0)));

    // Bisection to the last bits, from the cold end, where both lines rise: it runs beside saturation only.
    private double OnLine(double p, bool bubble)
    {
        (double low, double high) = (0.99 * Equation.Parameters.Tleast, Tc);
        for (int i = 0; i < 60 && high - low > 2e-16 * high; i++)
        {
            double T = (low + high) / 2;
            if ((bubble ? BubblePressure(T) : DewPressure(T)) < p) low = T;
            else high = T;
        }

        return (low + high) / 2;
    }
}
