namespace FlowDuct.Devices.Rating;

/// <summary>The inlet of a rated nozzle, and what its approach velocity says of the flow.</summary>
/// <param name="Inlet">The solved inlet.</param>
/// <param name="MassFlow">The flow where it is known before the throat is rated, kg/s; null where the throat decides.</param>
/// <param name="ReferenceFlow">
/// The isentropic flow between the same static pressures with its own approach velocity, kg/s, where the discharge coefficient refers to it;
/// null where it refers to the stagnation state of the inlet.
/// </param>
internal readonly record struct ApproachedInlet(Inlet Inlet, double? MassFlow, double? ReferenceFlow);
