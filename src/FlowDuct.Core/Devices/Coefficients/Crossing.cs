namespace FlowDuct.Devices.Coefficients;

/// <summary>An argument outside the published range of a correlation.</summary>
/// <param name="Argument">Its symbol.</param>
/// <param name="Value">Its value, SI.</param>
/// <param name="Limit">The end of the range that it crosses, SI.</param>
internal readonly record struct Crossing(string Argument, double Value, double Limit);
