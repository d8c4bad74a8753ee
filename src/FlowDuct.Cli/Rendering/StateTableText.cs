using System.Globalization;
using FlowDuct.Devices;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>A table of states for people, or as CSV.</summary>
internal static class StateTableText
{
    private const int TextDigits = 6;
    private const int CsvDigits = 7;

    internal static void Write(TextWriter to, StateTable table, RenderOptions options, bool csv)
    {
        if (csv) Csv(to, StateColumns.Of(table, options, all: true), options);
        else Text(to, table, options);
    }

    private static void Csv(TextWriter to, IReadOnlyList<StateColumn> columns, RenderOptions options)
    {
        to.WriteLine(string.Join(',', columns.Select(column => column.Heading.Length == 0 ? column.Row.Symbol : $"{column.Row.Symbol} [{column.Heading}]")));
        for (int i = 0; i < columns[0].Values.Length; i++)
            to.WriteLine(string.Join(',', columns.Select(column => Cell(column, i, options, CsvDigits, string.Empty))));
    }

    private static void Text(TextWriter to, StateTable table, RenderOptions options)
    {
        IReadOnlyList<StateColumn> columns = StateColumns.Of(table, options, all: false);
        var lines = new TextTable("row");
        foreach (StateColumn column in columns) lines.Column(column.Row.Symbol, column.Unit.Dimension == Dimension.Ratio ? "-" : column.Unit.Spelling);
        for (int i = 0; i < columns[0].Values.Length; i++)
        {
            int row = i;
            lines.Row((i + 1).ToString(CultureInfo.InvariantCulture), [.. columns.Select(column => Cell(column, row, options, TextDigits, "-"))]);
        }

        to.WriteLine($"state, {table.Fluid.Name}");
        if (table.GasRows.Count > 0) Scales(to, options);
        to.WriteLine();
        lines.Write(to);
        TextAnswer.Findings(to, table.Findings, options);
        to.WriteLine();
        if (!options.Quiet) TextWrap.Write(to, string.Empty, $"properties: {table.Fluid.Formulation}", 0);
        TextWrap.Write(to, string.Empty, TextAnswer.Caution, 0);
    }

    private static void Scales(TextWriter to, RenderOptions options)
    {
        bool us = options.Units.System == UnitSystem.Us;
        string volume = us ? $"{Number(GasTableRow.VolumePerRankine)} T/p_r, T in degR" : $"{Number(GasTableRow.VolumePerKelvin)} T/p_r, T in K";
        string at = us ? $"{Number(GasTableRow.ScaleTemperature * 1.8)} degR" : $"{Number(GasTableRow.ScaleTemperature)} K";
        TextWrap.Write(
            to, string.Empty, $"h and u are zero at 0 K, s0 is the entropy at 1 bar; p_r = exp(s0/R) on the scale p_r = {Number(GasTableRow.ScalePressure)} at {at}; v_r = {volume}", 0);
    }

    private static string Number(double value) => NumberFormatter.Shortest(value, TextDigits);

    private static string Cell(StateColumn column, int row, RenderOptions options, int digits, string unknown) =>
        column.Values[row] is double value ? options.Units.Number(value, column.Unit, options.Digits ?? digits) : unknown;
}
