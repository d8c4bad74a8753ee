using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Reads a flow that is given as a volume of gas at a reference state, such as "900 Nm3/h dry" or "300 scfm".</summary>
internal static class FlowBinder
{
    private const string Option = "--flow";
    private const string StateOption = "--reference-state";

    /// <summary>The reference volume of --flow; null where it is a mass flow, an actual volume flow, or not given.</summary>
    internal static FlowReference? Reference(Arguments arguments, Fluid fluid)
    {
        FlowReference? flow = arguments.Value(Option) is string typed ? Read(arguments, typed) : null;
        if (arguments.Has(StateOption) && flow is not { IsGiven: true })
            throw Usage.Refuse(StateOption, "nothing is counted at it: no --flow is in scfm, NL/min or the like", "leave it out, or give for example --flow \"300 scfm\"");
        if (flow is null) return null;
        if (flow.MassPerVolume(fluid) is null)
            throw Usage.Refuse(Option, $"normal and standard volumes are amounts of ideal gas, and {fluid.Name} is none", "give a mass flow, or an actual volume flow in m3/h");
        return flow;
    }

    /// <summary>The flow without the word dry or wet behind it.</summary>
    internal static string WithoutMoisture(string text)
    {
        string trimmed = text.TrimEnd();
        return MoistureOf(trimmed) == GasMoisture.Unsaid ? text : trimmed[..^3];
    }

    private static FlowReference? Read(Arguments arguments, string typed)
    {
        GasMoisture moisture = MoistureOf(typed.TrimEnd());
        GivenValue value = ValueParser.Parse(Option, QuantityCatalogue.Of(CaseOption.Flow), WithoutMoisture(typed), ReferenceVolume.Pressure);
        Dimension dimension = value.Unit.Dimension;
        if (dimension is Dimension.MassFlow or Dimension.VolumeFlow)
        {
            return moisture == GasMoisture.Unsaid ? null : throw Usage.Refuse(
                Option, $"{Echo.Ascii(typed)}: a mass flow and an actual volume flow are of the whole gas", "leave dry or wet out, or give the flow in Nm3/h, Sm3/h or the like");
        }

        (double p, double T) = dimension switch
        {
            Dimension.NormalVolumeFlow => (ReferenceVolume.Pressure, ReferenceVolume.NormalTemperature),
            Dimension.StandardVolumeFlow => (ReferenceVolume.Pressure, ReferenceVolume.StandardTemperature),
            _ => GivenState(arguments, value),
        };
        return new FlowReference(Echo.Ascii(value.Text), dimension, value.Si, p, T, moisture);
    }

    private static (double p, double T) GivenState(Arguments arguments, in GivenValue value)
    {
        if (arguments.Value(StateOption) is not string list)
        {
            throw Usage.Refuse(
                Option, $"{Echo.Ascii(value.Text)} names no reference state (conventions differ by up to 8.7 %)",
                "add --reference-state, for example --reference-state \"T=60 degF, p=14.696 psi\", or give Nm3/h (0 degC) or Sm3/h (15 degC)");
        }

        double? p = null, T = null;
        foreach (StationItem item in StationListParser.Parse(StateOption, StationLists.Reference, list, ReferenceVolume.Pressure))
        {
            if (item.Slot == StationSymbol.Pressure) p = item.Value.Si;
            else T = item.Value.Si;
        }

        return p is double pressure && T is double temperature ? (pressure, temperature) : throw Usage.Refuse(
            StateOption, $"{(p is null ? "p" : "T")} is missing: a reference state has both", "write for example --reference-state \"T=60 degF, p=14.696 psi\"");
    }

    private static GasMoisture MoistureOf(string text) =>
        text.EndsWith(" dry", StringComparison.Ordinal) ? GasMoisture.Dry
        : text.EndsWith(" wet", StringComparison.Ordinal) ? GasMoisture.Wet
        : GasMoisture.Unsaid;
}
