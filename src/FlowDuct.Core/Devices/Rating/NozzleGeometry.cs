namespace FlowDuct.Devices.Rating;

/// <summary>What a rating needs to know of the nozzle.</summary>
/// <param name="ThroatArea">Area of all throats together, m2; of a convergent nozzle that of the exit.</param>
/// <param name="ExitArea">Area of all exits together, m2.</param>
/// <param name="Efficiency">Isentropic efficiency of the expansion.</param>
/// <param name="DischargeCoefficient">Mass flow over isentropic flow of the throat; null where it is not given.</param>
internal readonly record struct NozzleGeometry(double ThroatArea, double ExitArea, double Efficiency, double? DischargeCoefficient);
