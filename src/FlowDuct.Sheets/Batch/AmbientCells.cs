using FlowDuct.Devices;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>The surroundings of a row: pressure, temperature, or an altitude that stands in for what is not given.</summary>
internal static class AmbientCells
{
    internal static void Apply(in GivenSlots given, ref CaseFrame frame)
    {
        bool p = given.Has((int)StationSymbol.Pressure), T = given.Has((int)StationSymbol.Temperature);
        frame.AmbientGiven = true;
        if (p) frame.AmbientPressure = given.Value((int)StationSymbol.Pressure);
        if (T) frame.AmbientTemperature = given.Value((int)StationSymbol.Temperature);
        if (!given.Has((int)StationSymbol.Altitude)) return;
        double z = given.Value((int)StationSymbol.Altitude);
        if (!StandardAtmosphere.TryAtAltitude(z, out double pressure, out double temperature)) return;
        if (!p) frame.AmbientPressure = pressure;
        if (!T) frame.AmbientTemperature = temperature;
        frame.Altitude = new AmbientAltitude(z, !p, !T);
    }
}
