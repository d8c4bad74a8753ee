using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A given flow lies above what the throat passes at equilibrium: late condensation and flashing explain some of it.</summary>
internal static class AboveEquilibriumFlow
{
    // What a message will need is set aside where its method begins, so that method begins only for a rated nozzle.
    internal static Finding? Check(DeviceAnswer a) => a.Rating is null ? null : OfRated(a);

    private static Finding? OfRated(DeviceAnswer a)
    {
        if (a.Case.GivenMassFlow(a.Inlet.State.rho) is not double flow || a.Rating is not NozzleRating rating) return null;
        if (a.Performance.DischargeCoefficient is not > 1 || FrozenFlow.Of(a) is not double most || flow > most) return null;
        return new Finding("above-equilibrium-flow", Severity.Caution, flow, rating.IsentropicFlow, "frozen-phase bound", text =>
            $"{text.Text(flow, Dimension.MassFlow)} is more than the throat passes at equilibrium, {text.Text(rating.IsentropicFlow, Dimension.MassFlow)}; with the phases frozen it would pass {text.Text(most, Dimension.MassFlow)}");
    }
}
