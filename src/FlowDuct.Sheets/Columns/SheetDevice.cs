namespace FlowDuct.Sheets;

/// <summary>What a row asks about.</summary>
internal enum SheetDevice
{
    /// <summary>A nozzle.</summary>
    Nozzle,

    /// <summary>A diffuser.</summary>
    Diffuser,

    /// <summary>A nozzle followed by a diffuser.</summary>
    Venturi,

    /// <summary>One state of a fluid.</summary>
    State,
}
