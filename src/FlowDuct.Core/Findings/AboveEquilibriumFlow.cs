using FlowDuct.Devices;
using FlowDuct.Devices.Rating;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A given flow lies above what the throat passes at equilibrium: late condensation and flashing explain some of it.</summary>
internal static class AboveEquilibriumFlow
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (!a.Case.Has(CaseOption.Flow) || a.Rating is not NozzleRating rating || a.Performance.DischargeCoefficient is not > 1) return null;
        if (!Explains(a) || FrozenFlow.Of(a) is not double most) return null;
        double flow = a.Performance.MassFlow!.Value;
        return new Finding("above-equilibrium-flow", Severity.Caution, flow, rating.IsentropicFlow, "frozen-phase bound", text =>
            $"{text.Text(flow, Dimension.MassFlow)} is more than the throat passes at equilibrium, {text.Text(rating.IsentropicFlow, Dimension.MassFlow)}; with the phases frozen it would pass {text.Text(most, Dimension.MassFlow)}");
    }

    /// <summary>True where the flow stays under the frozen bound.</summary>
    internal static bool Explains(DeviceAnswer a)
    {
        double flow = a.Case.Value(CaseOption.Flow) * (a.Case.FlowIsVolume ? a.Inlet.State.rho : 1);
        return FrozenFlow.Of(a) is double most && flow <= most;
    }
}
