namespace FlowDuct.Fluids.Gases;

/// <summary>The bubble and the dew line of air, which are equations of their own: E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331-385.</summary>
/// <remarks>
/// The lines meet at the maxcondentherm (Tj, pj). The bubble line has its greatest pressure a little below that temperature: in the
/// band of pressures between, both ends of the two-phase states lie on it.
/// </remarks>
internal sealed class AirBoundary : PhaseBoundary
{
    // Pressure at the maxcondentherm, Pa, the reducing pressure of both lines.
    private const double pj = 3.78502e6;

    private const double Doubt = 1e-3;
    private const double LeastFactor = 0.2;
    private readonly double Ttop;

    internal AirBoundary(HelmholtzEquation equation)
        : base(equation)
    {
        Ttop = Top(equation);
        (pc, pLeast) = (BubblePressure(Ttop), DewPressure(equation.Parameters.Tleast));
    }

    internal override bool IsPure => false;

    internal override double pc { get; }

    internal override double pLeast { get; }

    internal override PhaseSide SideOf(double p, double T)
    {
        if (T >= Tc) return PhaseSide.OnePhase;
        if (p <= DewPressure(T)) return PhaseSide.Vapour;
        return p >= BubblePressure(T) ? PhaseSide.Liquid : PhaseSide.Between;
    }

    internal override bool IsClearlyStable(in HelmholtzPoint at)
    {
        if (!(at.prho > 0)) return false;
        if (at.T >= Tc) return true;
        return at.rho < Equation.rhoReducing
            ? at.p < DewPressure(at.T) * (1 - Doubt) && at.p > LeastFactor * at.rho * Equation.R * at.T
            : at.p > BubblePressure(at.T) * (1 + Doubt) && at.rho > 0.98 * LiquidStart(at.T);
    }

    // Rackett's form with the constants of the reducing point (common practice); a start only.
    internal override double LiquidStart(double T) => Equation.rhoReducing * Math.Exp(1.26 * Math.Pow(Math.Max(1 - (T / Tc), 0), 2.0 / 7));

    internal override bool TryAtPressure(double p, out HelmholtzPair pair)
    {
        double Tbubble = OnLine(p, bubble: true, Equation.Parameters.Tleast, Ttop);
        double Tdew = p > pj ? OnLine(p, bubble: true, Ttop, Tc) : OnLine(p, bubble: false, Equation.Parameters.Tleast, Tc);
        HelmholtzPoint liquid = Equation.At(HelmholtzDensity.Of(this, p, Tbubble, PhaseSide.Liquid), Tbubble);
        HelmholtzPoint vapour = Equation.At(HelmholtzDensity.Of(this, p, Tdew, PhaseSide.Vapour), Tdew);
        pair = new HelmholtzPair(p, Tdew, liquid, vapour);
        return liquid.prho > 0 && vapour.prho > 0;
    }

    /// <summary>Pressure, Pa, at which liquid air begins to boil at T, K.</summary>
    internal double BubblePressure(double T) => pj * Math.Exp(Tc / T * Equation.Bubble!.At(Math.Max(1 - (T / Tc), 0)));

    /// <summary>Pressure, Pa, at which gaseous air begins to condense at T, K.</summary>
    internal double DewPressure(double T) => pj * Math.Exp(Tc / T * Equation.Dew!.At(Math.Max(1 - (T / Tc), 0)));

    // Bisection to the last bits: it runs beside saturation only.
    private double OnLine(double p, bool bubble, double Trising, double Tend)
    {
        (double low, double high) = (Trising, Tend);
        bool rises = !(bubble && Tend == Tc);
        for (int i = 0; i < 60 && high - low > 2e-16 * high; i++)
        {
            double T = (low + high) / 2;
            if ((bubble ? BubblePressure(T) : DewPressure(T)) < p == rises) low = T;
            else high = T;
        }

        return (low + high) / 2;
    }

    // Golden section to the greatest pressure of the bubble line, which stands close to its end.
    private static double Top(HelmholtzEquation of)
    {
        const double Golden = 0.6180339887498949;
        (double a, double b) = (0.99 * of.Treducing, of.Treducing);
        for (int i = 0; i < 60; i++)
        {
            double c = b - (Golden * (b - a)), d = a + (Golden * (b - a));
            if (Rise(of, c) > Rise(of, d)) b = d;
            else a = c;
        }

        return (a + b) / 2;
    }

    private static double Rise(HelmholtzEquation of, double T) => of.Treducing / T * of.Bubble!.At(1 - (T / of.Treducing));
}
