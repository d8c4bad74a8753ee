using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Reads a flow that is given as a volume of gas at a reference state, such as "900 Nm3/h dry" or "300 scfm".</summary>
/// <param name="FlowPlace">The option or column of the flow, for refusals.</param>
/// <param name="StatePlace">The option or column of the reference state, for refusals.</param>
internal readonly record struct FlowReferenceReader(string FlowPlace, string StatePlace)
{
    private const string Example = "\"T=60 degF, p=14.696 psi\"";

    /// <summary>The reference volume of a flow; null where it is a mass flow, an actual volume flow, or not given.</summary>
    /// <param name="flow">The flow as typed; null where none is given.</param>
    /// <param name="state">The reference state as typed; null where none is given.</param>
    /// <param name="fluid">The gas.</param>
    internal FlowReference? Read(string? flow, string? state, Fluid fluid)
    {
        FlowReference? read = flow is null ? null : Read(flow, state);
        if (state is not null && read is not { IsGiven: true })
            throw Refuse(StatePlace, "nothing is counted at it: no --flow is in scfm, NL/min or the like", "leave it out, or give for example --flow \"300 scfm\"");
        if (read is null) return null;
        if (read.MassPerVolume(fluid) is null)
            throw Refuse(FlowPlace, $"normal and standard volumes are amounts of ideal gas, and {fluid.Name} is none", "give a mass flow, or an actual volume flow in m3/h");
        return read;
    }

    /// <summary>The flow without the word dry or wet behind it.</summary>
    internal static string WithoutMoisture(string text)
    {
        string trimmed = text.TrimEnd();
        return MoistureOf(trimmed) == GasMoisture.Unsaid ? text : trimmed[..^3];
    }

    private FlowReference? Read(string typed, string? state)
    {
        GasMoisture moisture = MoistureOf(typed.TrimEnd());
        GivenValue value = ValueParser.Parse(FlowPlace, QuantityCatalogue.Of(CaseOption.Flow), WithoutMoisture(typed), ReferenceVolume.Pressure);
        Dimension dimension = value.Unit.Dimension;
        if (dimension is Dimension.MassFlow or Dimension.VolumeFlow)
        {
            return moisture == GasMoisture.Unsaid ? null : throw Refuse(
                FlowPlace, $"{Echo.Ascii(typed)}: a mass flow and an actual volume flow are of the whole gas", "leave dry or wet out, or give the flow in Nm3/h, Sm3/h or the like");
        }

        (double p, double T) = dimension switch
        {
            Dimension.NormalVolumeFlow => (ReferenceVolume.Pressure, ReferenceVolume.NormalTemperature),
            Dimension.StandardVolumeFlow => (ReferenceVolume.Pressure, ReferenceVolume.StandardTemperature),
            _ => GivenState(state, value),
        };
        return new FlowReference(Echo.Ascii(value.Text), dimension, value.Si, p, T, moisture);
    }

    private (double p, double T) GivenState(string? list, in GivenValue value)
    {
        if (list is null)
        {
            throw Refuse(
                FlowPlace, $"{Echo.Ascii(value.Text)} names no reference state (conventions differ by up to 8.7 %)",
                $"add --reference-state, for example --reference-state {Example}, or give Nm3/h (0 degC) or Sm3/h (15 degC)");
        }

        double? p = null, T = null;
        foreach (StationItem item in StationListParser.Parse(StatePlace, StationLists.Reference, list, ReferenceVolume.Pressure))
        {
            if (item.Slot == StationSymbol.Pressure) p = item.Value.Si;
            else T = item.Value.Si;
        }

        return p is double pressure && T is double temperature ? (pressure, temperature) : throw Refuse(
            StatePlace, $"{(p is null ? "p" : "T")} is missing: a reference state has both", $"write for example --reference-state {Example}");
    }

    private static GasMoisture MoistureOf(string text) =>
        text.EndsWith(" dry", StringComparison.Ordinal) ? GasMoisture.Dry
        : text.EndsWith(" wet", StringComparison.Ordinal) ? GasMoisture.Wet
        : GasMoisture.Unsaid;

    private static FlowDuctException Refuse(string place, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
