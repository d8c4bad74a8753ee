using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The printed digits of the figures fix the implied efficiency only roughly.</summary>
internal static class IllConditioned
{
    // An efficiency known to five points of a hundred says little; chosen here.
    private const double Limit = 0.05;

    // A hundredth in the target would be a fifth in the figure; chosen here.
    private const double LeastSensitivity = 0.05;

    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Found is { Sensitivity: double move } && Math.Abs(move) < LeastSensitivity)
        {
            return new Finding("ill-conditioned", Severity.Caution, move, LeastSensitivity, "limit chosen here", text =>
                $"the target hardly feels what was found: one per cent of {a.Found.Question.Unknown.Name} moves it by {text.Text(move, Dimension.Ratio, 2)} per cent");
        }

        if (!a.EfficiencyImplied || a.Rating is not null || a.SaturatedReading || a.Performance.IsentropicEfficiency is not double now) return null;
        double effect = Rounding.Effect(a.Case, b => Performances.Of(b).IsentropicEfficiency, now);
        return effect <= Limit ? null : new Finding("ill-conditioned", Severity.Caution, effect, Limit, "printed rounding of the given figures", text =>
            $"the printed digits leave the implied efficiency uncertain by +/- {text.Text(effect, Dimension.Ratio, 2)}; measure the velocity or the pressures more finely");
    }
}
