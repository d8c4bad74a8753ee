namespace FlowDuct.Fluids.Gases;

/// <summary>Interaction factors phi of a gas mixture, which viscosity and conductivity share.</summary>
/// <remarks>
/// C. R. Wilke, J. Chem. Phys. 18 (1950) 517, from memory: phi_ij = [1 + sqrt(mu_i/mu_j) (M_j/M_i)^(1/4)]^2 / sqrt(8 (1 + M_i/M_j)).
/// A. Wassiljewa (1904) with E. A. Mason, S. C. Saxena, Phys. Fluids 1 (1958) 361, from memory, has the same factors for the
/// conductivity, with the constant of the later literature, 1.
/// </remarks>
internal sealed class WilkeFactors
{
    private readonly int n;
    private readonly double[] x;
    private readonly double[] fourthRoot;
    private readonly double[] front;

    internal WilkeFactors(IReadOnlyList<GasComponent> components)
    {
        n = components.Count;
        (x, fourthRoot, front) = (new double[n], new double[n * n], new double[n * n]);
        for (int i = 0; i < n; i++)
        {
            x[i] = components[i].x;
            for (int j = 0; j < n; j++)
            {
                double M = components[i].Species.MolarMass / components[j].Species.MolarMass;
                fourthRoot[(i * n) + j] = Math.Sqrt(Math.Sqrt(1 / M));
                front[(i * n) + j] = 1 / Math.Sqrt(8 * (1 + M));
            }
        }
    }

    /// <summary>Viscosity and conductivity of the mixture from those of its gases, in any units.</summary>
    internal void Mix(ReadOnlySpan<double> mus, ReadOnlySpan<double> lambdas, out double mu, out double lambda)
    {
        (mu, lambda) = (0, 0);
        for (int i = 0; i < n; i++)
        {
            double share = x[i] / Denominator(i, mus);
            mu += share * mus[i];
            lambda += share * lambdas[i];
        }
    }

    private double Denominator(int i, ReadOnlySpan<double> mus)
    {
        double sum = 0;
        for (int j = 0; j < n; j++)
        {
            double root = 1 + (Math.Sqrt(mus[i] / mus[j]) * fourthRoot[(i * n) + j]);
            sum += x[j] * front[(i * n) + j] * root * root;
        }

        return sum;
    }
}
