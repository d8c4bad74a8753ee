using System.Globalization;

namespace FlowDuct.Core.Tests.Support;

/// <summary>A number as a table prints it: its value and half a unit of its last printed digit.</summary>
public readonly record struct Printed(double Value, double HalfDigit)
{
    /// <summary>Reads a plain decimal number such as 29.0344 or -125.5297.</summary>
    public static Printed Parse(string text)
    {
        int point = text.IndexOf('.', StringComparison.Ordinal);
        int decimals = point < 0 ? 0 : text.Length - point - 1;
        return new(double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture), 0.5 * Math.Pow(10, -decimals));
    }

    /// <summary>True where a computed value rounds to the printed one, with an extra allowance that the caller explains.</summary>
    public bool Agrees(double computed, double allowance = 0) =>
        Math.Abs(computed - Value) <= HalfDigit + allowance + (1e-12 * Math.Abs(Value));
}
