namespace FlowDuct.Fluids.Water;

/// <summary>What one walk over an equation yields: the properties and the two derivatives of volume that the wet region needs, SI.</summary>
internal readonly struct RegionState
{
    internal readonly double p;
    internal readonly double T;
    internal readonly double v;
    internal readonly double h;
    internal readonly double s;
    internal readonly double cp;
    internal readonly double cv;
    internal readonly double w;

    /// <summary>(dv/dT) at constant p, m3/(kg.K).</summary>
    internal readonly double vT;

    /// <summary>(dv/dp) at constant T, m3/(kg.Pa).</summary>
    internal readonly double vp;

    internal RegionState(double p, double T, double v, double h, double s, double cp, double cv, double w, double vT, double vp) =>
        (this.p, this.T, this.v, this.h, this.s, this.cp, this.cv, this.w, this.vT, this.vp) = (p, T, v, h, s, cp, cv, w, vT, vp);

    /// <summary>
    /// Properties from a dimensionless Gibbs energy and its derivatives, each scaled by its variable: pi g_pi, pi^2 g_pipi, tau g_tau,
    /// tau^2 g_tautau, pi tau g_pitau. R7-97(2012), Tables 3 and 12.
    /// </summary>
    internal static RegionState FromGibbs(double p, double T, double g, double gp, double gpp, double gt, double gtt, double gpt)
    {
        const double R = WaterConstants.R;
        double rt = R * T, cp = -R * gtt, mixed = gp - gpt;
        double cv = cp + (R * mixed * mixed / gpp);
        double w2 = rt * gp * gp / ((mixed * mixed / gtt) - gpp);
        double v = rt * gp / p;
        return new RegionState(p, T, v, rt * gt, R * (gt - g), cp, cv, Math.Sqrt(w2), R * mixed / p, rt * gpp / (p * p));
    }

    internal FluidState ToState(Phase phase, Notices notices) => new(p, T, v, h, s, cp, cv, w, 0, phase, notices);

    internal FluidState ToSaturated(double x, Phase phase, Notices notices) => new(p, T, v, h, s, cp, cv, w, x, phase, notices);
}
