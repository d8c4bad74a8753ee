namespace FlowDuct.Cli.Rendering;

/// <summary>The row of a sheet behind a JSON answer.</summary>
/// <param name="Number">Counted from 1 behind the heading.</param>
/// <param name="Tag">Its tag; null where there is none.</param>
/// <param name="Case">Its case; null where there is none.</param>
internal sealed record JsonRow(long Number, string? Tag, string? Case);
