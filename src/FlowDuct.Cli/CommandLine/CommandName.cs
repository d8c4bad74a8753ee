namespace FlowDuct.Cli.CommandLine;

/// <summary>The commands, as flags so that an option can belong to several.</summary>
[Flags]
internal enum CommandName
{
    /// <summary>No command: the root.</summary>
    None = 0,

    /// <summary>One state of a fluid.</summary>
    State = 1,

    /// <summary>A duct that speeds the flow up.</summary>
    Nozzle = 2,

    /// <summary>A duct that slows the flow down.</summary>
    Diffuser = 4,

    /// <summary>The list of fluids.</summary>
    Fluids = 8,

    /// <summary>The list of units.</summary>
    Units = 16,

    /// <summary>The printed check values of the formulations, computed here.</summary>
    SelfCheck = 32,

    /// <summary>Every row of a sheet.</summary>
    Run = 128,

    /// <summary>One case with inputs that vary.</summary>
    Sweep = 256,

    /// <summary>Both that answer row after row.</summary>
    Batch = Run | Sweep,

    /// <summary>A nozzle followed by a diffuser.</summary>
    Venturi = 64,

    /// <summary>Every device.</summary>
    Devices = Nozzle | Diffuser | Venturi,

    /// <summary>The devices with a convergence.</summary>
    Convergent = Nozzle | Venturi,

    /// <summary>The devices with a subsonic divergence.</summary>
    Divergent = Diffuser | Venturi,

    /// <summary>All that answer with numbers.</summary>
    Answering = State | Devices,

    /// <summary>All commands.</summary>
    All = Answering | Fluids | Units | SelfCheck | Batch,
}
