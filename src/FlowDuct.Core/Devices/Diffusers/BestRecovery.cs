using FlowDuct.Devices.Coefficients;

namespace FlowDuct.Devices.Diffusers;

/// <summary>Greatest recovery that measurements found at an inlet blockage, whatever the geometry: straight lines between six points, to 0.02.</summary>
/// <remarks>P. W. Runstadler, F. X. Dolan, R. C. Dean, Diffuser Data Book, Creare TN-186 (1975), table from memory; planar of aspect ratio one.</remarks>
internal static class BestRecovery
{
    internal const string Standing = "Creare TN-186 (1975), table from memory, to 0.02";

    /// <summary>Share of the inlet area that the boundary layers block.</summary>
    internal static readonly ArgumentRange Blockage = new("inlet blockage", 0.02, 0.12);

    private const double Step = 0.02;

    private static ReadOnlySpan<double> Cone => [0.83, 0.80, 0.74, 0.71, 0.68, 0.65];

    private static ReadOnlySpan<double> Plane => [0.86, 0.80, 0.75, 0.70, 0.66, 0.63];

    /// <summary>The greatest recovery; null outside the table, and of shapes that it does not hold.</summary>
    internal static double? At(DiffuserShape shape, double B1)
    {
        if (Blockage.Cross(B1) is not null || shape is not (DiffuserShape.Conical or DiffuserShape.Planar)) return null;
        ReadOnlySpan<double> Cp = shape == DiffuserShape.Conical ? Cone : Plane;
        double place = (B1 - Blockage.Least) / Step;
        int i = Math.Min((int)place, Cp.Length - 2);
        return Cp[i] + ((place - i) * (Cp[i + 1] - Cp[i]));
    }
}
