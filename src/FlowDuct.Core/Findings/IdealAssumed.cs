using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>No loss was given and none is implied.</summary>
internal static class IdealAssumed
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (!a.TakenIdeal) return null;
        bool nozzle = a.Case.Device == DeviceKind.Nozzle;
        return new Finding("ideal-assumed", nozzle ? Severity.Note : Severity.Caution, null, null, "assumption", _ => nozzle
            ? "no loss given: the expansion is taken isentropic, so the exit velocity is the highest possible"
            : "no loss given: the compression is taken isentropic; a real diffuser recovers clearly less");
    }
}
