using FlowDuct.Quantities;

namespace FlowDuct.Cli.Rendering;

/// <summary>How an answer is shown.</summary>
/// <param name="Units">The units of the reader.</param>
/// <param name="Digits">Significant digits; null takes the digits of the layout.</param>
/// <param name="Colour">True where findings are coloured.</param>
/// <param name="Quiet">True where notes and assumptions are left out (never errors, cautions or the caution line).</param>
/// <param name="Strict">True where a caution fails the answer.</param>
internal sealed record RenderOptions(DisplayText Units, int? Digits, bool Colour, bool Quiet, bool Strict)
{
    /// <summary>The row of a sheet that the answer belongs to, in JSON; null for a single answer.</summary>
    internal JsonRow? Row { get; init; }
}
