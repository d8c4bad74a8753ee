namespace FlowDuct.Fluids.Gases;

/// <summary>
/// The residual part of a reduced Helmholtz energy and its derivatives, each scaled by its variables: g, delta g_delta, delta^2 g_deltadelta,
/// tau g_tau, tau^2 g_tautau, delta tau g_deltatau.
/// </summary>
internal readonly struct HelmholtzSums(double g, double gx, double gxx, double gy, double gyy, double gxy)
{
    internal readonly double g = g;
    internal readonly double gx = gx;
    internal readonly double gxx = gxx;
    internal readonly double gy = gy;
    internal readonly double gyy = gyy;
    internal readonly double gxy = gxy;
}
