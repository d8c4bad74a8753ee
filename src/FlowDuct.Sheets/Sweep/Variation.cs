namespace FlowDuct.Sheets.Sweep;

/// <summary>One input of a case with the values that it takes.</summary>
/// <param name="Name">inlet.p, efficiency, fluid.</param>
/// <param name="Unit">The unit of all values; empty where they have none or differ in it.</param>
/// <param name="Values">The numbers or words, each with its unit where they differ in it.</param>
internal sealed record Variation(string Name, string Unit, IReadOnlyList<string> Values)
{
    /// <summary>The station before the point; empty for an option.</summary>
    internal string Station => Name.Contains('.', StringComparison.Ordinal) ? Name[..Name.IndexOf('.', StringComparison.Ordinal)] : string.Empty;

    /// <summary>What stands behind the point, or the option.</summary>
    internal string Symbol => Name[(Name.IndexOf('.', StringComparison.Ordinal) + 1)..];

    /// <summary>The value as it is typed on a command line.</summary>
    internal string Typed(int index) => Unit.Length == 0 ? Values[index] : $"{Values[index]} {Unit}";
}
