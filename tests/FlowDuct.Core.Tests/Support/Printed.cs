using System.Globalization;

namespace FlowDuct.Core.Tests.Support;

/// <summary>A number as a table prints it: its value and half a unit of its last printed digit.</summary>
public readonly record struct Printed(double Value, double HalfDigit)
{
    /// <summary>Reads a decimal number such as 29.0344 or -125.5297, with or without a power of ten as in 0.100215168E-02.</summary>
    public static Printed Parse(string text)
    {
        int e = text.IndexOfAny(['E', 'e']);
        string mantissa = e < 0 ? text : text[..e];
        int exponent = e < 0 ? 0 : int.Parse(text[(e + 1)..], CultureInfo.InvariantCulture);
        int point = mantissa.IndexOf('.', StringComparison.Ordinal);
        int decimals = point < 0 ? 0 : mantissa.Length - point - 1;
        return new(double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture), 0.5 * Math.Pow(10, exponent - decimals));
    }

    /// <summary>True where a computed value rounds to the printed one, with an extra allowance that the caller explains.</summary>
    public bool Agrees(double computed, double allowance = 0) =>
        Math.Abs(computed - Value) <= HalfDigit + allowance + (1e-12 * Math.Abs(Value));
}
