using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The text answer of a property question: one line a quantity.</summary>
internal static class StateText
{
    private static readonly string[] s_keys = ["p", "T", "x", "superheat", "h", "s", "u", "rho", "cp", "cv", "w", "w_wet", "kappa", "mu", "nu", "lambda", "prandtl", "sigma", "humidity", "dew-point", "humidity-ratio", "V", "M", "p0", "T0", "h0"];

    internal static void Write(TextWriter to, StateAnswer answer, RenderOptions options)
    {
        bool moving = answer.At.Velocity > 0;
        to.WriteLine($"state, {answer.Fluid.Name}");
        to.WriteLine();
        Line(to, "phase", string.Empty, PhaseWords.Of(answer.At.State.Phase)!, string.Empty);
        foreach (string key in s_keys)
        {
            bool ofMotion = key is "V" or "M" or "p0" or "T0" or "h0";
            if (ofMotion && !moving) continue;
            if (StationFigureTable.Read(answer.Fluid, answer.At, key) is double value) Figure(to, key, value, options);
        }

        if (answer.SaturationTemperature is double T)
        {
            UnitReading unit = options.Units.UnitOf(Dimension.Temperature);
            Line(to, "saturation temperature at p", "Tsat", TextFigures.Number(T, unit, Wider(options)), unit.Spelling);
        }

        TextAnswer.Findings(to, answer.Findings, options);
        to.WriteLine();
        if (!options.Quiet) TextWrap.Write(to, string.Empty, $"properties: {answer.Fluid.Formulation}{(answer.StationWith(Notices.RegionGap) is null ? string.Empty : "; in the gap between two of its regions, served by the cooler one")}", 0);
        TextWrap.Write(to, string.Empty, TextAnswer.Caution, 0);
    }

    private static void Figure(TextWriter to, string key, double value, RenderOptions options)
    {
        if (!QuantityCatalogue.TryFindStationQuantity(key, out QuantityRow? row)) return;
        UnitReading unit = TextFigures.UnitOf(row, options);
        string unitWord = unit.Dimension == Dimension.Ratio ? string.Empty : unit.Spelling;
        Line(to, row.Name, row.Symbol, TextFigures.Number(value, unit, Wider(options)), unitWord);
    }

    // A property table carries one digit more than a device sheet.
    private static RenderOptions Wider(RenderOptions options) => options with { Digits = options.Digits ?? TextFigures.UsualDigits + 2 };

    private static void Line(TextWriter to, string name, string symbol, string value, string unit) =>
        to.WriteLine($"  {name,-38}{symbol,-10}{value,14} {unit}".TrimEnd());
}
