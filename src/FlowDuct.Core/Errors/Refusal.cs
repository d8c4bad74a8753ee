namespace FlowDuct.Errors;

/// <summary>What kind of refusal; each maps to one documented exit status.</summary>
public enum RefusalKind
{
    /// <summary>The request was not understood or contradicts itself (exit status 2).</summary>
    NotUnderstood,

    /// <summary>Understood, but there is no answer: no physical solution or outside a formulation (exit status 3).</summary>
    NoAnswer,

    /// <summary>The output could not be written (exit status 4).</summary>
    NotWritten,
}

/// <summary>Why a request was refused: the place as the user typed it, the reason with value, limit and source, and one next step.</summary>
/// <param name="Kind">Maps to the exit status.</param>
/// <param name="Place">Option, or file, row and column, as typed; may be empty for the whole request.</param>
/// <param name="Reason">What is wrong: the value, the limit, and the source of the limit.</param>
/// <param name="NextStep">What would do instead; may be empty where the reason says it.</param>
public sealed record Refusal(RefusalKind Kind, string Place, string Reason, string NextStep)
{
    /// <summary>The refusal in one to three lines, without the program's name.</summary>
    public override string ToString()
    {
        string first = Place.Length == 0 ? Reason : $"{Place}: {Reason}";
        return NextStep.Length == 0 ? first : $"{first}\n  {NextStep}";
    }
}
