namespace FlowDuct.Cli.CommandLine;

/// <summary>One option: the definition that feeds parser, help and messages.</summary>
/// <param name="Name">With its hyphens.</param>
/// <param name="Value">What stands for the value in help; empty for a switch.</param>
/// <param name="Help">One sentence, with the unit.</param>
/// <param name="Example">A complete value.</param>
/// <param name="Commands">The commands that take it.</param>
/// <param name="IsRequired">True where the command cannot do without.</param>
/// <param name="OfTheCase">True where it describes the case, false where it describes the output.</param>
internal sealed record OptionRow(
    string Name, string Value, string Help, string Example, CommandName Commands, bool IsRequired = false, bool OfTheCase = true)
{
    internal bool IsSwitch => Value.Length == 0;

    /// <summary>True where it may be given more than once.</summary>
    internal bool IsRepeatable { get; init; }
}
