using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>What was assumed, in words.</summary>
internal static class Assumptions
{
    internal static IEnumerable<string> Of(DeviceAnswer answer, IQuantityText text)
    {
        yield return $"properties: {answer.Fluid.Formulation}";
        yield return answer.Case.Heat == 0 ? "steady, one-dimensional, adiabatic, no work" : "steady, one-dimensional, no work";
        if (answer.Fluid.HasSaturation && answer.Exit.State.Phase == Fluids.Phase.Wet) yield return "wet states: one homogeneous mixture at equilibrium";
        if (answer.Case.DischargeCorrelation is DischargeCorrelation row && ThroatFlow.Of(answer) is ThroatFlow throat)
            yield return $"discharge coefficient: {row.Description}, {row.Standing}, uncertainty {text.Text(row.UncertaintyAt(throat), Dimension.Ratio, 2)}";
        foreach (string line in OfLoss(answer, text)) yield return line;
        if (answer.Case.FlowReference is FlowReference flow) yield return FlowWords(flow, answer.Fluid, text);
        foreach (string line in answer.Assumptions) yield return line;
        if (answer.Performance.Thrust is not null && answer.Exit.Mach >= 1) yield return answer.BackPressure is null ? "thrust: against the ambient pressure" : "thrust: against the back pressure";
        if (!answer.Case.AmbientGiven || answer.Case.AmbientAltitude is { GivesPressure: true } or { GivesTemperature: true }) yield return AmbientWords(answer.Case, text);
    }

    private static IEnumerable<string> OfLoss(DeviceAnswer answer, IQuantityText text)
    {
        if (answer.Case.LossWord == DiffuserLoss.Sudden) yield return "loss coefficient: a sudden expansion, by the balance of momentum";
        if (answer.Diffuser is not { Loss: double K } diffuser || DiffuserLoss.Find(answer.Case.LossWord!) is not DiffuserLoss row) yield break;
        yield return $"loss coefficient: {row.Description}, {row.Standing}; the recovery may be {text.Text(row.Worse(K), Dimension.Ratio, 2)} less or {text.Text(row.Better(K), Dimension.Ratio, 2)} more";
        if (!diffuser.FrictionKnown) yield return $"Darcy friction factor: {text.Text(diffuser.Friction, Dimension.Ratio, 2)}, since no Reynolds number is known";
    }

    private static string FlowWords(FlowReference flow, Fluid fluid, IQuantityText text) =>
        $"flow: {flow.Typed} counts ideal gas at {text.Text(flow.T, Dimension.Temperature, 6)}, {text.Text(flow.p, Dimension.Pressure, 6)} ({flow.Source}){MoistureWords(flow, fluid)}";

    // Nothing to tell apart in a dry gas.
    private static string MoistureWords(FlowReference flow, Fluid fluid) => (FlowReference.WaterVapour(fluid) > 0, flow.Moisture) switch
    {
        (false, _) => string.Empty,
        (_, GasMoisture.Dry) => ", dry: without the water vapour of the gas",
        (_, GasMoisture.Wet) => ", wet: with the water vapour of the gas",
        _ => ", taken wet, with the water vapour of the gas: dry or wet was not said",
    };

    private static string AmbientWords(DeviceCase c, IQuantityText text) =>
        $"ambient: {text.Text(c.AmbientPressure, Dimension.Pressure, 6)}, {text.Text(c.AmbientTemperature, Dimension.Temperature, 4)} ({Origin(c.AmbientAltitude)})";

    private static string Origin(AmbientAltitude? altitude)
    {
        if (altitude is null) return "default";
        string which = altitude switch { { GivesTemperature: false } => "p of the ", { GivesPressure: false } => "T of the ", _ => string.Empty };
        return $"{which}standard atmosphere at {NumberFormatter.Shortest(altitude.z, 6)} m";
    }
}
