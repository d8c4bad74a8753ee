namespace FlowDuct.Fluids.Gases;

/// <summary>Saturation of a pure fluid, solved on its own equation of state.</summary>
internal sealed class SaturatedBoundary : PhaseBoundary
{
    // Closer to the critical temperature the phases are taken as one, of the critical density: 13 uK for nitrogen, 30 uK for carbon dioxide.
    private const double CriticalBand = 1e-7;

    // The estimates of pressure are within 0.02 %.
    private const double Doubt = 0.01;

    // Less than any saturated vapour (the critical compressibility factors are 0.289 and 0.275), more than the states within the loop at low temperature.
    private const double LeastFactor = 0.3;

    // Of an isobar: what two ways to the same saturation state differ by.
    private const double LineRounding = 1e-11;

    private static readonly double[] s_widths = [1, 0.9, 0.8, 1.15, 0.7];

    private readonly double pBand;
    private readonly HelmholtzPoint critical;

    internal SaturatedBoundary(HelmholtzEquation equation)
        : base(equation)
    {
        critical = equation.At(equation.rhoReducing, Tc);
        pBand = critical.p - (critical.pT * Tc * CriticalBand);
        pLeast = TryAtTemperature(equation.Parameters.Tleast, out HelmholtzPair pair) ? pair.p : equation.Melting.pt;
    }

    internal override bool IsPure => true;

    internal override double pc => critical.p;

    internal override double pLeast { get; }

    internal override PhaseSide SideOf(double p, double T)
    {
        if (T >= Tc) return PhaseSide.OnePhase;
        if (p >= pc) return PhaseSide.Liquid;
        double estimate = HelmholtzSaturation.EstimatePressure(Equation, pc, T);
        if (p > estimate * (1 + Doubt)) return PhaseSide.Liquid;
        if (p < estimate * (1 - Doubt) || !TryAtTemperature(T, out HelmholtzPair pair)) return PhaseSide.Vapour;
        return p <= pair.p * (1 + LineRounding) ? PhaseSide.Vapour : PhaseSide.Liquid;
    }

    internal override bool IsClearlyStable(in HelmholtzPoint at)
    {
        if (!(at.prho > 0)) return false;
        if (at.T >= Tc) return true;
        double estimate = HelmholtzSaturation.EstimatePressure(Equation, pc, at.T);
        return at.rho < Equation.rhoReducing
            ? at.p < estimate * (1 - Doubt) && at.p > LeastFactor * at.rho * Equation.R * at.T
            : at.p > estimate * (1 + Doubt) && at.rho > 0.99 * HelmholtzSaturation.EstimateLiquid(Equation, at.T);
    }

    internal override double LiquidStart(double T) => T < Tc ? HelmholtzSaturation.EstimateLiquid(Equation, T) : Equation.rhoReducing;

    // Closer to the critical temperature the loop is narrower than the doubt about its end.
    internal override double LiquidFloor(double T) => T < 0.999 * Tc ? 0.99 * LiquidStart(T) : Equation.rhoReducing;

    internal override bool TryAtPressure(double p, out HelmholtzPair pair)
    {
        if (p >= pBand) return Merged(p, Tc - ((pc - p) / critical.pT), out pair);
        double T = HelmholtzSaturation.EstimateTemperature(Equation, pc, p);
        (double liquid, double vapour) = (HelmholtzSaturation.EstimateLiquid(Equation, T), HelmholtzSaturation.EstimateVapour(Equation, T));
        foreach (double width in s_widths)
        {
            if (HelmholtzSaturation.TryAtPressure(Equation, p, T, Wider(liquid, width), Wider(vapour, width), out pair)) return true;
        }

        pair = default;
        return false;
    }

    /// <summary>Both phases at T, K, up to the critical temperature.</summary>
    internal bool TryAtTemperature(double T, out HelmholtzPair pair)
    {
        if (T >= Tc * (1 - CriticalBand)) return Merged(pc - (critical.pT * (Tc - T)), T, out pair);
        (double liquid, double vapour) = (HelmholtzSaturation.EstimateLiquid(Equation, T), HelmholtzSaturation.EstimateVapour(Equation, T));
        foreach (double width in s_widths)
        {
            if (HelmholtzSaturation.TryAtTemperature(Equation, T, Wider(liquid, width), Wider(vapour, width), out pair)) return true;
        }

        pair = default;
        return false;
    }

    private double Wider(double rho, double width) => Equation.rhoReducing + (width * (rho - Equation.rhoReducing));

    private bool Merged(double p, double T, out HelmholtzPair pair)
    {
        HelmholtzPoint one = Equation.At(Equation.rhoReducing, T);
        pair = new HelmholtzPair(p, T, one, one);
        return true;
    }
}
