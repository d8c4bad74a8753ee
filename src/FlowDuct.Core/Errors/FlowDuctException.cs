namespace FlowDuct.Errors;

/// <summary>The one exception of the public edge: it carries the refusal.</summary>
public sealed class FlowDuctException : Exception
{
    /// <summary>Creates an exception that carries a refusal.</summary>
    /// <param name="refusal">The refusal.</param>
    public FlowDuctException(Refusal refusal)
        : base(refusal?.ToString()) => Refusal = refusal ?? throw new ArgumentNullException(nameof(refusal));

    /// <summary>Creates an exception that was never given a refusal.</summary>
    public FlowDuctException()
        : this("No reason was given.")
    {
    }

    /// <summary>Creates an exception from a plain message.</summary>
    /// <param name="message">The reason.</param>
    public FlowDuctException(string message)
        : this(new Refusal(RefusalKind.NoAnswer, string.Empty, message, string.Empty))
    {
    }

    /// <summary>Creates an exception from a plain message and a cause.</summary>
    /// <param name="message">The reason.</param>
    /// <param name="innerException">The cause.</param>
    public FlowDuctException(string message, Exception innerException)
        : base(message, innerException) => Refusal = new Refusal(RefusalKind.NoAnswer, string.Empty, message, string.Empty);

    /// <summary>Why, where and what would do.</summary>
    public Refusal Refusal { get; }
}
