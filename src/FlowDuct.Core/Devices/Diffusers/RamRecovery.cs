namespace FlowDuct.Devices.Diffusers;

/// <summary>The standard schedule of stagnation pressure recovery of supersonic inlets.</summary>
/// <remarks>MIL-E-5008B, as quoted elsewhere and from memory: 1 up to M = 1, 1 - 0.075 (M - 1)^1.35 to M = 5, 800/(M^4 + 935) above.</remarks>
internal static class RamRecovery
{
    /// <summary>p0,2/p0,1 at the Mach number of the inlet.</summary>
    internal static double At(double M) => M <= 1 ? 1 : M <= 5 ? 1 - (0.075 * Math.Pow(M - 1, 1.35)) : 800 / ((M * M * M * M) + 935);
}
