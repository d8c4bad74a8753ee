namespace FlowDuct.Cli.Batch;

/// <summary>The formats of a run.</summary>
internal enum BatchFormat
{
    /// <summary>The sheet with results behind its cells.</summary>
    Csv,

    /// <summary>A JSON answer to the line.</summary>
    JsonLines,

    /// <summary>One array of JSON answers.</summary>
    Json,
}
