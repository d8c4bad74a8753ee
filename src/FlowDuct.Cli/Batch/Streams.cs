namespace FlowDuct.Cli.Batch;

/// <summary>The streams of a command that reads and writes as it goes.</summary>
/// <param name="In">Opens the standard input.</param>
/// <param name="Out">Takes results.</param>
/// <param name="Error">Takes refusals, warnings and progress.</param>
/// <param name="ErrorIsTerminal">True where progress may be shown.</param>
internal sealed record Streams(Func<Stream> In, Stream Out, Stream Error, bool ErrorIsTerminal);
