namespace FlowDuct.Devices;

/// <summary>An altitude whose standard atmosphere stands in for what of the ambient state was not typed.</summary>
/// <param name="z">Height above mean sea level, m.</param>
/// <param name="GivesPressure">True where the ambient pressure comes from it.</param>
/// <param name="GivesTemperature">True where the ambient temperature comes from it.</param>
internal sealed record AmbientAltitude(double z, bool GivesPressure, bool GivesTemperature);
