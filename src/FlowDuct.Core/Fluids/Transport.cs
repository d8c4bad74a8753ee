namespace FlowDuct.Fluids;

/// <summary>Transport properties of one phase, SI.</summary>
/// <param name="mu">Dynamic viscosity, Pa.s.</param>
/// <param name="lambda">Thermal conductivity, W/(m.K).</param>
internal readonly record struct Transport(double mu, double lambda);
