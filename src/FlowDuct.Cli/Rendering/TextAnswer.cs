using FlowDuct.Devices;
using FlowDuct.Devices.Inverse;
using FlowDuct.Devices.Rating;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The text answer: stations down, quantities across, then device, energy, findings, assumptions and the caution.</summary>
internal static class TextAnswer
{
    internal const string Caution =
        "Engineering estimate: it certifies nothing. The local pressure-equipment and piping codes and a licensed engineer decide.";

    private static readonly string[] s_static = ["p", "T", "x", "h", "s", "V", "M"];
    private static readonly string[] s_vapour = ["humidity", "dew-point", "humidity-ratio"];
    private static readonly string[] s_stagnation = ["p0", "T0", "rho", "w", "A", "d"];

    internal static void Write(TextWriter to, DeviceAnswer answer, PathTable? path, RenderOptions options)
    {
        to.WriteLine($"{DeviceWords.Of(answer.Case.Device)}, {answer.Fluid.Name}");
        to.WriteLine();
        Stations(to, answer, options, "static", s_static);
        to.WriteLine();
        Stations(to, answer, options, "stagnation", s_stagnation);
        to.WriteLine();
        if (StationFigureTable.Read(answer.Fluid, answer.Inlet, "humidity-ratio") is not null)
        {
            Stations(to, answer, options, "vapour", s_vapour);
            to.WriteLine();
        }

        Device(to, answer, options);
        Energy(to, answer, options);
        Laws(to, answer, options);
        path?.Text(to, options);
        Findings(to, answer.Findings, options);
        Assumed(to, answer, options);
        to.WriteLine();
        TextWrap.Write(to, string.Empty, Caution, 0);
    }

    private static void Stations(TextWriter to, DeviceAnswer answer, RenderOptions options, string title, string[] keys)
    {
        var table = new TextTable(title);
        foreach (string key in keys)
        {
            UnitReading unit = TextFigures.UnitOf(key, options);
            table.Column(key, unit.Dimension == Dimension.Ratio ? "-" : unit.Spelling);
        }

        foreach ((string name, StationAnswer at) in TextFigures.StationsOf(answer))
            table.Row(name, [.. keys.Select(key => TextFigures.Number(StationFigureTable.Read(answer.Fluid, at, key), TextFigures.UnitOf(key, options), options))]);
        table.Write(to);
    }

    private static void Device(TextWriter to, DeviceAnswer answer, RenderOptions options)
    {
        Found(to, answer, options);
        to.WriteLine("device");
        foreach (QuantityRow row in QuantityCatalogue.Performance)
        {
            if (row.Key == "regime" && answer.Performance.Regime is string regime) Line(to, "regime", regime, string.Empty);
            if (PerformanceFigures.Read(answer.Performance, row.Key) is not double value) continue;
            UnitReading unit = TextFigures.UnitOf(row, options);
            string unitWord = unit.Dimension is Dimension.Ratio ? string.Empty : unit.Spelling;
            Line(to, row.Name, TextFigures.Number(value, unit, options), unitWord + Remark(answer, row.Key));
        }
    }

    // What was asked backwards, before everything that follows from it.
    private static void Found(TextWriter to, DeviceAnswer answer, RenderOptions options)
    {
        if (answer.Found is not FoundFigure found) return;
        InverseQuestion question = found.Question;
        UnitReading unit = TextFigures.UnitOf(question.Unknown.Row, options), of = TextFigures.UnitOf(question.Target.Row, options);
        to.WriteLine("found");
        Line(to, question.Unknown.Name, options.Units.Number(found.Value, unit, (options.Digits ?? TextFigures.UsualDigits) + 2), UnitWord(unit));
        Line(to, $"for {question.Target.Name}", TextFigures.Number(question.Value, of, options), UnitWord(of));
        if (found.Sensitivity is double move) Line(to, "1 % of it moves the target by", options.Units.Text(move, Dimension.Ratio, 3), "%");
        if (found.AlsoBetween is Interval also)
        {
            string from = options.Units.Text(also.Least, question.Unknown.Row.Dimension, 3), upTo = options.Units.Text(also.Greatest, question.Unknown.Row.Dimension, 3);
            TextWrap.Write(to, "  ", $"any {question.Unknown.Name} from {from} to {upTo} at least meets the target too", 2);
        }

        to.WriteLine();
    }

    private static string UnitWord(in UnitReading unit) => unit.Dimension is Dimension.Ratio ? string.Empty : unit.Spelling;

