namespace FlowDuct.Fluids.Gases;

/// <summary>Reducing point, gas constant, molar mass and range of an equation of state, as its paper has them.</summary>
/// <param name="Treducing">Reducing temperature, K.</param>
/// <param name="rhoReducing">Reducing density, mol/m3.</param>
/// <param name="Rmolar">Gas constant of the equation, J/(mol.K); older than the exact one of 2019.</param>
/// <param name="M">Molar mass, kg/mol.</param>
/// <param name="Tleast">Least temperature, K.</param>
/// <param name="Tmost">Greatest temperature, K.</param>
/// <param name="pMost">Greatest pressure, Pa.</param>
internal sealed record EquationParameters(double Treducing, double rhoReducing, double Rmolar, double M, double Tleast, double Tmost, double pMost);
