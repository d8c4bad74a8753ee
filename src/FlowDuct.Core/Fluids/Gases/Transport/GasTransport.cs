using FlowDuct.Fluids.Gases.Coefficients;

namespace FlowDuct.Fluids.Gases;

/// <summary>Viscosity and conductivity of a gas or a mixture at low pressure, inside the range that the fits of all its gases share.</summary>
internal sealed class GasTransport
{
    private readonly PureTransport[] gases;
    private readonly WilkeFactors? factors;

    private GasTransport(IReadOnlyList<GasComponent> components, PureTransport[] gases)
    {
        this.gases = gases;
        factors = gases.Length > 1 ? new WilkeFactors(components) : null;
        (Tlow, Thigh) = (gases.Max(gas => gas.Tlow), gases.Min(gas => gas.Thigh));
    }

    /// <summary>Least temperature, K.</summary>
    internal double Tlow { get; }

    /// <summary>Greatest temperature, K.</summary>
    internal double Thigh { get; }

    /// <summary>The correlations of a mixture; null where one of its gases has none.</summary>
    internal static GasTransport? Of(IReadOnlyList<GasComponent> components)
    {
        PureTransport?[] gases = [.. components.Select(gas => Pure(gas.Species.Formula))];
        return Array.Exists(gases, gas => gas is null) ? null : new GasTransport(components, gases!);
    }

    /// <summary>The correlation of one gas by its formula; null where it has none.</summary>
    internal static GasTransport? OfGas(string formula) => TransportRecords.Find(formula) is PureTransport gas ? new GasTransport([], [gas]) : null;

    /// <summary>Viscosity, Pa.s, and conductivity, W/(m.K), at T, K; false outside the fits.</summary>
    internal bool TryAt(double T, out Transport transport)
    {
        transport = default;
        if (!(T >= Tlow && T <= Thigh))
            return false;
        transport = factors is null ? Pure(T) : Mixed(T, factors);
        return true;
    }

    private static PureTransport? Pure(string formula) =>
        TransportRecords.Find(formula) is not PureTransport known ? null : formula == "H2O" ? new VapourTransport(known) : known;

    private Transport Pure(double T)
    {
        gases[0].At(T, out double mu, out double lambda);
        return new Transport(mu, lambda);
    }

    private Transport Mixed(double T, WilkeFactors of)
    {
        Span<double> mus = stackalloc double[gases.Length], lambdas = stackalloc double[gases.Length];
        for (int i = 0; i < gases.Length; i++)
            gases[i].At(T, out mus[i], out lambdas[i]);
        of.Mix(mus, lambdas, out double mu, out double lambda);
        return new Transport(mu, lambda);
    }
}
