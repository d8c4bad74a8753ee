using System.Text.Json;
using FlowDuct.Devices;
using FlowDuct.Devices.Inverse;
using FlowDuct.Devices.Rating;
using FlowDuct.Findings;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The answer of a device as JSON: coherent SI whatever the display units, stable key order.</summary>
internal static class JsonAnswer
{
    internal static void Write(Stream to, DeviceAnswer answer, PathTable? path, RenderOptions options)
    {
        using var json = new Utf8JsonWriter(to, JsonNumbers.OptionsOf(options));
        json.WriteStartObject();
        JsonHead.Write(json, answer.Passes(options.Strict) ? "pass" : "fail", answer.Fluid, options.Row);
        Case(json, answer, options.Row);
        Units(json);
        json.WriteStartObject("stations");
        JsonStation.Write(json, "inlet", answer.Fluid, answer.Inlet);
        JsonStation.Write(json, "throat", answer.Fluid, answer.Throat);
        JsonStation.Write(json, "exit", answer.Fluid, answer.Exit);
        json.WriteEndObject();
        PathTable.Json(json, path);
        JsonPerformance.Write(json, answer.Performance);
        Ledger(json, answer.Ledger);
        Laws(json, answer.Audit);
        Findings(json, answer.Findings, options);
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }

    private static void Case(Utf8JsonWriter json, DeviceAnswer answer, JsonRow? ofSheet)
    {
        DeviceCase c = answer.Case;
        json.WriteStartObject("case");
        JsonHead.WriteName(json, ofSheet);
        json.WriteString("device", DeviceWords.Of(c.Device));
        json.WriteString("fluid", c.Fluid.Name);
        json.WriteStartObject("given");
        JsonHead.Given(json, "inlet.", c.Inlet);
        JsonHead.Given(json, "throat.", c.Throat);
        JsonHead.Given(json, "exit.", c.Exit);
        JsonHead.Given(json, "back.", c.Back);
        if (c.AmbientAltitude is AmbientAltitude altitude) json.WriteNumber("ambient.altitude", altitude.z);
        foreach (QuantityRow row in QuantityCatalogue.Options)
        {
            if (row.OptionSlot is not CaseOption option || !c.Has(option)) continue;
            if (option == CaseOption.Flow && c.FlowReference is FlowReference reference) JsonFlow.Given(json, reference);
            else json.WriteNumber(GivenKey(row, c), c.Value(option));
        }

        json.WriteEndObject();
        json.WriteStartObject("assumed");
        if (answer.TakenIdeal) json.WriteNumber("efficiency", 1);
        if (answer.InletTakenAtRest) json.WriteNumber("inlet.V", 0);
        if (!c.AmbientGiven || c.AmbientAltitude is { GivesPressure: true }) json.WriteNumber("ambient.p", c.AmbientPressure);
        if (!c.AmbientGiven || c.AmbientAltitude is { GivesTemperature: true }) json.WriteNumber("ambient.T", c.AmbientTemperature);
        if (c.FlowReference is FlowReference flow) JsonFlow.Assumed(json, flow, c.Fluid);
        json.WriteEndObject();
        Found(json, answer.Found);
        json.WriteStartArray("assumptions");
        foreach (string line in answer.Assumptions) json.WriteStringValue(line);
        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void Found(Utf8JsonWriter json, FoundFigure? found)
    {
        if (found is null)
        {
            json.WriteNull("found");
            return;
        }

        json.WriteStartObject("found");
        json.WriteString("name", found.Question.Unknown.Name);
        json.WriteNumber("value", found.Value);
        json.WriteString("target", found.Question.Target.Name);
        json.WriteNumber("target_value", found.Question.Value);
        JsonNumbers.Write(json, "sensitivity", found.Sensitivity);
        json.WriteEndObject();
    }

    private static string GivenKey(QuantityRow row, DeviceCase c) => row.OptionSlot switch
    {
        CaseOption.Flow => c.FlowIsVolume ? "volume_flow" : "mass_flow",
        _ => row.JsonKey,
    };

    private static void Units(Utf8JsonWriter json)
    {
        json.WriteStartObject("units");
        JsonStation.WriteUnits(json);
        foreach (QuantityRow row in QuantityCatalogue.Performance)
        {
            if (!row.IsText && row.Dimension is not (Dimension.Ratio or Dimension.Count))
                json.WriteString(row.JsonKey, DimensionWords.SiUnit(row.Dimension));
        }

        foreach (string key in (string[])["ledger.h", "ledger.kinetic", "ledger.potential", "ledger.heat", "ledger.closure"])
            json.WriteString(key, DimensionWords.SiUnit(Dimension.SpecificEnergy));
        json.WriteEndObject();
    }

    private static void Ledger(Utf8JsonWriter json, Ledger? ledger)
    {
        if (ledger is null)
        {
            json.WriteNull("ledger");
            return;
        }

        json.WriteStartObject("ledger");
        Terms("inlet", ledger.InletEnthalpy, ledger.InletKinetic, ledger.InletPotential);
        Terms("exit", ledger.ExitEnthalpy, ledger.ExitKinetic, ledger.ExitPotential);
        JsonNumbers.Write(json, "heat", ledger.Heat);
        JsonNumbers.Write(json, "closure", ledger.Closure);
        json.WriteEndObject();

        void Terms(string name, double h, double kinetic, double potential)
        {
            json.WriteStartObject(name);
            JsonNumbers.Write(json, "h", h);
            JsonNumbers.Write(json, "kinetic", kinetic);
            JsonNumbers.Write(json, "potential", potential);
            json.WriteEndObject();
        }
    }

    private static void Laws(Utf8JsonWriter json, Audit audit)
    {
        json.WriteStartObject("laws");
        json.WriteString("mass", Word(audit.Mass));
        json.WriteString("energy", Word(audit.Energy));
        json.WriteString("entropy", Word(audit.Entropy));
        json.WriteEndObject();
    }

    private static string Word(Verdict verdict) => verdict switch
    {
        Verdict.Holds => "holds",
        Verdict.WithinRounding => "within-rounding",
        Verdict.Broken => "broken",
        _ => "not-judged",
    };

    internal static void Findings(Utf8JsonWriter json, IReadOnlyList<Finding> findings, RenderOptions options)
    {
        json.WriteStartArray("findings");
        foreach (Finding finding in findings)
        {
            json.WriteStartObject();
            json.WriteString("code", finding.Code);
            json.WriteString("severity", TextFigures.SeverityWord(finding.Severity));
            json.WriteString("message", finding.Message(options.Units));
            JsonNumbers.Write(json, "value", finding.Value);
            JsonNumbers.Write(json, "limit", finding.Limit);
            json.WriteString("standing", finding.Standing);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
