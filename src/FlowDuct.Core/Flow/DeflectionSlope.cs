using FlowDuct.Fluids;

namespace FlowDuct.Flow;

/// <summary>
/// A quantity of the sign of d(theta)/d(beta) for oblique shocks at the angle beta, rad, in a stream of velocity V, m/s; its root
/// is the largest deflection.
/// </summary>
/// <remarks>
/// With D = p2 - p1 and Q = rho1 V^2, momentum gives tan(theta) = D cot(beta)/(Q - D) and K = cot(beta)^2 = (V/v1)^2 (v1 - v2)/D - 1.
/// d ln(tan(theta))/dp2 = 0 becomes K + D K' (1 - D/Q)/2 = 0, where D K' = (V/v1)^2 (-dv2/dp2 - (v1 - v2)/D). Along the shock
/// adiabat T ds = ((v1 - v2) dp + D dv)/2, hence dv2/dp2 = (e (v1 - v2)/2 - (v2/w2)^2)/(1 - e D/2) with e = (dv/dh) at constant p.
/// </remarks>
internal readonly struct DeflectionSlope(Fluid fluid, in FluidState upstream, double V) : IScalarFunction
{
    private readonly FluidState _upstream = upstream;

    /// <summary>The limit at the Mach angle, M^2 - 1.</summary>
    internal double AtMachAngle => ((V / _upstream.w) - 1) * ((V / _upstream.w) + 1);

    /// <inheritdoc/>
    public double At(double x)
    {
        (double sin, double cos) = Math.SinCos(x);
        if (!(V * sin > _upstream.w)) return AtMachAngle;
        if (!NormalShock.TryFind(fluid, _upstream, V * sin, out FluidState behind, out _)) return double.NegativeInfinity;
        double D = behind.p - _upstream.p, chord = (_upstream.v - behind.v) / D, flux = V / _upstream.v;
        return (cos * cos / (sin * sin)) + (flux * flux * (Steepness(behind, D) - chord) * (1 - (D / (flux * V))) / 2);
    }

    // -dv2/dp2 along the shock adiabat.
    private double Steepness(in FluidState behind, double D)
    {
        double e = Expansivity.VolumeByEnthalpy(fluid, behind), isentropic = behind.v / behind.w;
        return ((isentropic * isentropic) - (e * (_upstream.v - behind.v) / 2)) / (1 - (e * D / 2));
    }
}
