using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Reads an option that counts.</summary>
internal static class WholeNumber
{
    internal static int Read(string option, string text, int least, int most, int example)
    {
        bool read = NumberParser.TryParse(text, out PrintedNumber number, out _);
        bool whole = read && number.Value == Math.Floor(number.Value) && number.Value >= least && number.Value <= most;
        return whole ? (int)number.Value : throw Usage.Refuse(option, $"{Echo.Ascii(text)} is not a whole number from {least} to {most}", $"write for example {option} {example}");
    }
}
