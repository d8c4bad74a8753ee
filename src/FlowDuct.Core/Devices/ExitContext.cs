using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>What is known before the exit is solved, SI.</summary>
/// <param name="Device">Nozzle or diffuser.</param>
/// <param name="Fluid">The equation of state.</param>
/// <param name="Given">The figures of the exit and its loss.</param>
/// <param name="Inlet">The solved inlet.</param>
/// <param name="h0">Total specific enthalpy at the exit by the energy balance, J/kg.</param>
/// <param name="Flux">Mass flux density at the exit where its section and the flow are known, kg/(m2.s); else 0.</param>
/// <param name="Branch">Which of two solutions is wanted.</param>
internal sealed record ExitContext(
    DeviceKind Device, Fluid Fluid, StationFigures Given, Inlet Inlet, double h0, double Flux, Branch Branch)
{
    internal double s1 => Inlet.State.s;

    internal double p01 => Inlet.Station.Stagnation!.Value.p;

    /// <summary>The value of the one figure that selects a point on a path.</summary>
    internal double Target(Figure figure) => figure == Figure.Section ? Flux : Given[figure];
}
