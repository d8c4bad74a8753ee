using System.Text;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Batch;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Tests;

/// <summary>Runs a sheet in memory.</summary>
internal sealed record SheetRun(string Output, BatchEnd End)
{
    internal static SheetRun Of(string sheet, string show = "exit.T, exit.V, regime", BatchRequest? request = null, bool comma = false, int digits = 7) =>
        Of(Encoding.UTF8.GetBytes(sheet), show, request, comma, digits);

    internal static SheetRun Of(byte[] sheet, string show = "exit.T, exit.V, regime", BatchRequest? request = null, bool comma = false, int digits = 7)
    {
        using var input = new MemoryStream(sheet);
        using var output = new MemoryStream();
        BatchEnd end = Run(input, output, show, request ?? new BatchRequest(), comma, digits);
        return new SheetRun(Encoding.UTF8.GetString(output.ToArray()), end);
    }

    internal static BatchEnd Run(Stream input, MemoryStream output, string show, BatchRequest request, bool comma = false, int digits = 7)
    {
        var target = new StreamTarget(bytes =>
        {
            output.Write(bytes.Span);
            return true;
        });
        return Run(input, target, show, request, comma, digits);
    }

    internal static BatchEnd Run(Stream input, ResultTarget target, string show, BatchRequest request, bool comma = false, int digits = 7)
    {
        using var source = new RecordSource("sheet.csv", input, comma);
        SheetPlan plan = SheetPlan.Compile(source.Headings, source.Dialect.DecimalMark, $"sheet.csv line {source.FirstLine}");
        IReadOnlyList<ResultColumn> results = ResultSet.Parse(show, DisplayText.Metric);
        plan.RequireFree(CsvRows.Titles(results), $"sheet.csv line {source.FirstLine}");
        return new BatchRun(source, request, plan, new CsvRows(source.Dialect, source.RawHeading, results, digits)).Run(target);
    }

    /// <summary>Lines without their ends; the heading is line 0.</summary>
    internal string[] Lines => Output.TrimEnd('\n').Split('\n');
}

/// <summary>Sheets of many rows, the same each time.</summary>
internal static class ManyRows
{
    internal const string Heading = "tag,device,fluid,inlet.p [bar(a)],inlet.superheat [K],inlet.V [m/s],exit.p [bar(a)],efficiency [%]";

    /// <summary>Steam nozzles: wet and dry exits, choked and not; some rows are not understood, some have no answer.</summary>
    internal static string Steam(int rows)
    {
        var sheet = new StringBuilder(Heading + "\n");
        for (int i = 1; i <= rows; i++)
        {
            double p = 2 + (38 * (i * 0.6180339887498949 % 1)), ratio = 0.1 + (0.8 * (i * 0.8191725133961645 % 1));
            string exit = i % 97 == 0 ? "x" : i % 89 == 0 ? "500" : (p * ratio).ToString("F4", System.Globalization.CultureInfo.InvariantCulture);
            sheet.Append(System.Globalization.CultureInfo.InvariantCulture, $"N-{i},nozzle,steam,{p:F3},{2 + (248 * (i * 0.7548776662466927 % 1)):F2},{5 + (i % 50)},{exit},{85 + (i % 15)}\n");
        }

        return sheet.ToString();
    }
}
