namespace FlowDuct.Sheets;

/// <summary>What a column of a datasheet is for.</summary>
internal enum ColumnKind
{
    /// <summary>Nothing that is computed with: its cells go through untouched.</summary>
    PassThrough,

    /// <summary>The tag of the device; with the case it is the key of a row.</summary>
    Tag,

    /// <summary>The operating point, where a tag has several.</summary>
    Case,

    /// <summary>nozzle, diffuser or state.</summary>
    Device,

    /// <summary>The fluid by name or composition.</summary>
    Fluid,

    /// <summary>absolute or gauge, for headings whose pressure unit does not say it.</summary>
    PressureBasis,

    /// <summary>Pressure and temperature at which a volume of gas is counted.</summary>
    ReferenceState,

    /// <summary>A figure of a station or of the device.</summary>
    Figure,

    /// <summary>One of a few words, such as a shape.</summary>
    Choice,

    /// <summary>A figure that the sheet states as a result; <c>run</c> lets it through.</summary>
    Expected,

    /// <summary>The tolerance of an expected figure; <c>run</c> lets it through.</summary>
    Within,

    /// <summary>Why a failed figure is accepted; <c>run</c> lets it through.</summary>
    Waiver,
}
