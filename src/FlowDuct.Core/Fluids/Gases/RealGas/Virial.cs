namespace FlowDuct.Fluids.Gases;

/// <summary>Second virial coefficient and its derivatives by temperature, molar.</summary>
/// <param name="B">Coefficient, m3/mol.</param>
/// <param name="dB">First derivative, m3/(mol.K).</param>
/// <param name="d2B">Second derivative, m3/(mol.K2).</param>
internal readonly record struct Virial(double B, double dB, double d2B);
