namespace FlowDuct.Fluids.Gases;

/// <summary>
/// Equilibrium of liquid and vapour on one equation of state: equal pressure and equal Gibbs energy (the Maxwell criterion), by Newton
/// from the auxiliary equations.
/// </summary>
internal static class HelmholtzSaturation
{
    private const int MostSteps = 40;

    // A step this small is followed by one below the last digit.
    private const double Closure = 1e-12;

    // Near the critical point pressure hardly changes with density, and steps come to rest on rounding before that.
    private const double Rest = 1e-3;

    /// <summary>Estimate of the saturation pressure, Pa, at T, K, up to Treducing.</summary>
    internal static double EstimatePressure(HelmholtzEquation of, double pc, double T) =>
        pc * Math.Exp(of.Treducing / T * of.Saturation!.At(1 - (T / of.Treducing)));

    /// <summary>Estimate of the density of the saturated liquid, kg/m3.</summary>
    internal static double EstimateLiquid(HelmholtzEquation of, double T) => of.rhoReducing * Math.Exp(of.Liquid!.At(1 - (T / of.Treducing)));

    /// <summary>Estimate of the density of the saturated vapour, kg/m3.</summary>
    internal static double EstimateVapour(HelmholtzEquation of, double T) =>
        of.rhoReducing * Math.Exp(of.Vapour!.At(1 - (T / of.Treducing)) * (of.VapourIsOverT ? of.Treducing / T : 1));

    /// <summary>Estimate of the saturation temperature, K, at p, Pa, up to pc.</summary>
    internal static double EstimateTemperature(HelmholtzEquation of, double pc, double p)
    {
        double lnp = Math.Log(p / pc), y = 1 - (lnp / 6.5);
        for (int i = 0; i < 8 && y > 1; i++)
        {
            double theta = 1 - (1 / y);
            double sum = of.Saturation!.At(theta), step = ((y * sum) - lnp) / (sum + (of.Saturation.Slope(theta) / y));
            y -= step;
            if (Math.Abs(step) < 1e-9) break;
        }

        return of.Treducing / Math.Max(y, 1);
    }

    /// <summary>Both phases at T, K, from two densities; false where Newton did not come to rest on two of them.</summary>
    internal static bool TryAtTemperature(HelmholtzEquation of, double T, double rhoLiquid, double rhoVapour, out HelmholtzPair pair)
    {
        double before = double.PositiveInfinity;
        for (int i = 0; i < MostSteps; i++)
        {
            HelmholtzPoint liquid = of.At(rhoLiquid, T), vapour = of.At(rhoVapour, T);
            double p = (liquid.a - vapour.a) / (vapour.v - liquid.v);
            if (!Step(liquid, vapour, p, 0, ref rhoLiquid, ref rhoVapour, out double size)) break;
            pair = new HelmholtzPair(p, T, liquid, vapour);
            if (size <= Closure || IsAtRest(pair, size, before)) return true;
            before = size;
        }

        pair = default;
        return false;
    }

    /// <summary>Both phases at p, Pa, from a temperature and two densities; false where Newton did not come to rest on two of them.</summary>
    internal static bool TryAtPressure(HelmholtzEquation of, double p, double T, double rhoLiquid, double rhoVapour, out HelmholtzPair pair)
    {
        double before = double.PositiveInfinity;
        for (int i = 0; i < MostSteps; i++)
        {
            HelmholtzPoint liquid = of.At(rhoLiquid, T), vapour = of.At(rhoVapour, T);
            double step = (vapour.a - liquid.a + (p * (vapour.v - liquid.v))) / (vapour.s - liquid.s);
            if (!Step(liquid, vapour, p, step, ref rhoLiquid, ref rhoVapour, out double size)) break;
            pair = new HelmholtzPair(p, T, liquid, vapour);
            if ((size <= Closure || IsAtRest(pair, size, before)) && Math.Abs(step) <= Closure * T) return true;
            before = size;
            T += step;
            if (!(T > 0 && T < 1.001 * of.Treducing)) break;
        }

        pair = default;
        return false;
    }

    private static bool IsAtRest(in HelmholtzPair pair, double size, double before) =>
        size >= before / 2 && size < Rest * ((pair.Liquid.rho / pair.Vapour.rho) - 1);

    // Moves both densities to the pressure at the new temperature; false where a phase is unstable or the two have met.
    private static bool Step(
        in HelmholtzPoint liquid, in HelmholtzPoint vapour, double p, double dT, ref double rhoLiquid, ref double rhoVapour, out double size)
    {
        double ofLiquid = (p - liquid.p - (liquid.pT * dT)) / liquid.prho, ofVapour = (p - vapour.p - (vapour.pT * dT)) / vapour.prho;
        size = Math.Max(Math.Abs(ofLiquid) / liquid.rho, Math.Abs(ofVapour) / vapour.rho);
        rhoLiquid += ofLiquid;
        rhoVapour += Math.Max(ofVapour, -0.5 * rhoVapour);
        return liquid.prho > 0 && vapour.prho > 0 && rhoLiquid > rhoVapour && double.IsFinite(rhoLiquid);
    }
}
