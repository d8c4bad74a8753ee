using System.Globalization;
using System.Runtime.InteropServices;
using FlowDuct.Fluids.Water.Verification;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>The check values as text: a heading for each table and equation, a line for each value.</summary>
internal static class SelfCheckText
{
    // Two digits beyond the printed ones show on which side of the last digit the value lies.
    private const int MoreDigits = 2;
    private const int PrintedEnd = 58;

    internal static void Write(TextWriter to, IReadOnlyList<CheckResult> results, bool quiet)
    {
        to.WriteLine($"selfcheck, flowduct {ToolVersion.Version} {ToolVersion.Commit}".TrimEnd());
        to.WriteLine($"{RuntimeInformation.RuntimeIdentifier}, {RuntimeInformation.OSDescription}");
        string heading = string.Empty;
        foreach (CheckResult result in results)
        {
            if (quiet && result.Met) continue;
            string next = $"{result.Row.Source}, {result.Row.Table}: {result.Row.Equation}";
            if (next != heading) Heading(to, heading = next, result.Row);
            Line(to, result);
        }

        int missed = results.Count(result => !result.Met);
        to.WriteLine();
        to.WriteLine($"{results.Count} values, {results.Count - missed} met, {missed} missed");
        TextWrap.Write(to, string.Empty, "Met: the computed value rounds to the printed one. Deviation: computed minus printed, in units of the last printed digit.", 0);
    }

    private static void Heading(TextWriter to, string text, CheckRow row)
    {
        to.WriteLine();
        TextWrap.Write(to, string.Empty, text, 2);
        string second = row.Name2.Length == 0 ? string.Empty : $", {row.Name2} [{row.Unit2}]";
        Columns(to, $"  at {row.Name1} [{row.Unit1}]{second}", "printed", "computed", "dev.");
    }

    private static void Line(TextWriter to, CheckResult result)
    {
        CheckRow row = result.Row;
        string at = row.Name2.Length == 0 ? row.Value1 : $"{row.Value1}, {row.Value2}";
        string deviation = result.Units.ToString("F2", CultureInfo.InvariantCulture);
        Columns(to, $"  {at,-17}{row.Output} [{row.Unit}]", row.Printed, Computed(result), deviation + (result.Met ? string.Empty : " MISSED"));
    }

    private static void Columns(TextWriter to, string left, string printed, string computed, string deviation) =>
        to.WriteLine(left + printed.PadLeft(PrintedEnd - left.Length) + computed.PadLeft(16) + deviation.PadLeft(6));

    private static string Computed(CheckResult result)
    {
        string mantissa = result.Row.Printed.Split('E', 'e')[0];
        int digits = mantissa.Count(char.IsAsciiDigit) - (mantissa.TrimStart('-').StartsWith('0') ? 1 : 0);
        digits = Math.Min(digits + MoreDigits, 17);
        return Math.Abs(result.Computed) >= 0.01 ? NumberFormatter.Significant(result.Computed, digits) : Small(result.Computed, digits);
    }

    // Leading zeros would push the digits out of their column.
    private static string Small(double value, int digits)
    {
        string[] parts = value.ToString($"E{digits - 1}", CultureInfo.InvariantCulture).Split('E');
        return $"{parts[0]}e{int.Parse(parts[1], CultureInfo.InvariantCulture)}";
    }
}
