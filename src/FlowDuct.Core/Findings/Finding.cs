using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>How grave a finding is.</summary>
internal enum Severity
{
    /// <summary>Worth knowing.</summary>
    Note,

    /// <summary>Needs a look before the answer is used.</summary>
    Caution,

    /// <summary>The figures cannot be right: exit status 1.</summary>
    Error,
}

/// <summary>Something that the numbers show.</summary>
/// <param name="Code">One of the documented codes.</param>
/// <param name="Severity">How grave.</param>
/// <param name="Value">The number that raised it, SI.</param>
/// <param name="Limit">The limit it was held against, SI.</param>
/// <param name="Standing">Where the limit comes from: a law, a standard, common practice.</param>
/// <param name="Message">Says it in the reader's units.</param>
internal sealed record Finding(
    string Code, Severity Severity, double? Value, double? Limit, string Standing, Func<IQuantityText, string> Message);
