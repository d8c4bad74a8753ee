namespace FlowDuct.Devices;

/// <summary>How much of an answer is worked out. What is worked out is the same in each.</summary>
internal enum Extent
{
    /// <summary>All of it.</summary>
    Full,

    /// <summary>A nozzle's exit is not brought to rest, a third of the work: its p0 and T0, and the ratios that follow from them, stay null.</summary>
    WithoutExitHead,
}
