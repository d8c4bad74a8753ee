namespace FlowDuct.Devices.Diffusers;

/// <summary>Darcy friction factor of a pipe.</summary>
/// <remarks>
/// C. F. Colebrook, J. Inst. Civil Engineers 11 (1939) 133: 1/sqrt(f) = -2 log10(k/(3.7 D) + 2.51/(Re sqrt(f))), from memory; laminar 64/Re below 2300.
/// </remarks>
internal static class FrictionFactor
{
    private const double LeastTurbulent = 2300;
    private const int Rounds = 30;

    /// <summary>The factor at a Reynolds number and a roughness over the diameter.</summary>
    internal static double Darcy(double Re, double roughness)
    {
        if (Re < LeastTurbulent) return 64 / Re;
        double y = 8;
        for (int i = 0; i < Rounds; i++) y = -2 * Math.Log10((roughness / 3.7) + (2.51 * y / Re));
        return 1 / (y * y);
    }
}