    private static string Remark(DeviceAnswer answer, string key) => key switch
    {
        "normal_volume_flow" => "   0 degC, 1.01325 bar" + Wet(answer),
        "standard_volume_flow" => "   15 degC, 1.01325 bar" + Wet(answer),
        "isentropic_efficiency" when answer.EfficiencyImplied => "   implied by the figures",
        "isentropic_efficiency" when answer.TakenIdeal => "   assumed",
        "isentropic_efficiency" when answer.Case.Has(CaseOption.Efficiency) && answer.Diffuser?.Shock is null => "   given",
        "discharge_coefficient" when answer.Case.DischargeCorrelation is not null => "   by correlation",
        "discharge_coefficient" when answer.Case.Has(CaseOption.DischargeCoefficient) => "   given",
        "discharge_coefficient" when answer.Case.Has(CaseOption.Flow) && answer.Case.Device == DeviceKind.Nozzle => "   implied by the flow",
        "loss_coefficient" when answer.Diffuser?.Loss is not null && answer.Diffuser.Shock is null => "   estimated",
        "recovery" when answer.Case.Has(CaseOption.Recovery) => "   given",
        _ => string.Empty,
    };

    private static string Wet(DeviceAnswer answer) => FlowReference.WaterVapour(answer.Fluid) > 0 ? ", wet" : string.Empty;

    private static void Line(TextWriter to, string name, string value, string unit) =>
        to.WriteLine($"  {name,-34}{value,12} {unit}".TrimEnd());

    private static void Energy(TextWriter to, DeviceAnswer answer, RenderOptions options)
    {
        if (answer.Ledger is not Ledger ledger) return;
        UnitReading unit = options.Units.UnitOf(Dimension.SpecificEnergy);
        string Text(double value) => TextFigures.Number(value, unit, options);
        to.WriteLine();
        var table = new TextTable("energy");
        foreach (string head in (string[])["h", "V^2/2", "g z", "heat", "total"]) table.Column(head, unit.Spelling);
        table.Row("in", Text(ledger.InletEnthalpy), Text(ledger.InletKinetic), Text(ledger.InletPotential), Text(ledger.Heat), Text(ledger.In));
        table.Row("out", Text(ledger.ExitEnthalpy), Text(ledger.ExitKinetic), Text(ledger.ExitPotential), "-", Text(ledger.Out));
        table.Row("left over", "-", "-", "-", "-", Text(Math.Abs(ledger.Closure) < 1e-6 ? 0 : ledger.Closure));
        table.Write(to);
    }

    private static void Laws(TextWriter to, DeviceAnswer answer, RenderOptions options)
    {
        Audit audit = answer.Audit;
        to.WriteLine();
        string margin = audit.Entropy == Verdict.Holds && audit.EntropyMargin is double rise
            ? $" (rise {options.Units.Text(Math.Abs(rise) < 1e-6 ? 0 : rise, Dimension.SpecificEntropy, 4)})"
            : string.Empty;
        TextWrap.Write(to, "laws      ", $"mass {Word(audit.Mass)}, energy {Word(audit.Energy)}, entropy {Word(audit.Entropy)}{margin}", 10);
    }

    private static string Word(Verdict verdict) => verdict switch
    {
        Verdict.Holds => "holds",
        Verdict.WithinRounding => "holds within rounding",
        Verdict.Broken => "IS BROKEN",
        _ => "not judged",
    };

    internal static void Findings(TextWriter to, IReadOnlyList<Finding> findings, RenderOptions options)
    {
        List<Finding> shown = [.. findings.Where(f => !options.Quiet || f.Severity != Severity.Note)];
        if (shown.Count == 0) return;
        to.WriteLine();
        to.WriteLine("findings");
        foreach (Finding finding in shown)
        {
            string severity = TextFigures.SeverityWord(finding.Severity);
            string prose = $"{finding.Code}: {finding.Message(options.Units)} ({finding.Standing})";
            TextWrap.Write(to, $"  {TextFigures.Coloured(severity.PadRight(9), finding.Severity, options)}", prose, 11);
        }
    }

    private static void Assumed(TextWriter to, DeviceAnswer answer, RenderOptions options)
    {
        if (options.Quiet) return;
        to.WriteLine();
        to.WriteLine("assumed");
        foreach (string line in Assumptions.Of(answer, options.Units)) TextWrap.Write(to, "  - ", line, 4);
    }
}
