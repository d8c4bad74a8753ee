using System.Globalization;

namespace FlowDuct.Fluids.Water.Verification;

/// <summary>One printed check value of a release, in the units of the release.</summary>
internal sealed record CheckRow(
    string Source, string Table, string Equation, string Name1, string Value1, string Unit1, string Name2, string Value2, string Unit2,
    string Output, string Printed, string Unit)
{
    /// <summary>Every row, release by release in printed order.</summary>
    internal static IEnumerable<CheckRow> All() => CheckRows.Text.Split('\n').Select(Read);

    /// <summary>First input as a number.</summary>
    internal double First => Number(Value1);

    /// <summary>Second input as a number; zero where there is none.</summary>
    internal double Second => Number(Value2);

    /// <summary>The printed value as a number.</summary>
    internal double PrintedValue => Number(Printed);

    /// <summary>One unit of the last printed digit.</summary>
    internal double LastDigit
    {
        get
        {
            int e = Printed.IndexOfAny(['E', 'e']);
            string mantissa = e < 0 ? Printed : Printed[..e];
            int exponent = e < 0 ? 0 : int.Parse(Printed.AsSpan(e + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
            int point = mantissa.IndexOf('.', StringComparison.Ordinal);
            return Number("1e" + (exponent - (point < 0 ? 0 : mantissa.Length - point - 1)).ToString(CultureInfo.InvariantCulture));
        }
    }

    private static CheckRow Read(string line)
    {
        string[] cells = line.Split('|');
        return new CheckRow(cells[0], cells[1], cells[2], cells[3], cells[4], cells[5], cells[6], cells[7], cells[8], cells[9], cells[10], cells[11]);
    }

    private static double Number(string text) => text.Length == 0 ? 0 : double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
