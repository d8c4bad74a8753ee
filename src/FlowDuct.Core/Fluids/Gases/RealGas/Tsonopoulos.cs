namespace FlowDuct.Fluids.Gases;

/// <summary>Second virial coefficient of a gas from its critical constants, with its derivatives.</summary>
/// <remarks>
/// C. Tsonopoulos, AIChE J. 20 (1974) 263: B = (R Tc/pc)(f0 + omega f1) of Tr = T/Tc, without the terms for polar gases.
/// From 200 K to 800 K it is within 5 cm3/mol or 4 % of the reference equations of state; hydrogen and helium, quantum gases, come
/// out too large by up to 9 and 13 cm3/mol; steam and ammonia, polar gases, too small in size (from memory).
/// </remarks>
internal static class Tsonopoulos
{
    /// <summary>The coefficient at T, K.</summary>
    internal static Virial At(in CriticalConstants gas, double T)
    {
        double x = gas.Tc / T, size = IdealGas.MolarGasConstant * gas.Tc / gas.pc;
        Reduced(x, gas.omega, out double f, out double fx, out double fxx);

        // By the chain rule over x = Tc/T: dx/dT = -x/T.
        double xT = -x / T;
        return new(size * f, size * fx * xT, size * xT * ((fxx * xT) - (2 * fx / T)));
    }

    private static void Reduced(double x, double omega, out double f, out double fx, out double fxx)
    {
        double x2 = x * x, x3 = x2 * x, x6 = x3 * x3, x7 = x6 * x, x8 = x7 * x;
        double f0 = 0.1445 - (0.330 * x) - (0.1385 * x2) - (0.0121 * x3) - (0.000607 * x8);
        double f1 = 0.0637 + (0.331 * x2) - (0.423 * x3) - (0.008 * x8);
        f = f0 + (omega * f1);
        fx = -0.330 - (2 * 0.1385 * x) - (3 * 0.0121 * x2) - (8 * 0.000607 * x7)
            + (omega * ((2 * 0.331 * x) - (3 * 0.423 * x2) - (8 * 0.008 * x7)));
        fxx = -(2 * 0.1385) - (6 * 0.0121 * x) - (56 * 0.000607 * x6) + (omega * ((2 * 0.331) - (6 * 0.423 * x) - (56 * 0.008 * x6)));
    }
}
