namespace FlowDuct.Fluids.Water;

/// <summary>First guesses of density and temperature in region 3. SR3-03(2014), Eqs. (2)-(9).</summary>
internal static class Region3Backward
{
    /// <summary>From p, Pa, and h, J/kg.</summary>
    internal static (double rho, double T) FromPH(double p, double h)
    {
        double pi = p / 100e6;
        return h <= Boundaries.h3ab(p)
            ? (1 / (0.0028 * BackwardKernels.Region3aVph(pi + 0.128, (h / 2100e3) - 0.727)),
               760 * BackwardKernels.Region3aTph(pi + 0.240, (h / 2300e3) - 0.615))
            : (1 / (0.0088 * BackwardKernels.Region3bVph(pi + 0.0661, (h / 2800e3) - 0.720)),
               860 * BackwardKernels.Region3bTph(pi + 0.298, (h / 2800e3) - 0.720));
    }

    /// <summary>From p, Pa, and s, J/(kg.K).</summary>
    internal static (double rho, double T) FromPS(double p, double s)
    {
        double pi = p / 100e6;
        return s <= WaterConstants.sc
            ? (1 / (0.0028 * BackwardKernels.Region3aVps(pi + 0.187, (s / 4.4e3) - 0.755)),
               760 * BackwardKernels.Region3aTps(pi + 0.240, (s / 4.4e3) - 0.703))
            : (1 / (0.0088 * BackwardKernels.Region3bVps(pi + 0.298, (s / 5.3e3) - 0.816)),
               860 * BackwardKernels.Region3bTps(pi + 0.760, (s / 5.3e3) - 0.818));
    }
}
