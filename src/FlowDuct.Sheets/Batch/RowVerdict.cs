namespace FlowDuct.Sheets.Batch;

/// <summary>How a row ended, from the best to the gravest: the gravest of a run decides its exit status.</summary>
internal enum RowVerdict
{
    /// <summary>Answered, nothing wrong.</summary>
    Passed,

    /// <summary>Answered with a caution, and cautions were declared to fail.</summary>
    Cautioned,

    /// <summary>Answered: the figures are impossible.</summary>
    Impossible,

    /// <summary>Understood, no answer.</summary>
    Unsolved,

    /// <summary>Not understood.</summary>
    NotUnderstood,

    /// <summary>A defect of this program.</summary>
    Defect,
}
