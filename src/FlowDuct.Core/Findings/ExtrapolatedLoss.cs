using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>An estimated loss of a diffuser outside the range of its equation.</summary>
internal static class ExtrapolatedLoss
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Diffuser?.Crossed is not Crossing crossed || DiffuserLoss.Find(a.Case.LossWord!) is not DiffuserLoss row) return null;
        Dimension dimension = crossed.Argument == "included angle" ? Dimension.Angle : Dimension.Ratio;
        return new Finding("extrapolated", Severity.Caution, crossed.Value, crossed.Limit, row.Standing, text =>
            $"{crossed.Argument} {text.Text(crossed.Value, dimension, 3)} lies outside the range of {row.Name}, which ends at {text.Text(crossed.Limit, dimension, 3)}");
    }
}
