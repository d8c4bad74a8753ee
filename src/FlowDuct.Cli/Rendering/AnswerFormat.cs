namespace FlowDuct.Cli.Rendering;

/// <summary>How the answer of a device is written.</summary>
internal enum AnswerFormat
{
    /// <summary>For people.</summary>
    Text,

    /// <summary>For programs, coherent SI.</summary>
    Json,

    /// <summary>The states along the path alone.</summary>
    Csv,
}
