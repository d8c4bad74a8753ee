using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The figures need the entropy to fall further than the heat loss explains: no device can have them.</summary>
internal static class SecondLaw
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Audit is not { Entropy: Verdict.Broken, EntropyMargin: double margin }) return null;
        double? limit = a.Case.Device == DeviceKind.Nozzle ? a.Audit.HighestExitVelocity : a.Audit.HighestExitPressure;
        return new Finding("second-law", Severity.Error, margin, limit, "second law of thermodynamics", text => Message(a, margin, text));
    }

    private static string Message(DeviceAnswer a, double margin, IQuantityText text)
    {
        string fall = text.Text(-margin, Dimension.SpecificEntropy, 4);
        string reason = a.Case.Heat < 0
            ? $"the entropy falls by {fall} more than the heat loss explains"
            : $"the entropy would fall by {fall} from inlet to exit; no adiabatic device can do that";
        return $"impossible: {reason}{Limit(a, text)}";
    }

    private static string Limit(DeviceAnswer a, IQuantityText text)
    {
        if (a.Case.Device == DeviceKind.Nozzle)
        {
            return a.Audit.HighestExitVelocity is double V
                ? $". At this exit pressure the exit velocity is at most {text.Text(V, Dimension.Velocity)}"
                : string.Empty;
        }

        if (a.Audit.HighestExitPressure is not double p) return string.Empty;
        double first = a.Inlet.State.p, recovery = (p - first) / (a.Inlet.Stagnation!.Value.p - first);
        return $". At this exit velocity the exit pressure is at most {text.Text(p, Dimension.Pressure)} (recovery {text.Text(recovery, Dimension.Ratio, 4)})";
    }
}
